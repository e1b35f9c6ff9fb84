-- Each change is told to the screens of its shop when it is committed, and never when it is not: the payload
-- is the shop and the topic, no person and no row. Equal payloads of one transaction are told once.
CREATE FUNCTION tell_live() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  PERFORM pg_notify('setwell_live', coalesce(NEW.shop_id, OLD.shop_id) || ' ' || TG_ARGV[0]);
  RETURN NULL;
END $$;--> statement-breakpoint
CREATE TRIGGER visits_live AFTER INSERT OR UPDATE OR DELETE ON visits
  FOR EACH ROW EXECUTE FUNCTION tell_live('visits');--> statement-breakpoint
CREATE TRIGGER readings_live AFTER INSERT ON readings
  FOR EACH ROW EXECUTE FUNCTION tell_live('readings');--> statement-breakpoint
CREATE TRIGGER messages_live AFTER INSERT OR UPDATE OR DELETE ON messages
  FOR EACH ROW EXECUTE FUNCTION tell_live('messages');--> statement-breakpoint
CREATE TRIGGER releases_live AFTER INSERT ON releases
  FOR EACH ROW EXECUTE FUNCTION tell_live('releases');--> statement-breakpoint
CREATE TRIGGER release_receipts_live AFTER INSERT ON release_receipts
  FOR EACH ROW EXECUTE FUNCTION tell_live('releases');--> statement-breakpoint
CREATE TRIGGER jobs_live AFTER INSERT OR UPDATE OR DELETE ON jobs
  FOR EACH ROW EXECUTE FUNCTION tell_live('jobs');--> statement-breakpoint
CREATE TRIGGER crews_live AFTER INSERT OR UPDATE OR DELETE ON crews
  FOR EACH ROW EXECUTE FUNCTION tell_live('crews');--> statement-breakpoint
CREATE TRIGGER crew_people_live AFTER INSERT OR UPDATE OR DELETE ON crew_people
  FOR EACH ROW EXECUTE FUNCTION tell_live('crews');--> statement-breakpoint
CREATE TRIGGER days_off_live AFTER INSERT OR UPDATE OR DELETE ON days_off
  FOR EACH ROW EXECUTE FUNCTION tell_live('crews');--> statement-breakpoint
-- When a visit last changed, for the stamp of its calendar entry (RFC 5545, 3.8.7.2).
CREATE FUNCTION set_changed_at() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  NEW.changed_at := now();
  RETURN NEW;
END $$;--> statement-breakpoint
CREATE TRIGGER visits_changed_at BEFORE UPDATE ON visits
  FOR EACH ROW EXECUTE FUNCTION set_changed_at();
