ALTER TABLE "visits" ADD COLUMN "held_for_visit_id" uuid;--> statement-breakpoint
ALTER TABLE "visits" ADD CONSTRAINT "visits_held_for" FOREIGN KEY ("shop_id","held_for_visit_id") REFERENCES "public"."visits"("shop_id","id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "visits_held" ON "visits" USING btree ("hold_ends_at") WHERE "visits"."status" = 'held';--> statement-breakpoint
ALTER TABLE "visits" ADD CONSTRAINT "visits_hold_ends" CHECK (("visits"."status" = 'held') = ("visits"."hold_ends_at" is not null));