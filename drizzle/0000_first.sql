CREATE TABLE "account" (
	"user_id" uuid NOT NULL,
	"type" text NOT NULL,
	"provider" text NOT NULL,
	"provider_account_id" text NOT NULL,
	"refresh_token" text,
	"access_token" text,
	"expires_at" integer,
	"token_type" text,
	"scope" text,
	"id_token" text,
	"session_state" text,
	CONSTRAINT "account_provider_provider_account_id_pk" PRIMARY KEY("provider","provider_account_id")
);
--> statement-breakpoint
CREATE TABLE "mail_token" (
	"token_hash" text PRIMARY KEY NOT NULL,
	"user_id" uuid NOT NULL,
	"purpose" text NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"used_at" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "signed_in_session" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"user_id" uuid NOT NULL,
	"firm_id" uuid,
	"browser" text DEFAULT '' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"last_seen_at" timestamp with time zone DEFAULT now() NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"revoked_at" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "user" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"name" text,
	"email" text NOT NULL,
	"email_verified" timestamp with time zone,
	"image" text,
	"password_hash" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "user_email_lower" CHECK ("user"."email" = lower("user"."email"))
);
--> statement-breakpoint
CREATE TABLE "verification_token" (
	"identifier" text NOT NULL,
	"token" text NOT NULL,
	"expires" timestamp with time zone NOT NULL,
	CONSTRAINT "verification_token_identifier_token_pk" PRIMARY KEY("identifier","token")
);
--> statement-breakpoint
CREATE TABLE "firm" (
	"firm_id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
ALTER TABLE "firm" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "membership" (
	"firm_id" uuid NOT NULL,
	"user_id" uuid NOT NULL,
	"role" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "membership_firm_id_user_id_pk" PRIMARY KEY("firm_id","user_id")
);
--> statement-breakpoint
ALTER TABLE "membership" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "project" (
	"firm_id" uuid NOT NULL,
	"project_id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"number" text NOT NULL,
	"name" text NOT NULL,
	"client" text DEFAULT '' NOT NULL,
	"place" text DEFAULT '' NOT NULL,
	"elevation_m" double precision DEFAULT 0 NOT NULL,
	"units" text DEFAULT 'SI' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"archived_at" timestamp with time zone,
	CONSTRAINT "project_firm_id_project_id_pk" PRIMARY KEY("firm_id","project_id")
);
--> statement-breakpoint
ALTER TABLE "project" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "design" (
	"firm_id" uuid NOT NULL,
	"design_id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"project_id" uuid NOT NULL,
	"name" text NOT NULL,
	"service" text DEFAULT '' NOT NULL,
	"head_seq" bigint DEFAULT 0 NOT NULL,
	"figures" jsonb,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"archived_at" timestamp with time zone,
	CONSTRAINT "design_firm_id_design_id_pk" PRIMARY KEY("firm_id","design_id")
);
--> statement-breakpoint
ALTER TABLE "design" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "edit" (
	"firm_id" uuid NOT NULL,
	"design_id" uuid NOT NULL,
	"seq" bigint NOT NULL,
	"edit_id" uuid NOT NULL,
	"user_id" uuid NOT NULL,
	"entry" jsonb NOT NULL,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "edit_firm_id_design_id_seq_pk" PRIMARY KEY("firm_id","design_id","seq")
);
--> statement-breakpoint
ALTER TABLE "edit" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "snapshot" (
	"firm_id" uuid NOT NULL,
	"design_id" uuid NOT NULL,
	"seq" bigint NOT NULL,
	"sheet" jsonb NOT NULL,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "snapshot_firm_id_design_id_seq_pk" PRIMARY KEY("firm_id","design_id","seq")
);
--> statement-breakpoint
ALTER TABLE "snapshot" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
CREATE TABLE "version" (
	"firm_id" uuid NOT NULL,
	"design_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"revision" text NOT NULL,
	"note" text NOT NULL,
	"status" text NOT NULL,
	"seq" bigint NOT NULL,
	"sheet" jsonb NOT NULL,
	"document" jsonb NOT NULL,
	"solution" jsonb NOT NULL,
	"heading" jsonb NOT NULL,
	"engine_version" text NOT NULL,
	"sha256" text NOT NULL,
	"user_id" uuid NOT NULL,
	"saved_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "version_firm_id_design_id_number_pk" PRIMARY KEY("firm_id","design_id","number"),
	CONSTRAINT "version_sha256" CHECK ("version"."sha256" ~ '^[0-9a-f]{64}$')
);
--> statement-breakpoint
ALTER TABLE "version" ENABLE ROW LEVEL SECURITY;--> statement-breakpoint
ALTER TABLE "account" ADD CONSTRAINT "account_user_id_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."user"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "mail_token" ADD CONSTRAINT "mail_token_user_id_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."user"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "signed_in_session" ADD CONSTRAINT "signed_in_session_user_id_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."user"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "membership" ADD CONSTRAINT "membership_firm_id_firm_firm_id_fk" FOREIGN KEY ("firm_id") REFERENCES "public"."firm"("firm_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "membership" ADD CONSTRAINT "membership_user_id_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "project" ADD CONSTRAINT "project_firm_id_firm_firm_id_fk" FOREIGN KEY ("firm_id") REFERENCES "public"."firm"("firm_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "design" ADD CONSTRAINT "design_firm_id_project_id_project_firm_id_project_id_fk" FOREIGN KEY ("firm_id","project_id") REFERENCES "public"."project"("firm_id","project_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "edit" ADD CONSTRAINT "edit_user_id_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "edit" ADD CONSTRAINT "edit_firm_id_design_id_design_firm_id_design_id_fk" FOREIGN KEY ("firm_id","design_id") REFERENCES "public"."design"("firm_id","design_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "snapshot" ADD CONSTRAINT "snapshot_firm_id_design_id_design_firm_id_design_id_fk" FOREIGN KEY ("firm_id","design_id") REFERENCES "public"."design"("firm_id","design_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "version" ADD CONSTRAINT "version_user_id_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "version" ADD CONSTRAINT "version_firm_id_design_id_design_firm_id_design_id_fk" FOREIGN KEY ("firm_id","design_id") REFERENCES "public"."design"("firm_id","design_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "mail_token_user" ON "mail_token" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "signed_in_session_user" ON "signed_in_session" USING btree ("user_id");--> statement-breakpoint
CREATE UNIQUE INDEX "user_email" ON "user" USING btree ("email");--> statement-breakpoint
CREATE INDEX "membership_user" ON "membership" USING btree ("user_id");--> statement-breakpoint
CREATE UNIQUE INDEX "project_number" ON "project" USING btree ("firm_id","number");--> statement-breakpoint
CREATE UNIQUE INDEX "design_name" ON "design" USING btree ("firm_id","project_id","name");--> statement-breakpoint
CREATE UNIQUE INDEX "edit_once" ON "edit" USING btree ("firm_id","design_id","edit_id");--> statement-breakpoint
CREATE UNIQUE INDEX "version_revision" ON "version" USING btree ("firm_id","design_id","revision");--> statement-breakpoint
CREATE INDEX "version_hash" ON "version" USING btree ("firm_id","sha256");--> statement-breakpoint
CREATE POLICY "of_current_firm" ON "firm" AS PERMISSIVE FOR ALL TO "evendraft_app" USING (firm_id = nullif(current_setting('app.firm_id', true), '')::uuid) WITH CHECK (firm_id = nullif(current_setting('app.firm_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_its_members" ON "firm" AS PERMISSIVE FOR SELECT TO "evendraft_app" USING (exists (select 1 from membership m where m.firm_id = firm.firm_id and m.user_id = nullif(current_setting('app.user_id', true), '')::uuid));--> statement-breakpoint
CREATE POLICY "of_current_firm" ON "membership" AS PERMISSIVE FOR ALL TO "evendraft_app" USING (firm_id = nullif(current_setting('app.firm_id', true), '')::uuid) WITH CHECK (firm_id = nullif(current_setting('app.firm_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_the_person" ON "membership" AS PERMISSIVE FOR SELECT TO "evendraft_app" USING (user_id = nullif(current_setting('app.user_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_current_firm" ON "project" AS PERMISSIVE FOR ALL TO "evendraft_app" USING (firm_id = nullif(current_setting('app.firm_id', true), '')::uuid) WITH CHECK (firm_id = nullif(current_setting('app.firm_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_current_firm" ON "design" AS PERMISSIVE FOR ALL TO "evendraft_app" USING (firm_id = nullif(current_setting('app.firm_id', true), '')::uuid) WITH CHECK (firm_id = nullif(current_setting('app.firm_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_current_firm" ON "edit" AS PERMISSIVE FOR ALL TO "evendraft_app" USING (firm_id = nullif(current_setting('app.firm_id', true), '')::uuid) WITH CHECK (firm_id = nullif(current_setting('app.firm_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_current_firm" ON "snapshot" AS PERMISSIVE FOR ALL TO "evendraft_app" USING (firm_id = nullif(current_setting('app.firm_id', true), '')::uuid) WITH CHECK (firm_id = nullif(current_setting('app.firm_id', true), '')::uuid);--> statement-breakpoint
CREATE POLICY "of_current_firm" ON "version" AS PERMISSIVE FOR ALL TO "evendraft_app" USING (firm_id = nullif(current_setting('app.firm_id', true), '')::uuid) WITH CHECK (firm_id = nullif(current_setting('app.firm_id', true), '')::uuid);