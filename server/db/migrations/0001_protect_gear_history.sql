-- The history of a number is worth nothing if it can be rewritten: revisions and their values are only ever added.
CREATE FUNCTION refuse_history_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
	RAISE EXCEPTION '% on % is refused: revisions are immutable', TG_OP, TG_TABLE_NAME USING ERRCODE = 'restrict_violation';
END
$$;
--> statement-breakpoint
CREATE TRIGGER gear_revisions_immutable BEFORE UPDATE OR DELETE ON gear_revisions FOR EACH ROW EXECUTE FUNCTION refuse_history_change();
--> statement-breakpoint
CREATE TRIGGER gear_revisions_not_emptied BEFORE TRUNCATE ON gear_revisions FOR EACH STATEMENT EXECUTE FUNCTION refuse_history_change();
--> statement-breakpoint
CREATE TRIGGER gear_values_immutable BEFORE UPDATE OR DELETE ON gear_values FOR EACH ROW EXECUTE FUNCTION refuse_history_change();
--> statement-breakpoint
CREATE TRIGGER gear_values_not_emptied BEFORE TRUNCATE ON gear_values FOR EACH STATEMENT EXECUTE FUNCTION refuse_history_change();
--> statement-breakpoint
INSERT INTO catalogue_version (id, version) VALUES (1, 1);
--> statement-breakpoint
-- Raised inside the writer's own transaction: a reader that sees the new version sees the new gear too.
CREATE FUNCTION raise_catalogue_version() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
	UPDATE catalogue_version SET version = version + 1 WHERE id = 1;
	RETURN NULL;
END
$$;
--> statement-breakpoint
CREATE TRIGGER gear_raises_catalogue_version AFTER INSERT OR UPDATE OR DELETE OR TRUNCATE ON gear FOR EACH STATEMENT EXECUTE FUNCTION raise_catalogue_version();
