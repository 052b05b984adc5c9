-- Who did what is only ever added to, like revisions and their values.
CREATE FUNCTION refuse_record_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
	RAISE EXCEPTION '% on % is refused: it is only added to', TG_OP, TG_TABLE_NAME USING ERRCODE = 'restrict_violation';
END
$$;
--> statement-breakpoint
CREATE TRIGGER audit_events_immutable BEFORE UPDATE OR DELETE ON audit_events FOR EACH ROW EXECUTE FUNCTION refuse_record_change();
--> statement-breakpoint
CREATE TRIGGER audit_events_not_emptied BEFORE TRUNCATE ON audit_events FOR EACH STATEMENT EXECUTE FUNCTION refuse_record_change();
--> statement-breakpoint
CREATE TRIGGER proposal_messages_immutable BEFORE UPDATE OR DELETE ON proposal_messages FOR EACH ROW EXECUTE FUNCTION refuse_record_change();
--> statement-breakpoint
CREATE TRIGGER proposal_messages_not_emptied BEFORE TRUNCATE ON proposal_messages FOR EACH STATEMENT EXECUTE FUNCTION refuse_record_change();
--> statement-breakpoint
-- The application's own role, where the database has one, is not even let near them.
DO $$
BEGIN
	IF EXISTS (SELECT FROM pg_roles WHERE rolname = 'stillfits_app') THEN
		REVOKE UPDATE, DELETE, TRUNCATE ON audit_events, proposal_messages, gear_revisions, gear_values FROM stillfits_app;
	END IF;
END
$$;
