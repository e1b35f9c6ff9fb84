-- A sample is taken away whole, and what may never be deleted otherwise goes with it; nothing else may.
CREATE OR REPLACE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF TG_OP = 'DELETE' AND current_setting('setwell.erasing', true) = 'sample' THEN
    RETURN OLD;
  END IF;
  RAISE EXCEPTION '% is append-only', TG_TABLE_NAME USING ERRCODE = '23514', CONSTRAINT = TG_NAME;
END $$;
--> statement-breakpoint
CREATE OR REPLACE FUNCTION refuse_signed_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF TG_OP = 'DELETE' AND current_setting('setwell.erasing', true) IN ('customer', 'sample') THEN
    RETURN OLD;
  END IF;
  RAISE EXCEPTION '% is append-only', TG_TABLE_NAME USING ERRCODE = '23514', CONSTRAINT = TG_NAME;
END $$;
