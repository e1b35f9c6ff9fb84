-- What the office has to answer is on its screens at once.
CREATE TRIGGER scheduler_items_live AFTER INSERT OR UPDATE OR DELETE ON scheduler_items
  FOR EACH ROW EXECUTE FUNCTION tell_live('messages');
