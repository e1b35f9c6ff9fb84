-- A signature is never changed. It goes only when its customer is erased, which says so for its transaction.
CREATE FUNCTION refuse_signed_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF TG_OP = 'DELETE' AND current_setting('setwell.erasing', true) = 'customer' THEN
    RETURN OLD;
  END IF;
  RAISE EXCEPTION '% is append-only', TG_TABLE_NAME USING ERRCODE = '23514', CONSTRAINT = TG_NAME;
END $$;
--> statement-breakpoint
CREATE TRIGGER sign_offs_frozen BEFORE UPDATE OR DELETE ON sign_offs
  FOR EACH ROW EXECUTE FUNCTION refuse_signed_change();
