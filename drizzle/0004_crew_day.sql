CREATE TABLE "site_checks" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"visit_id" uuid NOT NULL,
	"room_id" uuid NOT NULL,
	"release_id" uuid NOT NULL,
	"readings" jsonb NOT NULL,
	"disagreements" jsonb NOT NULL,
	"changes" jsonb NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"by_person_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "site_checks_shop_id" UNIQUE("shop_id","id")
);
--> statement-breakpoint
CREATE TABLE "visit_checks" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"visit_id" uuid NOT NULL,
	"item" text NOT NULL,
	"answer" text NOT NULL,
	"words" text DEFAULT '' NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"by_person_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "visit_pauses" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"visit_id" uuid NOT NULL,
	"what" text NOT NULL,
	"why" text,
	"at" timestamp with time zone NOT NULL,
	"by_person_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "sign_offs" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"job_id" uuid NOT NULL,
	"visit_id" uuid NOT NULL,
	"name" text NOT NULL,
	"language" text NOT NULL,
	"statement" text NOT NULL,
	"strokes" jsonb NOT NULL,
	"snags" jsonb NOT NULL,
	"signed_at" timestamp with time zone NOT NULL,
	"taken_by" uuid NOT NULL,
	"received_at" timestamp with time zone NOT NULL,
	"seal" text NOT NULL,
	CONSTRAINT "sign_offs_shop_id" UNIQUE("shop_id","id"),
	CONSTRAINT "sign_offs_one_per_visit" UNIQUE("shop_id","visit_id")
);
--> statement-breakpoint
CREATE TABLE "snags" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"job_id" uuid NOT NULL,
	"visit_id" uuid,
	"room_id" uuid,
	"unit_id" uuid,
	"place" text DEFAULT '' NOT NULL,
	"kind" text NOT NULL,
	"words" text NOT NULL,
	"mender" text NOT NULL,
	"due_on" date,
	"photo_ids" uuid[] DEFAULT '{}'::uuid[] NOT NULL,
	"found_at" timestamp with time zone NOT NULL,
	"found_by" uuid NOT NULL,
	"is_after_sign_off" boolean DEFAULT false NOT NULL,
	"bench_says" text DEFAULT '' NOT NULL,
	"bench_ready_on" date,
	"bench_said_at" timestamp with time zone,
	"closed_at" timestamp with time zone,
	"closed_by" uuid,
	"closed_words" text DEFAULT '' NOT NULL,
	"closed_photo_ids" uuid[] DEFAULT '{}'::uuid[] NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "snags_shop_id" UNIQUE("shop_id","id"),
	CONSTRAINT "snags_closed_shows_how" CHECK ("snags"."closed_at" is null or "snags"."closed_words" <> '' or cardinality("snags"."closed_photo_ids") > 0),
	CONSTRAINT "snags_closed_by" CHECK (("snags"."closed_at" is null) = ("snags"."closed_by" is null))
);
--> statement-breakpoint
ALTER TABLE "jobs" ADD COLUMN "ready_where" text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE "jobs" ADD COLUMN "ready_why" text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE "jobs" ADD COLUMN "finish" text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE "sites" ADD COLUMN "parking" text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE "sites" ADD COLUMN "access_code_sealed" text;--> statement-breakpoint
ALTER TABLE "sites" ADD COLUMN "access_code_set_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "site_checks" ADD CONSTRAINT "site_checks_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "site_checks" ADD CONSTRAINT "site_checks_visit" FOREIGN KEY ("shop_id","visit_id") REFERENCES "public"."visits"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "site_checks" ADD CONSTRAINT "site_checks_room" FOREIGN KEY ("shop_id","room_id") REFERENCES "public"."rooms"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "site_checks" ADD CONSTRAINT "site_checks_release" FOREIGN KEY ("shop_id","release_id") REFERENCES "public"."releases"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "site_checks" ADD CONSTRAINT "site_checks_person" FOREIGN KEY ("shop_id","by_person_id") REFERENCES "public"."people"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_checks" ADD CONSTRAINT "visit_checks_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_checks" ADD CONSTRAINT "visit_checks_visit" FOREIGN KEY ("shop_id","visit_id") REFERENCES "public"."visits"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_checks" ADD CONSTRAINT "visit_checks_person" FOREIGN KEY ("shop_id","by_person_id") REFERENCES "public"."people"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_pauses" ADD CONSTRAINT "visit_pauses_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_pauses" ADD CONSTRAINT "visit_pauses_visit" FOREIGN KEY ("shop_id","visit_id") REFERENCES "public"."visits"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_pauses" ADD CONSTRAINT "visit_pauses_person" FOREIGN KEY ("shop_id","by_person_id") REFERENCES "public"."people"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sign_offs" ADD CONSTRAINT "sign_offs_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sign_offs" ADD CONSTRAINT "sign_offs_job" FOREIGN KEY ("shop_id","job_id") REFERENCES "public"."jobs"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sign_offs" ADD CONSTRAINT "sign_offs_visit" FOREIGN KEY ("shop_id","visit_id") REFERENCES "public"."visits"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sign_offs" ADD CONSTRAINT "sign_offs_taken_by" FOREIGN KEY ("shop_id","taken_by") REFERENCES "public"."people"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "snags" ADD CONSTRAINT "snags_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "snags" ADD CONSTRAINT "snags_job" FOREIGN KEY ("shop_id","job_id") REFERENCES "public"."jobs"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "snags" ADD CONSTRAINT "snags_visit" FOREIGN KEY ("shop_id","visit_id") REFERENCES "public"."visits"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "snags" ADD CONSTRAINT "snags_room" FOREIGN KEY ("shop_id","room_id") REFERENCES "public"."rooms"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "snags" ADD CONSTRAINT "snags_found_by" FOREIGN KEY ("shop_id","found_by") REFERENCES "public"."people"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "snags" ADD CONSTRAINT "snags_closed_by_person" FOREIGN KEY ("shop_id","closed_by") REFERENCES "public"."people"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "site_checks_by_visit" ON "site_checks" USING btree ("shop_id","visit_id");--> statement-breakpoint
CREATE INDEX "visit_checks_by_visit" ON "visit_checks" USING btree ("shop_id","visit_id","at");--> statement-breakpoint
CREATE INDEX "visit_pauses_by_visit" ON "visit_pauses" USING btree ("shop_id","visit_id","at");--> statement-breakpoint
CREATE INDEX "sign_offs_by_job" ON "sign_offs" USING btree ("shop_id","job_id");--> statement-breakpoint
CREATE INDEX "snags_by_job" ON "snags" USING btree ("shop_id","job_id");--> statement-breakpoint
CREATE INDEX "snags_open" ON "snags" USING btree ("shop_id","closed_at","due_on");