CREATE TABLE "audit" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"at" timestamp with time zone DEFAULT now() NOT NULL,
	"actor_kind" text NOT NULL,
	"actor_name" text NOT NULL,
	"verb" text NOT NULL,
	"subject_kind" text NOT NULL,
	"subject_id" uuid NOT NULL,
	"job_id" uuid,
	"summary" text NOT NULL,
	"detail" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"sequence" bigint GENERATED ALWAYS AS IDENTITY (sequence name "audit_sequence_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1)
);
--> statement-breakpoint
CREATE TABLE "idempotency_keys" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"key" text NOT NULL,
	"verb" text NOT NULL,
	"answer" jsonb NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "idempotency_keys_once" UNIQUE("shop_id","verb","key")
);
--> statement-breakpoint
CREATE TABLE "accounts" (
	"id" text PRIMARY KEY NOT NULL,
	"account_id" text NOT NULL,
	"provider_id" text NOT NULL,
	"user_id" text NOT NULL,
	"access_token" text,
	"refresh_token" text,
	"id_token" text,
	"access_token_expires_at" timestamp with time zone,
	"refresh_token_expires_at" timestamp with time zone,
	"scope" text,
	"password" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "rate_limits" (
	"id" text PRIMARY KEY NOT NULL,
	"key" text NOT NULL,
	"count" integer NOT NULL,
	"last_request" bigint NOT NULL,
	CONSTRAINT "rate_limits_key_unique" UNIQUE("key")
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"id" text PRIMARY KEY NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"token" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	"ip_address" text,
	"user_agent" text,
	"user_id" text NOT NULL,
	"active_shop_id" text,
	CONSTRAINT "sessions_token_unique" UNIQUE("token")
);
--> statement-breakpoint
CREATE TABLE "users" (
	"id" text PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"email" text NOT NULL,
	"email_verified" boolean DEFAULT false NOT NULL,
	"image" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "users_email_unique" UNIQUE("email")
);
--> statement-breakpoint
CREATE TABLE "verifications" (
	"id" text PRIMARY KEY NOT NULL,
	"identifier" text NOT NULL,
	"value" text NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "files" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"job_id" uuid NOT NULL,
	"room_id" uuid,
	"wall_id" uuid,
	"name" text NOT NULL,
	"caption" text DEFAULT '' NOT NULL,
	"media_type" text NOT NULL,
	"bytes" integer NOT NULL,
	"width_px" integer,
	"height_px" integer,
	"sha256" text NOT NULL,
	"storage_key" text NOT NULL,
	"taken_at" timestamp with time zone NOT NULL,
	"added_by" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "files_shop_id" UNIQUE("shop_id","id")
);
--> statement-breakpoint
CREATE TABLE "consents" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"customer_id" uuid NOT NULL,
	"channel" text NOT NULL,
	"given" boolean NOT NULL,
	"how" text NOT NULL,
	"by_person_id" uuid,
	"at" timestamp with time zone DEFAULT now() NOT NULL,
	"sequence" bigint GENERATED ALWAYS AS IDENTITY (sequence name "consents_sequence_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1)
);
--> statement-breakpoint
CREATE TABLE "customers" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"name" text NOT NULL,
	"phone" text DEFAULT '' NOT NULL,
	"email" text DEFAULT '' NOT NULL,
	"language" text DEFAULT 'en' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "customers_shop_id" UNIQUE("shop_id","id")
);
--> statement-breakpoint
CREATE TABLE "jobs" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"number" integer NOT NULL,
	"title" text NOT NULL,
	"customer_id" uuid NOT NULL,
	"site_id" uuid NOT NULL,
	"stage" text DEFAULT 'enquiry' NOT NULL,
	"walls_ready" text DEFAULT 'not-yet' NOT NULL,
	"site_ready_on" date,
	"floor_agreed" boolean DEFAULT false NOT NULL,
	"ready_on" date,
	"ready_said_at" timestamp with time zone,
	"not_ready" text DEFAULT '' NOT NULL,
	"room_count" integer DEFAULT 1 NOT NULL,
	"unit_count" integer DEFAULT 0 NOT NULL,
	"notes" text DEFAULT '' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "jobs_shop_id" UNIQUE("shop_id","id"),
	CONSTRAINT "jobs_number" UNIQUE("shop_id","number")
);
--> statement-breakpoint
CREATE TABLE "sites" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"customer_id" uuid NOT NULL,
	"street" text NOT NULL,
	"town" text DEFAULT '' NOT NULL,
	"postcode" text DEFAULT '' NOT NULL,
	"latitude" double precision,
	"longitude" double precision,
	"zone" text NOT NULL,
	"way_in" text DEFAULT '' NOT NULL,
	"floors_up" integer DEFAULT 0 NOT NULL,
	"has_lift" boolean DEFAULT false NOT NULL,
	"year_built" integer,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "sites_shop_id" UNIQUE("shop_id","id")
);
--> statement-breakpoint
CREATE TABLE "messages" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"customer_id" uuid NOT NULL,
	"job_id" uuid,
	"visit_id" uuid,
	"occasion" text NOT NULL,
	"channel" text NOT NULL,
	"key" text NOT NULL,
	"state" text DEFAULT 'waiting' NOT NULL,
	"due_at" timestamp with time zone NOT NULL,
	"not_after" timestamp with time zone,
	"cause" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"attempts" integer DEFAULT 0 NOT NULL,
	"claimed_at" timestamp with time zone,
	"first_tried_at" timestamp with time zone,
	"provider_id" text,
	"sent_at" timestamp with time zone,
	"delivered_at" timestamp with time zone,
	"reason" text DEFAULT '' NOT NULL,
	"to_address" text DEFAULT '' NOT NULL,
	"body" text DEFAULT '' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "messages_shop_id" UNIQUE("shop_id","id"),
	CONSTRAINT "messages_once" UNIQUE("shop_id","key")
);
--> statement-breakpoint
CREATE TABLE "release_receipts" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"release_id" uuid NOT NULL,
	"taken_up_at" timestamp with time zone DEFAULT now() NOT NULL,
	"taken_up_by" uuid NOT NULL,
	CONSTRAINT "release_receipts_once" UNIQUE("release_id")
);
--> statement-breakpoint
CREATE TABLE "releases" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"room_id" uuid NOT NULL,
	"revision" text NOT NULL,
	"engine_version" text NOT NULL,
	"reading_ids" uuid[] NOT NULL,
	"wall_book" jsonb NOT NULL,
	"runs" jsonb NOT NULL,
	"rules" jsonb NOT NULL,
	"fit" jsonb NOT NULL,
	"changes" jsonb NOT NULL,
	"override_reason" text DEFAULT '' NOT NULL,
	"released_at" timestamp with time zone DEFAULT now() NOT NULL,
	"released_by" uuid NOT NULL,
	CONSTRAINT "releases_shop_id" UNIQUE("shop_id","id"),
	CONSTRAINT "releases_revision" UNIQUE("room_id","revision")
);
--> statement-breakpoint
CREATE TABLE "shops" (
	"id" text PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"phone" text DEFAULT '' NOT NULL,
	"email" text DEFAULT '' NOT NULL,
	"region" text NOT NULL,
	"zone" text NOT NULL,
	"rules" jsonb NOT NULL,
	"next_job_number" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "shops_region" CHECK ("shops"."region" in ('US', 'UK', 'AU', 'EU'))
);
--> statement-breakpoint
CREATE TABLE "crew_people" (
	"shop_id" text NOT NULL,
	"crew_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	CONSTRAINT "crew_people_crew_id_person_id_pk" PRIMARY KEY("crew_id","person_id")
);
--> statement-breakpoint
CREATE TABLE "crews" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"name" text NOT NULL,
	"does" text NOT NULL,
	"colour" text NOT NULL,
	"base_latitude" double precision,
	"base_longitude" double precision,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "crews_shop_id" UNIQUE("shop_id","id"),
	CONSTRAINT "crews_name" UNIQUE("shop_id","name")
);
--> statement-breakpoint
CREATE TABLE "invitations" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"email" text NOT NULL,
	"role" text NOT NULL,
	"token_hash" text NOT NULL,
	"ends_at" timestamp with time zone NOT NULL,
	"invited_by" uuid NOT NULL,
	"accepted_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "invitations_token" UNIQUE("token_hash")
);
--> statement-breakpoint
CREATE TABLE "people" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"user_id" text,
	"name" text NOT NULL,
	"phone" text DEFAULT '' NOT NULL,
	"role" text NOT NULL,
	"left_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "people_shop_id" UNIQUE("shop_id","id"),
	CONSTRAINT "people_one_per_user" UNIQUE("shop_id","user_id")
);
--> statement-breakpoint
CREATE TABLE "tools" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"name" text NOT NULL,
	"spec" jsonb NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "tools_shop_id" UNIQUE("shop_id","id")
);
--> statement-breakpoint
CREATE TABLE "gate_overrides" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"visit_id" uuid NOT NULL,
	"gate" text NOT NULL,
	"reason" text NOT NULL,
	"by_person_id" uuid NOT NULL,
	"at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "gate_overrides_reason" CHECK (length(trim("gate_overrides"."reason")) > 0)
);
--> statement-breakpoint
CREATE TABLE "visit_links" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"visit_id" uuid NOT NULL,
	"token_hash" text NOT NULL,
	"ends_at" timestamp with time zone NOT NULL,
	"revoked_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "visit_links_token" UNIQUE("token_hash")
);
--> statement-breakpoint
CREATE TABLE "visit_piece_people" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"piece_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"starts_at" timestamp with time zone NOT NULL,
	"ends_at" timestamp with time zone NOT NULL,
	"during" "tstzrange" GENERATED ALWAYS AS (tstzrange(starts_at, ends_at, '[)')) STORED
);
--> statement-breakpoint
CREATE TABLE "visit_pieces" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"visit_id" uuid NOT NULL,
	"crew_id" uuid NOT NULL,
	"starts_at" timestamp with time zone NOT NULL,
	"ends_at" timestamp with time zone NOT NULL,
	"during" "tstzrange" GENERATED ALWAYS AS (tstzrange(starts_at, ends_at, '[)')) STORED,
	CONSTRAINT "visit_pieces_shop_id" UNIQUE("shop_id","id"),
	CONSTRAINT "visit_pieces_ends_after_start" CHECK ("visit_pieces"."ends_at" > "visit_pieces"."starts_at")
);
--> statement-breakpoint
CREATE TABLE "visits" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"job_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"crew_id" uuid NOT NULL,
	"status" text DEFAULT 'booked' NOT NULL,
	"starts_at" timestamp with time zone NOT NULL,
	"ends_at" timestamp with time zone NOT NULL,
	"window_starts_at" timestamp with time zone NOT NULL,
	"window_ends_at" timestamp with time zone NOT NULL,
	"work_minutes" integer NOT NULL,
	"customer_says" text DEFAULT '' NOT NULL,
	"hold_ends_at" timestamp with time zone,
	"confirmed_at" timestamp with time zone,
	"arrived_at" timestamp with time zone,
	"left_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "visits_shop_id" UNIQUE("shop_id","id"),
	CONSTRAINT "visits_ends_after_start" CHECK ("visits"."ends_at" > "visits"."starts_at"),
	CONSTRAINT "visits_window" CHECK ("visits"."window_ends_at" >= "visits"."window_starts_at")
);
--> statement-breakpoint
CREATE TABLE "readings" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"room_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"body" jsonb NOT NULL,
	"taken_at" timestamp with time zone NOT NULL,
	"taken_by" uuid NOT NULL,
	"received_at" timestamp with time zone DEFAULT now() NOT NULL,
	"sequence" bigint GENERATED ALWAYS AS IDENTITY (sequence name "readings_sequence_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	CONSTRAINT "readings_shop_id" UNIQUE("shop_id","id")
);
--> statement-breakpoint
CREATE TABLE "rooms" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"job_id" uuid NOT NULL,
	"name" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"wall_thickness_to_come_mm" double precision DEFAULT 0 NOT NULL,
	"floor_to_come_mm" double precision DEFAULT 0 NOT NULL,
	"cabinets_stand_on" text,
	"submitted_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "rooms_shop_id" UNIQUE("shop_id","id")
);
--> statement-breakpoint
CREATE TABLE "runs" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"room_id" uuid NOT NULL,
	"wall_id" uuid NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"name" text NOT NULL,
	"body" jsonb NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "runs_shop_id" UNIQUE("shop_id","id")
);
--> statement-breakpoint
CREATE TABLE "units" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"run_id" uuid NOT NULL,
	"position" integer NOT NULL,
	"name" text DEFAULT '' NOT NULL,
	"kind" text NOT NULL,
	"width_mm" double precision NOT NULL,
	"alterable" jsonb,
	"arm_mm" double precision,
	"need_height_mm" double precision,
	CONSTRAINT "units_shop_id" UNIQUE("shop_id","id")
);
--> statement-breakpoint
CREATE TABLE "walls" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"room_id" uuid NOT NULL,
	"chain" integer NOT NULL,
	"chain_closed" boolean NOT NULL,
	"position" integer NOT NULL,
	"name" text NOT NULL,
	"nominal_length_mm" double precision NOT NULL,
	"left_corner_deg" double precision,
	CONSTRAINT "walls_shop_id" UNIQUE("shop_id","id"),
	CONSTRAINT "walls_place" UNIQUE("room_id","chain","position")
);
--> statement-breakpoint
ALTER TABLE "audit" ADD CONSTRAINT "audit_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "idempotency_keys" ADD CONSTRAINT "idempotency_keys_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "accounts" ADD CONSTRAINT "accounts_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sessions" ADD CONSTRAINT "sessions_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "files" ADD CONSTRAINT "files_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "files" ADD CONSTRAINT "files_job" FOREIGN KEY ("shop_id","job_id") REFERENCES "public"."jobs"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "files" ADD CONSTRAINT "files_room" FOREIGN KEY ("shop_id","room_id") REFERENCES "public"."rooms"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "files" ADD CONSTRAINT "files_person" FOREIGN KEY ("shop_id","added_by") REFERENCES "public"."people"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "consents" ADD CONSTRAINT "consents_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "consents" ADD CONSTRAINT "consents_customer" FOREIGN KEY ("shop_id","customer_id") REFERENCES "public"."customers"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "consents" ADD CONSTRAINT "consents_person" FOREIGN KEY ("shop_id","by_person_id") REFERENCES "public"."people"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "customers" ADD CONSTRAINT "customers_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "jobs" ADD CONSTRAINT "jobs_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "jobs" ADD CONSTRAINT "jobs_customer" FOREIGN KEY ("shop_id","customer_id") REFERENCES "public"."customers"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "jobs" ADD CONSTRAINT "jobs_site" FOREIGN KEY ("shop_id","site_id") REFERENCES "public"."sites"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sites" ADD CONSTRAINT "sites_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sites" ADD CONSTRAINT "sites_customer" FOREIGN KEY ("shop_id","customer_id") REFERENCES "public"."customers"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "messages" ADD CONSTRAINT "messages_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "messages" ADD CONSTRAINT "messages_customer" FOREIGN KEY ("shop_id","customer_id") REFERENCES "public"."customers"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "messages" ADD CONSTRAINT "messages_job" FOREIGN KEY ("shop_id","job_id") REFERENCES "public"."jobs"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "messages" ADD CONSTRAINT "messages_visit" FOREIGN KEY ("shop_id","visit_id") REFERENCES "public"."visits"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "release_receipts" ADD CONSTRAINT "release_receipts_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "release_receipts" ADD CONSTRAINT "release_receipts_release" FOREIGN KEY ("shop_id","release_id") REFERENCES "public"."releases"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "release_receipts" ADD CONSTRAINT "release_receipts_person" FOREIGN KEY ("shop_id","taken_up_by") REFERENCES "public"."people"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "releases" ADD CONSTRAINT "releases_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "releases" ADD CONSTRAINT "releases_room" FOREIGN KEY ("shop_id","room_id") REFERENCES "public"."rooms"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "releases" ADD CONSTRAINT "releases_person" FOREIGN KEY ("shop_id","released_by") REFERENCES "public"."people"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "crew_people" ADD CONSTRAINT "crew_people_crew" FOREIGN KEY ("shop_id","crew_id") REFERENCES "public"."crews"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "crew_people" ADD CONSTRAINT "crew_people_person" FOREIGN KEY ("shop_id","person_id") REFERENCES "public"."people"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "crews" ADD CONSTRAINT "crews_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitations" ADD CONSTRAINT "invitations_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invitations" ADD CONSTRAINT "invitations_person" FOREIGN KEY ("shop_id","invited_by") REFERENCES "public"."people"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "people" ADD CONSTRAINT "people_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "people" ADD CONSTRAINT "people_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tools" ADD CONSTRAINT "tools_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "gate_overrides" ADD CONSTRAINT "gate_overrides_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "gate_overrides" ADD CONSTRAINT "gate_overrides_visit" FOREIGN KEY ("shop_id","visit_id") REFERENCES "public"."visits"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "gate_overrides" ADD CONSTRAINT "gate_overrides_person" FOREIGN KEY ("shop_id","by_person_id") REFERENCES "public"."people"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_links" ADD CONSTRAINT "visit_links_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_links" ADD CONSTRAINT "visit_links_visit" FOREIGN KEY ("shop_id","visit_id") REFERENCES "public"."visits"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_piece_people" ADD CONSTRAINT "visit_piece_people_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_piece_people" ADD CONSTRAINT "visit_piece_people_piece" FOREIGN KEY ("shop_id","piece_id") REFERENCES "public"."visit_pieces"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_piece_people" ADD CONSTRAINT "visit_piece_people_person" FOREIGN KEY ("shop_id","person_id") REFERENCES "public"."people"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_pieces" ADD CONSTRAINT "visit_pieces_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_pieces" ADD CONSTRAINT "visit_pieces_visit" FOREIGN KEY ("shop_id","visit_id") REFERENCES "public"."visits"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit_pieces" ADD CONSTRAINT "visit_pieces_crew" FOREIGN KEY ("shop_id","crew_id") REFERENCES "public"."crews"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visits" ADD CONSTRAINT "visits_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visits" ADD CONSTRAINT "visits_job" FOREIGN KEY ("shop_id","job_id") REFERENCES "public"."jobs"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visits" ADD CONSTRAINT "visits_crew" FOREIGN KEY ("shop_id","crew_id") REFERENCES "public"."crews"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "readings" ADD CONSTRAINT "readings_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "readings" ADD CONSTRAINT "readings_room" FOREIGN KEY ("shop_id","room_id") REFERENCES "public"."rooms"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "readings" ADD CONSTRAINT "readings_person" FOREIGN KEY ("shop_id","taken_by") REFERENCES "public"."people"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rooms" ADD CONSTRAINT "rooms_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "rooms" ADD CONSTRAINT "rooms_job" FOREIGN KEY ("shop_id","job_id") REFERENCES "public"."jobs"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "runs" ADD CONSTRAINT "runs_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "runs" ADD CONSTRAINT "runs_room" FOREIGN KEY ("shop_id","room_id") REFERENCES "public"."rooms"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "runs" ADD CONSTRAINT "runs_wall" FOREIGN KEY ("shop_id","wall_id") REFERENCES "public"."walls"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "units" ADD CONSTRAINT "units_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "units" ADD CONSTRAINT "units_run" FOREIGN KEY ("shop_id","run_id") REFERENCES "public"."runs"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "walls" ADD CONSTRAINT "walls_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "walls" ADD CONSTRAINT "walls_room" FOREIGN KEY ("shop_id","room_id") REFERENCES "public"."rooms"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "audit_by_job" ON "audit" USING btree ("shop_id","job_id","sequence");--> statement-breakpoint
CREATE INDEX "accounts_by_user" ON "accounts" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "sessions_by_user" ON "sessions" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "verifications_by_identifier" ON "verifications" USING btree ("identifier");--> statement-breakpoint
CREATE INDEX "files_by_job" ON "files" USING btree ("shop_id","job_id");--> statement-breakpoint
CREATE INDEX "files_by_room" ON "files" USING btree ("shop_id","room_id","taken_at");--> statement-breakpoint
CREATE INDEX "consents_newest" ON "consents" USING btree ("customer_id","channel","sequence");--> statement-breakpoint
CREATE INDEX "customers_phone" ON "customers" USING btree ("shop_id","phone");--> statement-breakpoint
CREATE INDEX "jobs_by_stage" ON "jobs" USING btree ("shop_id","stage");--> statement-breakpoint
CREATE INDEX "sites_by_customer" ON "sites" USING btree ("shop_id","customer_id");--> statement-breakpoint
CREATE INDEX "messages_due" ON "messages" USING btree ("state","due_at");--> statement-breakpoint
CREATE INDEX "messages_by_job" ON "messages" USING btree ("shop_id","job_id");--> statement-breakpoint
CREATE INDEX "messages_by_visit" ON "messages" USING btree ("shop_id","visit_id");--> statement-breakpoint
CREATE INDEX "messages_by_provider" ON "messages" USING btree ("provider_id");--> statement-breakpoint
CREATE INDEX "releases_by_room" ON "releases" USING btree ("shop_id","room_id");--> statement-breakpoint
CREATE INDEX "visit_links_by_visit" ON "visit_links" USING btree ("shop_id","visit_id");--> statement-breakpoint
CREATE INDEX "visit_piece_people_by_piece" ON "visit_piece_people" USING btree ("shop_id","piece_id");--> statement-breakpoint
CREATE INDEX "visit_pieces_by_time" ON "visit_pieces" USING btree ("shop_id","starts_at");--> statement-breakpoint
CREATE INDEX "visit_pieces_by_visit" ON "visit_pieces" USING btree ("shop_id","visit_id");--> statement-breakpoint
CREATE INDEX "visits_by_time" ON "visits" USING btree ("shop_id","starts_at");--> statement-breakpoint
CREATE INDEX "visits_by_job" ON "visits" USING btree ("shop_id","job_id");--> statement-breakpoint
CREATE INDEX "readings_by_room" ON "readings" USING btree ("shop_id","room_id","sequence");--> statement-breakpoint
CREATE INDEX "rooms_by_job" ON "rooms" USING btree ("shop_id","job_id");--> statement-breakpoint
CREATE INDEX "runs_by_room" ON "runs" USING btree ("shop_id","room_id");--> statement-breakpoint
CREATE INDEX "units_by_run" ON "units" USING btree ("shop_id","run_id");