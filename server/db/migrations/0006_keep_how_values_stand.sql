ALTER TABLE "gear_revisions" ADD COLUMN "identity" jsonb;--> statement-breakpoint
ALTER TABLE "gear_values" ADD COLUMN "standing" text DEFAULT 'plain' NOT NULL;--> statement-breakpoint
ALTER TABLE "gear_values" ADD CONSTRAINT "gear_values_standing_known" CHECK ("gear_values"."standing" in ('plain', 'chosen', 'reset'));