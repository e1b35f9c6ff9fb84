-- What must never happen: one crew or one person in two places, a reading changed, a release changed.
ALTER TABLE visit_pieces ADD CONSTRAINT visit_pieces_one_crew_one_place
  EXCLUDE USING gist (crew_id WITH =, during WITH &&);
--> statement-breakpoint
ALTER TABLE visit_piece_people ADD CONSTRAINT visit_piece_people_one_place
  EXCLUDE USING gist (person_id WITH =, during WITH &&);
--> statement-breakpoint
CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION '% is append-only', TG_TABLE_NAME USING ERRCODE = '23514', CONSTRAINT = TG_NAME;
END $$;
--> statement-breakpoint
CREATE TRIGGER readings_append_only BEFORE UPDATE ON readings
  FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER releases_frozen BEFORE UPDATE OR DELETE ON releases
  FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER consents_append_only BEFORE UPDATE ON consents
  FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE INDEX customers_name_trigram ON customers USING gin (name gin_trgm_ops);
--> statement-breakpoint
CREATE INDEX sites_street_trigram ON sites USING gin (street gin_trgm_ops);
