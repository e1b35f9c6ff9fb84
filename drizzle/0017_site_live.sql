-- What comes from the site is on the office's screens at once.
CREATE TRIGGER snags_live AFTER INSERT OR UPDATE OR DELETE ON snags
  FOR EACH ROW EXECUTE FUNCTION tell_live('site');--> statement-breakpoint
CREATE TRIGGER sign_offs_live AFTER INSERT ON sign_offs
  FOR EACH ROW EXECUTE FUNCTION tell_live('site');--> statement-breakpoint
CREATE TRIGGER files_live AFTER INSERT OR UPDATE OR DELETE ON files
  FOR EACH ROW EXECUTE FUNCTION tell_live('site');--> statement-breakpoint
CREATE TRIGGER visit_pauses_live AFTER INSERT OR UPDATE ON visit_pauses
  FOR EACH ROW EXECUTE FUNCTION tell_live('site');--> statement-breakpoint
CREATE TRIGGER visit_checks_live AFTER INSERT OR UPDATE ON visit_checks
  FOR EACH ROW EXECUTE FUNCTION tell_live('site');--> statement-breakpoint
CREATE TRIGGER site_checks_live AFTER INSERT OR UPDATE ON site_checks
  FOR EACH ROW EXECUTE FUNCTION tell_live('site');
