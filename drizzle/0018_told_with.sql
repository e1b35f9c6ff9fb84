ALTER TABLE "messages" ADD COLUMN "told_with" uuid;--> statement-breakpoint
ALTER TABLE "messages" ADD CONSTRAINT "messages_told_with" FOREIGN KEY ("shop_id","told_with") REFERENCES "public"."messages"("shop_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "messages_by_lead" ON "messages" USING btree ("told_with");