CREATE TABLE "kept_refusals" (
	"shop_id" text NOT NULL,
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"channel" text NOT NULL,
	"address_hash" text NOT NULL,
	"at" timestamp with time zone NOT NULL,
	CONSTRAINT "kept_refusals_once" UNIQUE("shop_id","channel","address_hash")
);
--> statement-breakpoint
ALTER TABLE "customers" ADD COLUMN "erased_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "kept_refusals" ADD CONSTRAINT "kept_refusals_shop_id_shops_id_fk" FOREIGN KEY ("shop_id") REFERENCES "public"."shops"("id") ON DELETE cascade ON UPDATE no action;