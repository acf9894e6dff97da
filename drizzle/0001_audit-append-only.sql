CREATE FUNCTION audit_refuse() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION 'the audit log is append-only' USING ERRCODE = 'insufficient_privilege';
END
$$;
--> statement-breakpoint
CREATE TRIGGER audit_append_only BEFORE UPDATE OR DELETE ON "audit"
  FOR EACH ROW EXECUTE FUNCTION audit_refuse();
--> statement-breakpoint
CREATE TRIGGER audit_never_emptied BEFORE TRUNCATE ON "audit"
  FOR EACH STATEMENT EXECUTE FUNCTION audit_refuse();
