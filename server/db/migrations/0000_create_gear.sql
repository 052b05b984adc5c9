CREATE TABLE "catalogue_version" (
	"id" integer PRIMARY KEY NOT NULL,
	"version" bigint NOT NULL,
	CONSTRAINT "catalogue_version_single" CHECK ("catalogue_version"."id" = 1)
);
--> statement-breakpoint
CREATE TABLE "gear" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "gear_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"slug" text NOT NULL,
	"kind" text NOT NULL,
	"brand" text NOT NULL,
	"model" text NOT NULL,
	"gtin" text,
	"status" text DEFAULT 'unknown' NOT NULL,
	"notes" text,
	"head_revision" integer NOT NULL,
	"specs" jsonb NOT NULL,
	"provenance" jsonb NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "gear_slug_form" CHECK ("gear"."slug" ~ '^[a-z0-9]+(-[a-z0-9]+)*$' and length("gear"."slug") <= 120),
	CONSTRAINT "gear_kind_form" CHECK ("gear"."kind" ~ '^[a-z]+(-[a-z]+)*$'),
	CONSTRAINT "gear_name_length" CHECK (length("gear"."brand") between 1 and 80 and length("gear"."model") between 1 and 120),
	CONSTRAINT "gear_gtin_form" CHECK ("gear"."gtin" ~ '^[0-9]{8,14}$'),
	CONSTRAINT "gear_status_known" CHECK ("gear"."status" in ('current', 'discontinued', 'unknown')),
	CONSTRAINT "gear_head_revision_positive" CHECK ("gear"."head_revision" >= 1),
	CONSTRAINT "gear_specs_object" CHECK (jsonb_typeof("gear"."specs") = 'object' and jsonb_typeof("gear"."provenance") = 'object')
);
--> statement-breakpoint
CREATE TABLE "gear_revisions" (
	"gear_id" integer NOT NULL,
	"number" integer NOT NULL,
	"specs" jsonb NOT NULL,
	"summary" text,
	"author" text NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "gear_revisions_gear_id_number_pk" PRIMARY KEY("gear_id","number"),
	CONSTRAINT "gear_revisions_number_positive" CHECK ("gear_revisions"."number" >= 1),
	CONSTRAINT "gear_revisions_specs_object" CHECK (jsonb_typeof("gear_revisions"."specs") = 'object')
);
--> statement-breakpoint
CREATE TABLE "gear_values" (
	"gear_id" integer NOT NULL,
	"revision" integer NOT NULL,
	"key" text NOT NULL,
	"value" jsonb,
	"source" text,
	"plus_minus" double precision,
	"evidence" text,
	"dated" date NOT NULL,
	"author" text NOT NULL,
	CONSTRAINT "gear_values_gear_id_revision_key_pk" PRIMARY KEY("gear_id","revision","key"),
	CONSTRAINT "gear_values_source_known" CHECK ("gear_values"."source" in ('measured', 'maker', 'estimate')),
	CONSTRAINT "gear_values_removed_whole" CHECK (("gear_values"."value" is null) = ("gear_values"."source" is null)),
	CONSTRAINT "gear_values_plus_minus_positive" CHECK ("gear_values"."plus_minus" >= 0)
);
--> statement-breakpoint
ALTER TABLE "gear_revisions" ADD CONSTRAINT "gear_revisions_gear_id_gear_id_fk" FOREIGN KEY ("gear_id") REFERENCES "public"."gear"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "gear_values" ADD CONSTRAINT "gear_values_revision_fk" FOREIGN KEY ("gear_id","revision") REFERENCES "public"."gear_revisions"("gear_id","number") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "gear_slug_key" ON "gear" USING btree ("slug");--> statement-breakpoint
CREATE UNIQUE INDEX "gear_gtin_key" ON "gear" USING btree ("gtin");--> statement-breakpoint
CREATE INDEX "gear_kind_name_idx" ON "gear" USING btree ("kind",lower("brand"),lower("model"),"id");--> statement-breakpoint
CREATE INDEX "gear_name_idx" ON "gear" USING btree (lower("brand"),lower("model"),"id");--> statement-breakpoint
CREATE INDEX "gear_updated_idx" ON "gear" USING btree ("updated_at","id");