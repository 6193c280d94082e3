-- What drizzle-kit does not generate: deferred keys, what may never change, and what the application role may do.
--> statement-breakpoint
ALTER TABLE "materials" ADD CONSTRAINT "materials_current_revision" FOREIGN KEY ("id", "current_revision_id") REFERENCES "material_revisions" ("thing_id", "id") DEFERRABLE INITIALLY DEFERRED;
--> statement-breakpoint
ALTER TABLE "laminates" ADD CONSTRAINT "laminates_current_revision" FOREIGN KEY ("id", "current_revision_id") REFERENCES "laminate_revisions" ("thing_id", "id") DEFERRABLE INITIALLY DEFERRED;
--> statement-breakpoint
ALTER TABLE "packs" ADD CONSTRAINT "packs_current_revision" FOREIGN KEY ("id", "current_revision_id") REFERENCES "pack_revisions" ("thing_id", "id") DEFERRABLE INITIALLY DEFERRED;
--> statement-breakpoint
ALTER TABLE "foods" ADD CONSTRAINT "foods_current_revision" FOREIGN KEY ("id", "current_revision_id") REFERENCES "food_revisions" ("thing_id", "id") DEFERRABLE INITIALLY DEFERRED;
--> statement-breakpoint
ALTER TABLE "routes" ADD CONSTRAINT "routes_current_revision" FOREIGN KEY ("id", "current_revision_id") REFERENCES "route_revisions" ("thing_id", "id") DEFERRABLE INITIALLY DEFERRED;
--> statement-breakpoint
ALTER TABLE "studies" ADD CONSTRAINT "studies_current_revision" FOREIGN KEY ("id", "current_revision_id") REFERENCES "study_revisions" ("thing_id", "id") DEFERRABLE INITIALLY DEFERRED;
--> statement-breakpoint
CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION 'Rows of % are never changed or deleted.', TG_TABLE_NAME USING ERRCODE = 'insufficient_privilege';
END $$;
--> statement-breakpoint
CREATE TRIGGER "material_revisions_never_change" BEFORE UPDATE OR DELETE OR TRUNCATE ON "material_revisions" FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER "laminate_revisions_never_change" BEFORE UPDATE OR DELETE OR TRUNCATE ON "laminate_revisions" FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER "pack_revisions_never_change" BEFORE UPDATE OR DELETE OR TRUNCATE ON "pack_revisions" FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER "food_revisions_never_change" BEFORE UPDATE OR DELETE OR TRUNCATE ON "food_revisions" FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER "route_revisions_never_change" BEFORE UPDATE OR DELETE OR TRUNCATE ON "route_revisions" FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER "study_revisions_never_change" BEFORE UPDATE OR DELETE OR TRUNCATE ON "study_revisions" FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER "results_never_change" BEFORE UPDATE OR DELETE OR TRUNCATE ON "results" FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER "result_pins_never_change" BEFORE UPDATE OR DELETE OR TRUNCATE ON "result_pins" FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER "audit_log_never_change" BEFORE UPDATE OR DELETE OR TRUNCATE ON "audit_log" FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
REVOKE ALL ON SCHEMA public FROM PUBLIC;
--> statement-breakpoint
GRANT USAGE ON SCHEMA public TO larderline_app;
--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE, DELETE ON "accounts", "companies", "memberships", "users", "people", "sessions", "attempts", "password_reset_tokens", "idempotency_keys" TO larderline_app;
--> statement-breakpoint
GRANT SELECT, INSERT, UPDATE ON "materials", "laminates", "packs", "foods", "routes", "studies" TO larderline_app;
--> statement-breakpoint
GRANT SELECT, INSERT ON "material_revisions", "laminate_revisions", "pack_revisions", "food_revisions", "route_revisions", "study_revisions", "results", "result_pins", "audit_log" TO larderline_app;
