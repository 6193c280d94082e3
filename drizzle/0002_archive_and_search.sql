ALTER TABLE "foods" ADD COLUMN "name" text;--> statement-breakpoint
UPDATE "foods" SET "name" = revision."spec" ->> 'name' FROM "food_revisions" AS revision WHERE revision."id" = "foods"."current_revision_id";--> statement-breakpoint
ALTER TABLE "foods" ALTER COLUMN "name" SET NOT NULL;--> statement-breakpoint
ALTER TABLE "foods" ADD COLUMN "archived_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "laminates" ADD COLUMN "name" text;--> statement-breakpoint
UPDATE "laminates" SET "name" = revision."spec" ->> 'name' FROM "laminate_revisions" AS revision WHERE revision."id" = "laminates"."current_revision_id";--> statement-breakpoint
ALTER TABLE "laminates" ALTER COLUMN "name" SET NOT NULL;--> statement-breakpoint
ALTER TABLE "laminates" ADD COLUMN "archived_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "materials" ADD COLUMN "name" text;--> statement-breakpoint
UPDATE "materials" SET "name" = revision."spec" ->> 'name' FROM "material_revisions" AS revision WHERE revision."id" = "materials"."current_revision_id";--> statement-breakpoint
ALTER TABLE "materials" ALTER COLUMN "name" SET NOT NULL;--> statement-breakpoint
ALTER TABLE "materials" ADD COLUMN "archived_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "packs" ADD COLUMN "name" text;--> statement-breakpoint
UPDATE "packs" SET "name" = revision."spec" ->> 'name' FROM "pack_revisions" AS revision WHERE revision."id" = "packs"."current_revision_id";--> statement-breakpoint
ALTER TABLE "packs" ALTER COLUMN "name" SET NOT NULL;--> statement-breakpoint
ALTER TABLE "packs" ADD COLUMN "archived_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "routes" ADD COLUMN "name" text;--> statement-breakpoint
UPDATE "routes" SET "name" = revision."spec" ->> 'name' FROM "route_revisions" AS revision WHERE revision."id" = "routes"."current_revision_id";--> statement-breakpoint
ALTER TABLE "routes" ALTER COLUMN "name" SET NOT NULL;--> statement-breakpoint
ALTER TABLE "routes" ADD COLUMN "archived_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "studies" ADD COLUMN "name" text;--> statement-breakpoint
UPDATE "studies" SET "name" = revision."spec" ->> 'name' FROM "study_revisions" AS revision WHERE revision."id" = "studies"."current_revision_id";--> statement-breakpoint
ALTER TABLE "studies" ALTER COLUMN "name" SET NOT NULL;--> statement-breakpoint
ALTER TABLE "studies" ADD COLUMN "archived_at" timestamp with time zone;--> statement-breakpoint
CREATE INDEX "foods_by_name" ON "foods" USING btree ("account_id",lower("name"),"id");--> statement-breakpoint
CREATE INDEX "laminate_revisions_inside" ON "laminate_revisions" USING gin ("spec" jsonb_path_ops);--> statement-breakpoint
CREATE INDEX "laminates_by_name" ON "laminates" USING btree ("account_id",lower("name"),"id");--> statement-breakpoint
CREATE INDEX "materials_by_name" ON "materials" USING btree ("account_id",lower("name"),"id");--> statement-breakpoint
CREATE INDEX "pack_revisions_inside" ON "pack_revisions" USING gin ("spec" jsonb_path_ops);--> statement-breakpoint
CREATE INDEX "packs_by_name" ON "packs" USING btree ("account_id",lower("name"),"id");--> statement-breakpoint
CREATE INDEX "routes_by_name" ON "routes" USING btree ("account_id",lower("name"),"id");--> statement-breakpoint
CREATE INDEX "studies_by_name" ON "studies" USING btree ("account_id",lower("name"),"id");--> statement-breakpoint
CREATE INDEX "study_revisions_inside" ON "study_revisions" USING gin ("spec" jsonb_path_ops);