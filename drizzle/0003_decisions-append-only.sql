-- What moderators decided, what a record said before, and how a part held in use are never said otherwise afterwards.
CREATE TRIGGER decision_append_only BEFORE UPDATE OR DELETE OR TRUNCATE ON "decision"
  FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER cut_earlier_append_only BEFORE UPDATE OR DELETE OR TRUNCATE ON "cut_earlier"
  FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER in_service_note_append_only BEFORE UPDATE OR DELETE OR TRUNCATE ON "in_service_note"
  FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
