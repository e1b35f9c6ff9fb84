CREATE TABLE "message_settings" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"silent_on" jsonb DEFAULT '[]'::jsonb NOT NULL,
	"segment_price" double precision,
	"currency" text DEFAULT 'USD' NOT NULL,
	CONSTRAINT "message_settings_one" UNIQUE("shop_id")
);
--> statement-breakpoint
CREATE TABLE "message_wordings" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"occasion" text NOT NULL,
	"language" text NOT NULL,
	"sms" text DEFAULT '' NOT NULL,
	"subject" text DEFAULT '' NOT NULL,
	"email" text DEFAULT '' NOT NULL,
	"changed_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "message_wordings_one" UNIQUE("shop_id","occasion","language")
);
--> statement-breakpoint
CREATE TABLE "scheduler_items" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"customer_id" uuid NOT NULL,
	"job_id" uuid,
	"visit_id" uuid,
	"kind" text NOT NULL,
	"key" text NOT NULL,
	"words" text NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"done_at" timestamp with time zone,
	"done_by" text DEFAULT '' NOT NULL,
	CONSTRAINT "scheduler_items_once" UNIQUE("shop_id","key")
);
--> statement-breakpoint
ALTER TABLE "consents" ADD COLUMN "proof" text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE "customers" ADD COLUMN "untextable_phone" text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE "messages" ADD COLUMN "ask_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "messages" ADD COLUMN "segments" integer DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE "messages" ADD COLUMN "written_by" uuid;--> statement-breakpoint
ALTER TABLE "visits" ADD COLUMN "expected_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "message_settings" ADD CONSTRAINT "message_settings_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "message_wordings" ADD CONSTRAINT "message_wordings_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "scheduler_items" ADD CONSTRAINT "scheduler_items_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "scheduler_items" ADD CONSTRAINT "scheduler_items_customer" FOREIGN KEY ("shop_id","customer_id") REFERENCES "public"."customers"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "scheduler_items" ADD CONSTRAINT "scheduler_items_job" FOREIGN KEY ("shop_id","job_id") REFERENCES "public"."jobs"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "scheduler_items" ADD CONSTRAINT "scheduler_items_visit" FOREIGN KEY ("shop_id","visit_id") REFERENCES "public"."visits"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "scheduler_items_open" ON "scheduler_items" USING btree ("shop_id","done_at","at");--> statement-breakpoint
ALTER TABLE "messages" ADD CONSTRAINT "messages_person" FOREIGN KEY ("shop_id","written_by") REFERENCES "public"."people"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "messages_to_ask" ON "messages" USING btree ("ask_at");--> statement-breakpoint
CREATE INDEX "messages_by_customer" ON "messages" USING btree ("shop_id","customer_id");--> statement-breakpoint
CREATE INDEX "messages_by_address" ON "messages" USING btree ("to_address","sent_at");