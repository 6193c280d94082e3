CREATE TABLE "accounts" (
	"id" uuid PRIMARY KEY NOT NULL,
	"slug" text NOT NULL,
	"name" text NOT NULL,
	"currency" text NOT NULL,
	"time_zone" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "accounts_slug" UNIQUE("slug"),
	CONSTRAINT "accounts_slug_form" CHECK ("accounts"."slug" ~ '^[a-z0-9]([a-z0-9-]{0,60}[a-z0-9])?$'),
	CONSTRAINT "accounts_currency_form" CHECK ("accounts"."currency" ~ '^[A-Z]{3}$')
);
--> statement-breakpoint
CREATE TABLE "companies" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"name" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "companies_of_account" UNIQUE("account_id","id")
);
--> statement-breakpoint
CREATE TABLE "memberships" (
	"account_id" uuid NOT NULL,
	"user_id" uuid NOT NULL,
	"roles" text[] NOT NULL,
	"company_id" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "memberships_account_id_user_id_pk" PRIMARY KEY("account_id","user_id"),
	CONSTRAINT "memberships_seat_or_guest" CHECK (("memberships"."company_id" IS NULL AND "memberships"."roles" IN (ARRAY['engineer'], ARRAY['admin'], ARRAY['engineer', 'admin']))
        OR ("memberships"."company_id" IS NOT NULL AND "memberships"."roles" IN (ARRAY['supplier'], ARRAY['client'])))
);
--> statement-breakpoint
CREATE TABLE "audit_log" (
	"id" uuid PRIMARY KEY NOT NULL,
	"at" timestamp with time zone DEFAULT now() NOT NULL,
	"account_id" uuid,
	"actor_user_id" uuid,
	"action" text NOT NULL,
	"subject_kind" text NOT NULL,
	"subject_id" uuid
);
--> statement-breakpoint
CREATE TABLE "idempotency_keys" (
	"user_id" uuid NOT NULL,
	"key" text NOT NULL,
	"request_sha256" text NOT NULL,
	"status" integer NOT NULL,
	"body" text NOT NULL,
	"etag" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "idempotency_keys_user_id_key_pk" PRIMARY KEY("user_id","key")
);
--> statement-breakpoint
CREATE TABLE "food_revisions" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"thing_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"spec" jsonb NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"created_by" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "food_revisions_number" UNIQUE("thing_id","number"),
	CONSTRAINT "food_revisions_of_thing" UNIQUE("thing_id","id")
);
--> statement-breakpoint
CREATE TABLE "foods" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"current_revision_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "foods_of_account" UNIQUE("account_id","id")
);
--> statement-breakpoint
CREATE TABLE "laminate_revisions" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"thing_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"spec" jsonb NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"created_by" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "laminate_revisions_number" UNIQUE("thing_id","number"),
	CONSTRAINT "laminate_revisions_of_thing" UNIQUE("thing_id","id")
);
--> statement-breakpoint
CREATE TABLE "laminates" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"current_revision_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "laminates_of_account" UNIQUE("account_id","id")
);
--> statement-breakpoint
CREATE TABLE "material_revisions" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"thing_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"spec" jsonb NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"created_by" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "material_revisions_number" UNIQUE("thing_id","number"),
	CONSTRAINT "material_revisions_of_thing" UNIQUE("thing_id","id")
);
--> statement-breakpoint
CREATE TABLE "materials" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"current_revision_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "materials_of_account" UNIQUE("account_id","id")
);
--> statement-breakpoint
CREATE TABLE "pack_revisions" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"thing_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"spec" jsonb NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"created_by" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "pack_revisions_number" UNIQUE("thing_id","number"),
	CONSTRAINT "pack_revisions_of_thing" UNIQUE("thing_id","id")
);
--> statement-breakpoint
CREATE TABLE "packs" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"current_revision_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "packs_of_account" UNIQUE("account_id","id")
);
--> statement-breakpoint
CREATE TABLE "route_revisions" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"thing_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"spec" jsonb NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"created_by" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "route_revisions_number" UNIQUE("thing_id","number"),
	CONSTRAINT "route_revisions_of_thing" UNIQUE("thing_id","id")
);
--> statement-breakpoint
CREATE TABLE "routes" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"current_revision_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "routes_of_account" UNIQUE("account_id","id")
);
--> statement-breakpoint
CREATE TABLE "studies" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"current_revision_id" uuid NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "studies_of_account" UNIQUE("account_id","id")
);
--> statement-breakpoint
CREATE TABLE "study_revisions" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"thing_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"spec" jsonb NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"created_by" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "study_revisions_number" UNIQUE("thing_id","number"),
	CONSTRAINT "study_revisions_of_thing" UNIQUE("thing_id","id")
);
--> statement-breakpoint
CREATE TABLE "attempts" (
	"id" uuid PRIMARY KEY NOT NULL,
	"kind" text NOT NULL,
	"subject_sha256" text NOT NULL,
	"at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "password_reset_tokens" (
	"token_sha256" text PRIMARY KEY NOT NULL,
	"user_id" uuid NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "people" (
	"user_id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"email" text NOT NULL
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"id" text PRIMARY KEY NOT NULL,
	"user_id" uuid NOT NULL,
	"expires_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "users" (
	"id" uuid PRIMARY KEY NOT NULL,
	"password_hash" text NOT NULL,
	"unit_system" text DEFAULT 'metric' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "users_unit_system" CHECK ("users"."unit_system" IN ('metric', 'us_customary'))
);
--> statement-breakpoint
CREATE TABLE "result_pins" (
	"result_id" uuid NOT NULL,
	"collection" text NOT NULL,
	"thing_id" uuid NOT NULL,
	"revision_id" uuid NOT NULL,
	CONSTRAINT "result_pins_result_id_revision_id_pk" PRIMARY KEY("result_id","revision_id")
);
--> statement-breakpoint
CREATE TABLE "results" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"study_id" uuid NOT NULL,
	"study_revision_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"engine_version" text NOT NULL,
	"body" "bytea" NOT NULL,
	"sha256" "bytea" NOT NULL,
	"headline" jsonb NOT NULL,
	"created_by" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "results_number" UNIQUE("study_id","number")
);
--> statement-breakpoint
ALTER TABLE "companies" ADD CONSTRAINT "companies_account_id_accounts_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."accounts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_account_id_accounts_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."accounts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_company_of_account" FOREIGN KEY ("account_id","company_id") REFERENCES "public"."companies"("account_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "idempotency_keys" ADD CONSTRAINT "idempotency_keys_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "food_revisions" ADD CONSTRAINT "food_revisions_created_by_users_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "food_revisions" ADD CONSTRAINT "food_revisions_thing" FOREIGN KEY ("account_id","thing_id") REFERENCES "public"."foods"("account_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "foods" ADD CONSTRAINT "foods_account_id_accounts_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."accounts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "laminate_revisions" ADD CONSTRAINT "laminate_revisions_created_by_users_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "laminate_revisions" ADD CONSTRAINT "laminate_revisions_thing" FOREIGN KEY ("account_id","thing_id") REFERENCES "public"."laminates"("account_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "laminates" ADD CONSTRAINT "laminates_account_id_accounts_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."accounts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "material_revisions" ADD CONSTRAINT "material_revisions_created_by_users_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "material_revisions" ADD CONSTRAINT "material_revisions_thing" FOREIGN KEY ("account_id","thing_id") REFERENCES "public"."materials"("account_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "materials" ADD CONSTRAINT "materials_account_id_accounts_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."accounts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pack_revisions" ADD CONSTRAINT "pack_revisions_created_by_users_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pack_revisions" ADD CONSTRAINT "pack_revisions_thing" FOREIGN KEY ("account_id","thing_id") REFERENCES "public"."packs"("account_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "packs" ADD CONSTRAINT "packs_account_id_accounts_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."accounts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "route_revisions" ADD CONSTRAINT "route_revisions_created_by_users_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "route_revisions" ADD CONSTRAINT "route_revisions_thing" FOREIGN KEY ("account_id","thing_id") REFERENCES "public"."routes"("account_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "routes" ADD CONSTRAINT "routes_account_id_accounts_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."accounts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "studies" ADD CONSTRAINT "studies_account_id_accounts_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."accounts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "study_revisions" ADD CONSTRAINT "study_revisions_created_by_users_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "study_revisions" ADD CONSTRAINT "study_revisions_thing" FOREIGN KEY ("account_id","thing_id") REFERENCES "public"."studies"("account_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "password_reset_tokens" ADD CONSTRAINT "password_reset_tokens_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "people" ADD CONSTRAINT "people_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sessions" ADD CONSTRAINT "sessions_user_id_users_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "result_pins" ADD CONSTRAINT "result_pins_result_id_results_id_fk" FOREIGN KEY ("result_id") REFERENCES "public"."results"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "results" ADD CONSTRAINT "results_created_by_users_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."users"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "results" ADD CONSTRAINT "results_study" FOREIGN KEY ("account_id","study_id") REFERENCES "public"."studies"("account_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "results" ADD CONSTRAINT "results_study_revision" FOREIGN KEY ("study_id","study_revision_id") REFERENCES "public"."study_revisions"("thing_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "memberships_of_user" ON "memberships" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "audit_log_of_account" ON "audit_log" USING btree ("account_id","id");--> statement-breakpoint
CREATE INDEX "food_revisions_of_account" ON "food_revisions" USING btree ("account_id","thing_id");--> statement-breakpoint
CREATE INDEX "laminate_revisions_of_account" ON "laminate_revisions" USING btree ("account_id","thing_id");--> statement-breakpoint
CREATE INDEX "material_revisions_of_account" ON "material_revisions" USING btree ("account_id","thing_id");--> statement-breakpoint
CREATE INDEX "pack_revisions_of_account" ON "pack_revisions" USING btree ("account_id","thing_id");--> statement-breakpoint
CREATE INDEX "route_revisions_of_account" ON "route_revisions" USING btree ("account_id","thing_id");--> statement-breakpoint
CREATE INDEX "study_revisions_of_account" ON "study_revisions" USING btree ("account_id","thing_id");--> statement-breakpoint
CREATE INDEX "attempts_by_subject" ON "attempts" USING btree ("kind","subject_sha256","at");--> statement-breakpoint
CREATE INDEX "password_reset_tokens_of_user" ON "password_reset_tokens" USING btree ("user_id");--> statement-breakpoint
CREATE UNIQUE INDEX "people_email" ON "people" USING btree (lower("email"));--> statement-breakpoint
CREATE INDEX "sessions_of_user" ON "sessions" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "result_pins_by_revision" ON "result_pins" USING btree ("revision_id");--> statement-breakpoint
CREATE INDEX "results_of_account" ON "results" USING btree ("account_id","id");