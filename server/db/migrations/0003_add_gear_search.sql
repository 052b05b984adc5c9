ALTER TABLE "gear" ADD COLUMN "search_name" text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE "gear" ADD COLUMN "search_code" text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE "gear" ADD COLUMN "search_full_code" text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE "gear" ADD COLUMN "search_terms" text[] DEFAULT '{}' NOT NULL;--> statement-breakpoint
ALTER TABLE "gear" ADD COLUMN "search_version" integer DEFAULT 0 NOT NULL;--> statement-breakpoint
CREATE INDEX "gear_search_name_idx" ON "gear" USING gin ("search_name" gin_trgm_ops);--> statement-breakpoint
CREATE INDEX "gear_search_terms_idx" ON "gear" USING gin ("search_terms");--> statement-breakpoint
CREATE INDEX "gear_search_code_idx" ON "gear" USING btree ("search_code" text_pattern_ops);--> statement-breakpoint
CREATE INDEX "gear_search_full_code_idx" ON "gear" USING btree ("search_full_code" text_pattern_ops);--> statement-breakpoint
CREATE INDEX "gear_search_version_idx" ON "gear" USING btree ("search_version");