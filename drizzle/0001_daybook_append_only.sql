-- The daybook is only ever added to.
CREATE FUNCTION "daybook_refuse_change"() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
	RAISE EXCEPTION 'the daybook is only ever added to';
END;
$$;
--> statement-breakpoint
CREATE TRIGGER "daybook_append_only" BEFORE UPDATE OR DELETE ON "daybook" FOR EACH ROW EXECUTE FUNCTION "daybook_refuse_change"();
