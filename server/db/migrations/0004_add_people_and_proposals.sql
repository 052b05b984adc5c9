CREATE TABLE "audit_events" (
	"id" bigint PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "audit_events_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"actor_id" integer,
	"action" text NOT NULL,
	"subject_type" text NOT NULL,
	"subject_id" text NOT NULL,
	"detail" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"request_id" text
);
--> statement-breakpoint
CREATE TABLE "email_tokens" (
	"token_hash" text PRIMARY KEY NOT NULL,
	"person_id" integer NOT NULL,
	"purpose" text NOT NULL,
	"email" text NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"expires_at" timestamp (3) with time zone NOT NULL,
	"used_at" timestamp (3) with time zone,
	CONSTRAINT "email_tokens_purpose_known" CHECK ("email_tokens"."purpose" in ('confirm', 'reset', 'change-email', 'unsubscribe'))
);
--> statement-breakpoint
CREATE TABLE "idempotency_keys" (
	"person_id" integer NOT NULL,
	"key" text NOT NULL,
	"request_hash" text NOT NULL,
	"status" integer,
	"headers" jsonb,
	"body" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "idempotency_keys_person_id_key_pk" PRIMARY KEY("person_id","key")
);
--> statement-breakpoint
CREATE TABLE "long_jobs" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"kind" text NOT NULL,
	"started_by" integer NOT NULL,
	"subject" jsonb NOT NULL,
	"status" text DEFAULT 'waiting' NOT NULL,
	"done" integer DEFAULT 0 NOT NULL,
	"total" integer,
	"outcome" jsonb,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"ended_at" timestamp (3) with time zone,
	CONSTRAINT "long_jobs_status_known" CHECK ("long_jobs"."status" in ('waiting', 'running', 'done', 'failed'))
);
--> statement-breakpoint
CREATE TABLE "outbox" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"person_id" integer,
	"recipient" text NOT NULL,
	"kind" text NOT NULL,
	"subject" text NOT NULL,
	"text_body" text NOT NULL,
	"html_body" text NOT NULL,
	"unsubscribe_url" text,
	"status" text DEFAULT 'waiting' NOT NULL,
	"attempts" integer DEFAULT 0 NOT NULL,
	"last_error" text,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"sent_at" timestamp (3) with time zone,
	CONSTRAINT "outbox_status_known" CHECK ("outbox"."status" in ('waiting', 'sent', 'dead'))
);
--> statement-breakpoint
CREATE TABLE "people" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "people_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"name" text,
	"email" text,
	"email_confirmed_at" timestamp (3) with time zone,
	"password_hash" text,
	"role" text DEFAULT 'member' NOT NULL,
	"suspended_at" timestamp (3) with time zone,
	"suspended_reason" text,
	"deleted_at" timestamp (3) with time zone,
	"wants_notices" boolean DEFAULT true NOT NULL,
	"is_demo" boolean DEFAULT false NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "people_role_known" CHECK ("people"."role" in ('member', 'moderator', 'admin')),
	CONSTRAINT "people_deleted_whole" CHECK (("people"."deleted_at" is null) = ("people"."name" is not null and "people"."email" is not null and "people"."password_hash" is not null))
);
--> statement-breakpoint
CREATE TABLE "rate_counts" (
	"key" text PRIMARY KEY NOT NULL,
	"hits" integer NOT NULL,
	"resets_at" timestamp (3) with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"id_hash" text PRIMARY KEY NOT NULL,
	"public_id" uuid DEFAULT gen_random_uuid() NOT NULL,
	"person_id" integer NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"expires_at" timestamp (3) with time zone NOT NULL,
	"seen_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"agent" text
);
--> statement-breakpoint
CREATE TABLE "confirmations" (
	"id" integer PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "confirmations_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"gear_id" integer NOT NULL,
	"key" text NOT NULL,
	"person_id" integer NOT NULL,
	"value" jsonb NOT NULL,
	"measured" double precision,
	"at" timestamp (3) with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "disputes" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"gear_id" integer NOT NULL,
	"key" text NOT NULL,
	"proposal_id" uuid,
	"status" text DEFAULT 'open' NOT NULL,
	"words" text,
	"settled_by" integer,
	"settled_at" timestamp (3) with time zone,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "disputes_status_known" CHECK ("disputes"."status" in ('open', 'settled'))
);
--> statement-breakpoint
CREATE TABLE "error_reports" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"gear_id" integer NOT NULL,
	"key" text,
	"words" text NOT NULL,
	"person_id" integer,
	"status" text DEFAULT 'open' NOT NULL,
	"settled_by" integer,
	"settled_at" timestamp (3) with time zone,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "error_reports_status_known" CHECK ("error_reports"."status" in ('open', 'settled'))
);
--> statement-breakpoint
CREATE TABLE "evidence_files" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"proposal_id" uuid,
	"uploader_id" integer NOT NULL,
	"kind" text NOT NULL,
	"content_type" text NOT NULL,
	"bytes" integer NOT NULL,
	"width" integer,
	"height" integer,
	"sha256" text NOT NULL,
	"storage_key" text NOT NULL,
	"thumbnail_key" text,
	"caption" text,
	"published_at" timestamp (3) with time zone,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "evidence_files_kind_known" CHECK ("evidence_files"."kind" in ('photo', 'document'))
);
--> statement-breakpoint
CREATE TABLE "proposal_messages" (
	"id" bigint PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "proposal_messages_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"proposal_id" uuid NOT NULL,
	"person_id" integer,
	"kind" text NOT NULL,
	"words" text,
	"detail" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"at" timestamp (3) with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "proposals" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"kind" text NOT NULL,
	"gear_id" integer,
	"base_revision" integer,
	"author_id" integer NOT NULL,
	"status" text DEFAULT 'draft' NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"identity" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"values" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"summary" text,
	"flags" jsonb DEFAULT '[]'::jsonb NOT NULL,
	"submitted_at" timestamp (3) with time zone,
	"decided_at" timestamp (3) with time zone,
	"decided_by" integer,
	"decision" jsonb,
	"revision" integer,
	"leased_by" integer,
	"leased_until" timestamp (3) with time zone,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "proposals_status_known" CHECK ("proposals"."status" in ('draft', 'pending', 'sent-back', 'approved', 'declined', 'withdrawn')),
	CONSTRAINT "proposals_base_whole" CHECK ("proposals"."base_revision" is null or "proposals"."gear_id" is not null),
	CONSTRAINT "proposals_decided_whole" CHECK (("proposals"."status" in ('approved', 'declined')) = ("proposals"."decided_by" is not null))
);
--> statement-breakpoint
ALTER TABLE "gear_revisions" ALTER COLUMN "author" DROP NOT NULL;--> statement-breakpoint
ALTER TABLE "gear_values" ALTER COLUMN "author" DROP NOT NULL;--> statement-breakpoint
ALTER TABLE "gear" ADD COLUMN "merged_into" integer;--> statement-breakpoint
ALTER TABLE "gear" ADD COLUMN "retired_at" timestamp (3) with time zone;--> statement-breakpoint
ALTER TABLE "gear" ADD COLUMN "retired_reason" text;--> statement-breakpoint
ALTER TABLE "gear_revisions" ADD COLUMN "author_id" integer;--> statement-breakpoint
ALTER TABLE "gear_revisions" ADD COLUMN "reviewer_id" integer;--> statement-breakpoint
ALTER TABLE "gear_revisions" ADD COLUMN "proposal_id" uuid;--> statement-breakpoint
ALTER TABLE "gear_values" ADD COLUMN "author_id" integer;--> statement-breakpoint
ALTER TABLE "gear_values" ADD COLUMN "files" uuid[] DEFAULT '{}' NOT NULL;--> statement-breakpoint
ALTER TABLE "gear_values" ADD COLUMN "raw" text;--> statement-breakpoint
ALTER TABLE "audit_events" ADD CONSTRAINT "audit_events_actor_id_people_id_fk" FOREIGN KEY ("actor_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "email_tokens" ADD CONSTRAINT "email_tokens_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "idempotency_keys" ADD CONSTRAINT "idempotency_keys_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "long_jobs" ADD CONSTRAINT "long_jobs_started_by_people_id_fk" FOREIGN KEY ("started_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "outbox" ADD CONSTRAINT "outbox_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sessions" ADD CONSTRAINT "sessions_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "confirmations" ADD CONSTRAINT "confirmations_gear_id_gear_id_fk" FOREIGN KEY ("gear_id") REFERENCES "public"."gear"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "confirmations" ADD CONSTRAINT "confirmations_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "disputes" ADD CONSTRAINT "disputes_gear_id_gear_id_fk" FOREIGN KEY ("gear_id") REFERENCES "public"."gear"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "disputes" ADD CONSTRAINT "disputes_proposal_id_proposals_id_fk" FOREIGN KEY ("proposal_id") REFERENCES "public"."proposals"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "disputes" ADD CONSTRAINT "disputes_settled_by_people_id_fk" FOREIGN KEY ("settled_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "error_reports" ADD CONSTRAINT "error_reports_gear_id_gear_id_fk" FOREIGN KEY ("gear_id") REFERENCES "public"."gear"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "error_reports" ADD CONSTRAINT "error_reports_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "error_reports" ADD CONSTRAINT "error_reports_settled_by_people_id_fk" FOREIGN KEY ("settled_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "evidence_files" ADD CONSTRAINT "evidence_files_proposal_id_proposals_id_fk" FOREIGN KEY ("proposal_id") REFERENCES "public"."proposals"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "evidence_files" ADD CONSTRAINT "evidence_files_uploader_id_people_id_fk" FOREIGN KEY ("uploader_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "proposal_messages" ADD CONSTRAINT "proposal_messages_proposal_id_proposals_id_fk" FOREIGN KEY ("proposal_id") REFERENCES "public"."proposals"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "proposal_messages" ADD CONSTRAINT "proposal_messages_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "proposals" ADD CONSTRAINT "proposals_gear_id_gear_id_fk" FOREIGN KEY ("gear_id") REFERENCES "public"."gear"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "proposals" ADD CONSTRAINT "proposals_author_id_people_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "proposals" ADD CONSTRAINT "proposals_decided_by_people_id_fk" FOREIGN KEY ("decided_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "proposals" ADD CONSTRAINT "proposals_leased_by_people_id_fk" FOREIGN KEY ("leased_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "audit_events_at_idx" ON "audit_events" USING btree ("at","id");--> statement-breakpoint
CREATE INDEX "audit_events_actor_idx" ON "audit_events" USING btree ("actor_id","id");--> statement-breakpoint
CREATE INDEX "audit_events_subject_idx" ON "audit_events" USING btree ("subject_type","subject_id","id");--> statement-breakpoint
CREATE INDEX "audit_events_action_idx" ON "audit_events" USING btree ("action","id");--> statement-breakpoint
CREATE INDEX "email_tokens_person_idx" ON "email_tokens" USING btree ("person_id","purpose");--> statement-breakpoint
CREATE INDEX "idempotency_keys_created_idx" ON "idempotency_keys" USING btree ("created_at");--> statement-breakpoint
CREATE INDEX "long_jobs_kind_idx" ON "long_jobs" USING btree ("kind","created_at");--> statement-breakpoint
CREATE INDEX "outbox_status_idx" ON "outbox" USING btree ("status","created_at");--> statement-breakpoint
CREATE INDEX "outbox_person_idx" ON "outbox" USING btree ("person_id");--> statement-breakpoint
CREATE UNIQUE INDEX "people_name_key" ON "people" USING btree (lower("name"));--> statement-breakpoint
CREATE UNIQUE INDEX "people_email_key" ON "people" USING btree (lower("email"));--> statement-breakpoint
CREATE INDEX "rate_counts_resets_idx" ON "rate_counts" USING btree ("resets_at");--> statement-breakpoint
CREATE UNIQUE INDEX "sessions_public_id_key" ON "sessions" USING btree ("public_id");--> statement-breakpoint
CREATE INDEX "sessions_person_idx" ON "sessions" USING btree ("person_id");--> statement-breakpoint
CREATE INDEX "sessions_expires_idx" ON "sessions" USING btree ("expires_at");--> statement-breakpoint
CREATE UNIQUE INDEX "confirmations_once" ON "confirmations" USING btree ("gear_id","key","person_id");--> statement-breakpoint
CREATE UNIQUE INDEX "disputes_open_once" ON "disputes" USING btree ("gear_id","key") WHERE "disputes"."status" = 'open';--> statement-breakpoint
CREATE INDEX "error_reports_status_idx" ON "error_reports" USING btree ("status","created_at");--> statement-breakpoint
CREATE INDEX "error_reports_gear_idx" ON "error_reports" USING btree ("gear_id");--> statement-breakpoint
CREATE UNIQUE INDEX "evidence_files_storage_key" ON "evidence_files" USING btree ("storage_key");--> statement-breakpoint
CREATE INDEX "evidence_files_proposal_idx" ON "evidence_files" USING btree ("proposal_id");--> statement-breakpoint
CREATE INDEX "evidence_files_orphan_idx" ON "evidence_files" USING btree ("created_at") WHERE "evidence_files"."proposal_id" is null;--> statement-breakpoint
CREATE INDEX "proposal_messages_proposal_idx" ON "proposal_messages" USING btree ("proposal_id","id");--> statement-breakpoint
CREATE INDEX "proposals_author_idx" ON "proposals" USING btree ("author_id","updated_at");--> statement-breakpoint
CREATE INDEX "proposals_queue_idx" ON "proposals" USING btree ("status","submitted_at");--> statement-breakpoint
CREATE INDEX "proposals_gear_idx" ON "proposals" USING btree ("gear_id","status");--> statement-breakpoint
ALTER TABLE "gear" ADD CONSTRAINT "gear_merged_into_gear_id_fk" FOREIGN KEY ("merged_into") REFERENCES "public"."gear"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "gear_revisions" ADD CONSTRAINT "gear_revisions_author_id_people_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "gear_revisions" ADD CONSTRAINT "gear_revisions_reviewer_id_people_id_fk" FOREIGN KEY ("reviewer_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "gear_values" ADD CONSTRAINT "gear_values_author_id_people_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "gear_merged_idx" ON "gear" USING btree ("merged_into");--> statement-breakpoint
CREATE INDEX "gear_revisions_author_idx" ON "gear_revisions" USING btree ("author_id","created_at");--> statement-breakpoint
CREATE INDEX "gear_values_author_idx" ON "gear_values" USING btree ("author_id");--> statement-breakpoint
ALTER TABLE "gear" ADD CONSTRAINT "gear_not_merged_into_itself" CHECK ("gear"."merged_into" <> "gear"."id");--> statement-breakpoint
ALTER TABLE "gear" ADD CONSTRAINT "gear_retired_whole" CHECK (("gear"."retired_at" is null) = ("gear"."retired_reason" is null));--> statement-breakpoint
ALTER TABLE "gear_revisions" ADD CONSTRAINT "gear_revisions_author_given" CHECK (num_nonnulls("gear_revisions"."author", "gear_revisions"."author_id") = 1);--> statement-breakpoint
ALTER TABLE "gear_values" ADD CONSTRAINT "gear_values_author_given" CHECK (num_nonnulls("gear_values"."author", "gear_values"."author_id") = 1);