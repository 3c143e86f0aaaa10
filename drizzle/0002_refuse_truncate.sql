-- Emptying the table at once is a change too; a trigger on rows does not see it.
CREATE TRIGGER "version_is_not_emptied" BEFORE TRUNCATE ON "version" FOR EACH STATEMENT EXECUTE FUNCTION "refuse_change"();--> statement-breakpoint
CREATE TRIGGER "edit_is_not_emptied" BEFORE TRUNCATE ON "edit" FOR EACH STATEMENT EXECUTE FUNCTION "refuse_change"();
