-- Row-level security binds the owner of the tables too.
ALTER TABLE "firm" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "membership" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "project" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "design" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "edit" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "snapshot" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "version" FORCE ROW LEVEL SECURITY;--> statement-breakpoint
-- The application owns nothing and holds only these rights.
GRANT USAGE ON SCHEMA "public" TO "evendraft_app";--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE, DELETE ON "user", "account", "verification_token", "signed_in_session", "mail_token" TO "evendraft_app";--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE ON "firm", "membership", "project", "design" TO "evendraft_app";--> statement-breakpoint
GRANT DELETE ON "membership" TO "evendraft_app";--> statement-breakpoint
GRANT SELECT, INSERT ON "edit", "version" TO "evendraft_app";--> statement-breakpoint
GRANT SELECT, INSERT, DELETE ON "snapshot" TO "evendraft_app";--> statement-breakpoint
-- A saved version and an entry of the edit log never change, whoever asks.
CREATE FUNCTION "refuse_change"() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
	RAISE EXCEPTION 'rows of % are never changed or removed', TG_TABLE_NAME USING ERRCODE = 'restrict_violation';
END $$;--> statement-breakpoint
CREATE TRIGGER "version_is_immutable" BEFORE UPDATE OR DELETE ON "version" FOR EACH ROW EXECUTE FUNCTION "refuse_change"();--> statement-breakpoint
CREATE TRIGGER "edit_is_immutable" BEFORE UPDATE OR DELETE ON "edit" FOR EACH ROW EXECUTE FUNCTION "refuse_change"();
