-- A pin that was found or put is on the list of jobs at once, and in the drives that are reckoned by it.
CREATE TRIGGER sites_live AFTER UPDATE OF latitude, longitude ON sites
  FOR EACH ROW EXECUTE FUNCTION tell_live('jobs');
