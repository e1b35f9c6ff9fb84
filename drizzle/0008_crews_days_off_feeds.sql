CREATE TABLE "calendar_feeds" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"crew_id" uuid,
	"person_id" uuid,
	"token_hash" text NOT NULL,
	"made_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"revoked_at" timestamp with time zone,
	"last_read_at" timestamp with time zone,
	CONSTRAINT "calendar_feeds_token" UNIQUE("token_hash"),
	CONSTRAINT "calendar_feeds_of_one" CHECK (num_nonnulls("calendar_feeds"."crew_id", "calendar_feeds"."person_id") = 1)
);
--> statement-breakpoint
CREATE TABLE "days_off" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"person_id" uuid NOT NULL,
	"first_day" date NOT NULL,
	"last_day" date NOT NULL,
	"reason" text DEFAULT '' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "days_off_in_order" CHECK ("days_off"."last_day" >= "days_off"."first_day")
);
--> statement-breakpoint
ALTER TABLE "crew_people" ADD COLUMN "weekdays" jsonb;--> statement-breakpoint
ALTER TABLE "crews" ADD COLUMN "kinds" jsonb DEFAULT '[]'::jsonb NOT NULL;--> statement-breakpoint
ALTER TABLE "crews" ADD COLUMN "pattern" jsonb;--> statement-breakpoint
ALTER TABLE "crews" ADD COLUMN "base_address" text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE "visits" ADD COLUMN "changed_at" timestamp with time zone DEFAULT now() NOT NULL;--> statement-breakpoint
ALTER TABLE "calendar_feeds" ADD CONSTRAINT "calendar_feeds_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "calendar_feeds" ADD CONSTRAINT "calendar_feeds_crew" FOREIGN KEY ("shop_id","crew_id") REFERENCES "public"."crews"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "calendar_feeds" ADD CONSTRAINT "calendar_feeds_person" FOREIGN KEY ("shop_id","person_id") REFERENCES "public"."people"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "calendar_feeds" ADD CONSTRAINT "calendar_feeds_made_by" FOREIGN KEY ("shop_id","made_by") REFERENCES "public"."people"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "days_off" ADD CONSTRAINT "days_off_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "days_off" ADD CONSTRAINT "days_off_person" FOREIGN KEY ("shop_id","person_id") REFERENCES "public"."people"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "calendar_feeds_by_shop" ON "calendar_feeds" USING btree ("shop_id");--> statement-breakpoint
CREATE INDEX "days_off_by_person" ON "days_off" USING btree ("shop_id","person_id","last_day");