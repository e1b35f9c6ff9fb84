CREATE TABLE "address_answers" (
	"shop_id" text NOT NULL,
	"question" text NOT NULL,
	"places" jsonb NOT NULL,
	"asked_at" timestamp with time zone NOT NULL,
	CONSTRAINT "address_answers_once" PRIMARY KEY("shop_id","question")
);
--> statement-breakpoint
CREATE TABLE "drive_times" (
	"shop_id" text NOT NULL,
	"from_place" text NOT NULL,
	"to_place" text NOT NULL,
	"minutes" double precision,
	"asked_at" timestamp with time zone NOT NULL,
	CONSTRAINT "drive_times_once" PRIMARY KEY("shop_id","from_place","to_place")
);
--> statement-breakpoint
ALTER TABLE "address_answers" ADD CONSTRAINT "address_answers_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "drive_times" ADD CONSTRAINT "drive_times_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "address_answers_by_age" ON "address_answers" USING btree ("asked_at");--> statement-breakpoint
CREATE INDEX "drive_times_by_age" ON "drive_times" USING btree ("asked_at");