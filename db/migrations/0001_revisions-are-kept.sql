-- What was issued stays as it was issued. Only the removal of the whole site takes its revisions with it.
CREATE FUNCTION "keep_revisions"() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF TG_OP = 'DELETE' AND NOT EXISTS (SELECT 1 FROM "sites" WHERE "id" = OLD."site_id") THEN
    RETURN OLD;
  END IF;
  RAISE EXCEPTION 'a revision is never changed or removed' USING ERRCODE = 'restrict_violation';
END;
$$;
--> statement-breakpoint
CREATE TRIGGER "revisions_are_kept" BEFORE UPDATE OR DELETE ON "revisions"
  FOR EACH ROW EXECUTE FUNCTION "keep_revisions"();
--> statement-breakpoint
CREATE TRIGGER "revisions_are_not_emptied" BEFORE TRUNCATE ON "revisions"
  FOR EACH STATEMENT EXECUTE FUNCTION "keep_revisions"();
