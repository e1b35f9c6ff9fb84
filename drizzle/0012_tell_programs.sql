-- Other programs are told of what was committed, whichever way it came about: so the rows themselves say it.
CREATE FUNCTION tell_programs(of_shop text, what text, about jsonb) RETURNS void LANGUAGE sql AS $$
  INSERT INTO webhook_deliveries (shop_id, webhook_id, event, subject)
  SELECT shop_id, id, what, about FROM webhooks
  WHERE shop_id = of_shop AND stopped_at IS NULL AND events @> to_jsonb(what);
$$;
--> statement-breakpoint
CREATE FUNCTION tell_of_visit() RETURNS trigger LANGUAGE plpgsql AS $$
DECLARE
  what text;
BEGIN
  IF NEW.status = 'held' THEN
    RETURN NULL;
  ELSIF TG_OP = 'INSERT' OR OLD.status = 'held' THEN
    what := 'visit.booked';
  ELSIF NEW.status = 'called-off' AND OLD.status <> 'called-off' THEN
    what := 'visit.called-off';
  ELSIF NEW.starts_at <> OLD.starts_at OR NEW.ends_at <> OLD.ends_at OR NEW.crew_id <> OLD.crew_id THEN
    what := 'visit.moved';
  ELSIF NEW.status = 'confirmed' AND OLD.status <> 'confirmed' THEN
    what := 'visit.confirmed';
  ELSE
    RETURN NULL;
  END IF;
  PERFORM tell_programs(NEW.shop_id, what, jsonb_build_object(
    'visitId', NEW.id, 'jobId', NEW.job_id, 'kind', NEW.kind, 'version', NEW.version));
  RETURN NULL;
END $$;
--> statement-breakpoint
CREATE TRIGGER visits_tell_programs AFTER INSERT OR UPDATE ON visits
  FOR EACH ROW EXECUTE FUNCTION tell_of_visit();
--> statement-breakpoint
CREATE FUNCTION tell_of_release() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  PERFORM tell_programs(NEW.shop_id, 'sheet.released', jsonb_build_object(
    'releaseId', NEW.id, 'roomId', NEW.room_id, 'revision', NEW.revision,
    'jobId', (SELECT job_id FROM rooms WHERE id = NEW.room_id)));
  RETURN NULL;
END $$;
--> statement-breakpoint
CREATE TRIGGER releases_tell_programs AFTER INSERT ON releases
  FOR EACH ROW EXECUTE FUNCTION tell_of_release();
--> statement-breakpoint
CREATE FUNCTION tell_of_sign_off() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  PERFORM tell_programs(NEW.shop_id, 'job.signed-off', jsonb_build_object(
    'signOffId', NEW.id, 'visitId', NEW.visit_id, 'jobId', NEW.job_id));
  RETURN NULL;
END $$;
--> statement-breakpoint
CREATE TRIGGER sign_offs_tell_programs AFTER INSERT ON sign_offs
  FOR EACH ROW EXECUTE FUNCTION tell_of_sign_off();
