-- The audit log only grows, and a revision never changes: the database itself refuses, whoever asks.
CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION '% on % is refused: its rows never change', TG_OP, TG_TABLE_NAME USING ERRCODE = 'restrict_violation';
END;
$$;
--> statement-breakpoint
CREATE TRIGGER audit_entry_append_only BEFORE UPDATE OR DELETE OR TRUNCATE ON "audit_entry"
  FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER revision_immutable BEFORE UPDATE OR DELETE OR TRUNCATE ON "revision"
  FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER revision_geometry_immutable BEFORE UPDATE OR DELETE OR TRUNCATE ON "revision_geometry"
  FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
