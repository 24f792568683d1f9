CREATE TABLE "deliveries" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"production_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"title" text NOT NULL,
	"words" text DEFAULT '' NOT NULL,
	"manifest_digest" char(64),
	"bytes" bigint DEFAULT 0 NOT NULL,
	"made_by" uuid NOT NULL,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	"published_at" timestamp with time zone,
	"published_by" uuid,
	"withdrawn_at" timestamp with time zone,
	"withdrawn_words" text,
	CONSTRAINT "deliveries_number" UNIQUE("production_id","number"),
	CONSTRAINT "deliveries_in_production" UNIQUE("id","production_id"),
	CONSTRAINT "deliveries_published_whole" CHECK ("deliveries"."published_at" is null or "deliveries"."manifest_digest" is not null)
);
--> statement-breakpoint
CREATE TABLE "delivery_documents" (
	"delivery_id" uuid NOT NULL,
	"path" text NOT NULL,
	"body" text NOT NULL,
	"sha256" char(64) NOT NULL,
	CONSTRAINT "delivery_documents_delivery_id_path_pk" PRIMARY KEY("delivery_id","path"),
	CONSTRAINT "delivery_documents_sha256" CHECK ("delivery_documents"."sha256" = encode(sha256(convert_to("delivery_documents"."body", 'UTF8')), 'hex'))
);
--> statement-breakpoint
CREATE TABLE "delivery_files" (
	"delivery_id" uuid NOT NULL,
	"path" text NOT NULL,
	"version_id" uuid NOT NULL,
	"frame" integer NOT NULL,
	"kind" text NOT NULL,
	"sha256" char(64) NOT NULL,
	"bytes" bigint NOT NULL,
	CONSTRAINT "delivery_files_delivery_id_path_pk" PRIMARY KEY("delivery_id","path")
);
--> statement-breakpoint
CREATE TABLE "delivery_items" (
	"delivery_id" uuid NOT NULL,
	"production_id" uuid NOT NULL,
	"version_id" uuid NOT NULL,
	"verdict_id" uuid NOT NULL,
	"digest" char(64) NOT NULL,
	"verdict_kind" text DEFAULT 'signed off' NOT NULL,
	"first" integer NOT NULL,
	"last" integer NOT NULL,
	CONSTRAINT "delivery_items_delivery_id_version_id_pk" PRIMARY KEY("delivery_id","version_id"),
	CONSTRAINT "delivery_items_signed_only" CHECK ("delivery_items"."verdict_kind" = 'signed off')
);
--> statement-breakpoint
CREATE TABLE "downloads" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"delivery_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"what" text NOT NULL,
	"bytes" bigint DEFAULT 0 NOT NULL,
	"started_at" timestamp with time zone DEFAULT now() NOT NULL,
	"finished_at" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "receipts" (
	"delivery_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"manifest_digest" char(64) NOT NULL,
	"words" text DEFAULT '' NOT NULL,
	"statement" text NOT NULL,
	"signed_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "receipts_delivery_id_person_id_pk" PRIMARY KEY("delivery_id","person_id"),
	CONSTRAINT "receipts_kind" CHECK ("receipts"."kind" in ('received', 'refused'))
);
--> statement-breakpoint
CREATE TABLE "recipients" (
	"delivery_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"revoked_at" timestamp with time zone,
	CONSTRAINT "recipients_delivery_id_person_id_pk" PRIMARY KEY("delivery_id","person_id")
);
--> statement-breakpoint
CREATE TABLE "events" (
	"id" bigserial PRIMARY KEY NOT NULL,
	"production_id" uuid,
	"chain" text DEFAULT '' NOT NULL,
	"seq" bigint DEFAULT 0 NOT NULL,
	"at" timestamp with time zone DEFAULT now() NOT NULL,
	"actor_id" uuid,
	"kind" text NOT NULL,
	"subject" jsonb NOT NULL,
	"previous" char(64) DEFAULT '' NOT NULL,
	"hash" char(64) DEFAULT '' NOT NULL,
	CONSTRAINT "events_chain" UNIQUE("chain","seq")
);
--> statement-breakpoint
CREATE TABLE "outbox" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"key" text NOT NULL,
	"kind" text NOT NULL,
	"payload" jsonb NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"due_at" timestamp with time zone DEFAULT now() NOT NULL,
	"attempts" integer DEFAULT 0 NOT NULL,
	"last_error" text,
	"done_at" timestamp with time zone,
	CONSTRAINT "outbox_key_unique" UNIQUE("key"),
	CONSTRAINT "outbox_kind" CHECK ("outbox"."kind" in ('mail', 'job'))
);
--> statement-breakpoint
CREATE TABLE "links" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"purpose" text NOT NULL,
	"token_hash" char(64) NOT NULL,
	"email" text NOT NULL,
	"name" text DEFAULT '' NOT NULL,
	"person_id" uuid,
	"production_id" uuid,
	"role" text,
	"created_by" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"used_at" timestamp with time zone,
	"revoked_at" timestamp with time zone,
	CONSTRAINT "links_token_hash_unique" UNIQUE("token_hash"),
	CONSTRAINT "links_purpose" CHECK ("links"."purpose" in ('invitation', 'password reset'))
);
--> statement-breakpoint
CREATE TABLE "memberships" (
	"production_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"role" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"ended_at" timestamp with time zone,
	CONSTRAINT "memberships_production_id_person_id_pk" PRIMARY KEY("production_id","person_id"),
	CONSTRAINT "memberships_role" CHECK ("memberships"."role" in ('artist', 'advisor', 'producer', 'client'))
);
--> statement-breakpoint
CREATE TABLE "people" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"email" text NOT NULL,
	"name" text NOT NULL,
	"password_hash" text NOT NULL,
	"time_zone" text DEFAULT 'UTC' NOT NULL,
	"is_owner" boolean DEFAULT false NOT NULL,
	"session_epoch" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"left_at" timestamp with time zone,
	CONSTRAINT "people_email_lower" CHECK ("people"."email" = lower("people"."email"))
);
--> statement-breakpoint
CREATE TABLE "rate_limits" (
	"key" varchar(255) PRIMARY KEY NOT NULL,
	"points" integer DEFAULT 0 NOT NULL,
	"expire" bigint
);
--> statement-breakpoint
CREATE TABLE "productions" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"code" text NOT NULL,
	"name" text NOT NULL,
	"kind" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "productions_code_unique" UNIQUE("code"),
	CONSTRAINT "productions_kind" CHECK ("productions"."kind" in ('film', 'dome')),
	CONSTRAINT "productions_code" CHECK ("productions"."code" ~ '^[A-Z][A-Z0-9]{1,7}$')
);
--> statement-breakpoint
CREATE TABLE "sequences" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"production_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"name" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "sequences_number" UNIQUE("production_id","number"),
	CONSTRAINT "sequences_in_production" UNIQUE("id","production_id")
);
--> statement-breakpoint
CREATE TABLE "standing_verdicts" (
	"version_id" uuid NOT NULL,
	"frame" integer NOT NULL,
	"verdict_id" uuid NOT NULL,
	"kind" text NOT NULL,
	CONSTRAINT "standing_verdicts_version_id_frame_pk" PRIMARY KEY("version_id","frame")
);
--> statement-breakpoint
CREATE TABLE "submissions" (
	"version_id" uuid PRIMARY KEY NOT NULL,
	"digest" char(64) NOT NULL,
	"words" text NOT NULL,
	"sent_by" uuid NOT NULL,
	"sent_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "verdicts" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"version_id" uuid NOT NULL,
	"digest" char(64) NOT NULL,
	"kind" text NOT NULL,
	"first" integer NOT NULL,
	"last" integer NOT NULL,
	"words" text NOT NULL,
	"statement" text NOT NULL,
	"given_by" uuid NOT NULL,
	"given_as" text NOT NULL,
	"given_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "verdicts_exact" UNIQUE("id","version_id","digest","kind"),
	CONSTRAINT "verdicts_kind" CHECK ("verdicts"."kind" in ('signed off', 'returned', 'withdrawn')),
	CONSTRAINT "verdicts_range" CHECK ("verdicts"."last" >= "verdicts"."first")
);
--> statement-breakpoint
CREATE TABLE "setups" (
	"shot_id" uuid PRIMARY KEY NOT NULL,
	"body" jsonb NOT NULL,
	"revision" integer DEFAULT 1 NOT NULL,
	"saved_by" uuid,
	"saved_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "shots" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"production_id" uuid NOT NULL,
	"sequence_id" uuid NOT NULL,
	"code" text NOT NULL,
	"brief" text NOT NULL,
	"due_on" date,
	"artist_id" uuid,
	"hold" text DEFAULT 'none' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "shots_code" UNIQUE("production_id","code"),
	CONSTRAINT "shots_in_production" UNIQUE("id","production_id"),
	CONSTRAINT "shots_hold" CHECK ("shots"."hold" in ('none', 'on hold', 'omitted')),
	CONSTRAINT "shots_code_form" CHECK ("shots"."code" ~ '^[A-Z0-9]+(-[A-Z0-9]+)+$')
);
--> statement-breakpoint
CREATE TABLE "frame_files" (
	"version_id" uuid NOT NULL,
	"frame" integer NOT NULL,
	"kind" text NOT NULL,
	"sha256" char(64) NOT NULL,
	"bytes" bigint NOT NULL,
	CONSTRAINT "frame_files_version_id_frame_kind_pk" PRIMARY KEY("version_id","frame","kind"),
	CONSTRAINT "frame_files_exact" UNIQUE("version_id","frame","kind","sha256"),
	CONSTRAINT "frame_files_kind" CHECK ("frame_files"."kind" in ('png', 'exr'))
);
--> statement-breakpoint
CREATE TABLE "frames" (
	"version_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"milliseconds" integer NOT NULL,
	"paths" bigint NOT NULL,
	"unresolved" integer NOT NULL,
	"finished_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "frames_version_id_number_pk" PRIMARY KEY("version_id","number")
);
--> statement-breakpoint
CREATE TABLE "renders" (
	"version_id" uuid PRIMARY KEY NOT NULL,
	"state" text DEFAULT 'rendering' NOT NULL,
	"attempt" integer DEFAULT 1 NOT NULL,
	"failed_frame" integer,
	"failure" text,
	"changed_at" timestamp with time zone DEFAULT now() NOT NULL,
	"finished_at" timestamp with time zone,
	CONSTRAINT "renders_state" CHECK ("renders"."state" in ('rendering', 'failed', 'cancelled', 'complete'))
);
--> statement-breakpoint
CREATE TABLE "seals" (
	"version_id" uuid PRIMARY KEY NOT NULL,
	"digest" char(64) NOT NULL,
	"frame_count" integer NOT NULL,
	"bytes" bigint NOT NULL,
	"sealed_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "seals_exact" UNIQUE("version_id","digest")
);
--> statement-breakpoint
CREATE TABLE "versions" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"production_id" uuid NOT NULL,
	"shot_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"setup" text NOT NULL,
	"setup_digest" char(64) NOT NULL,
	"kernel" text NOT NULL,
	"quality" text NOT NULL,
	"colour_space" text NOT NULL,
	"channels" text NOT NULL,
	"first" integer NOT NULL,
	"last" integer NOT NULL,
	"made_by" uuid NOT NULL,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "versions_number" UNIQUE("shot_id","number"),
	CONSTRAINT "versions_in_production" UNIQUE("id","production_id"),
	CONSTRAINT "versions_range" CHECK ("versions"."first" >= 0 and "versions"."last" >= "versions"."first"),
	CONSTRAINT "versions_setup_digest" CHECK ("versions"."setup_digest" = encode(sha256(convert_to("versions"."setup", 'UTF8')), 'hex')),
	CONSTRAINT "versions_quality" CHECK ("versions"."quality" in ('proof', 'master')),
	CONSTRAINT "versions_colour" CHECK ("versions"."colour_space" in ('rec709', 'acescg'))
);
--> statement-breakpoint
ALTER TABLE "deliveries" ADD CONSTRAINT "deliveries_production_id_productions_id_fk" FOREIGN KEY ("production_id") REFERENCES "public"."productions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "deliveries" ADD CONSTRAINT "deliveries_made_by_people_id_fk" FOREIGN KEY ("made_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "deliveries" ADD CONSTRAINT "deliveries_published_by_people_id_fk" FOREIGN KEY ("published_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "delivery_documents" ADD CONSTRAINT "delivery_documents_delivery_id_deliveries_id_fk" FOREIGN KEY ("delivery_id") REFERENCES "public"."deliveries"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "delivery_files" ADD CONSTRAINT "delivery_files_delivery_id_version_id_delivery_items_delivery_id_version_id_fk" FOREIGN KEY ("delivery_id","version_id") REFERENCES "public"."delivery_items"("delivery_id","version_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "delivery_files" ADD CONSTRAINT "delivery_files_exact" FOREIGN KEY ("version_id","frame","kind","sha256") REFERENCES "public"."frame_files"("version_id","frame","kind","sha256") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "delivery_items" ADD CONSTRAINT "delivery_items_delivery_id_production_id_deliveries_id_production_id_fk" FOREIGN KEY ("delivery_id","production_id") REFERENCES "public"."deliveries"("id","production_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "delivery_items" ADD CONSTRAINT "delivery_items_version_id_production_id_versions_id_production_id_fk" FOREIGN KEY ("version_id","production_id") REFERENCES "public"."versions"("id","production_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "delivery_items" ADD CONSTRAINT "delivery_items_signed_verdict" FOREIGN KEY ("verdict_id","version_id","digest","verdict_kind") REFERENCES "public"."verdicts"("id","version_id","digest","kind") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "downloads" ADD CONSTRAINT "downloads_delivery_id_person_id_recipients_delivery_id_person_id_fk" FOREIGN KEY ("delivery_id","person_id") REFERENCES "public"."recipients"("delivery_id","person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "receipts" ADD CONSTRAINT "receipts_delivery_id_person_id_recipients_delivery_id_person_id_fk" FOREIGN KEY ("delivery_id","person_id") REFERENCES "public"."recipients"("delivery_id","person_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "recipients" ADD CONSTRAINT "recipients_delivery_id_deliveries_id_fk" FOREIGN KEY ("delivery_id") REFERENCES "public"."deliveries"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "recipients" ADD CONSTRAINT "recipients_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "events" ADD CONSTRAINT "events_production_id_productions_id_fk" FOREIGN KEY ("production_id") REFERENCES "public"."productions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "events" ADD CONSTRAINT "events_actor_id_people_id_fk" FOREIGN KEY ("actor_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "links" ADD CONSTRAINT "links_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "links" ADD CONSTRAINT "links_production_id_productions_id_fk" FOREIGN KEY ("production_id") REFERENCES "public"."productions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "links" ADD CONSTRAINT "links_created_by_people_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_production_id_productions_id_fk" FOREIGN KEY ("production_id") REFERENCES "public"."productions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sequences" ADD CONSTRAINT "sequences_production_id_productions_id_fk" FOREIGN KEY ("production_id") REFERENCES "public"."productions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "standing_verdicts" ADD CONSTRAINT "standing_verdicts_verdict_id_verdicts_id_fk" FOREIGN KEY ("verdict_id") REFERENCES "public"."verdicts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "standing_verdicts" ADD CONSTRAINT "standing_verdicts_version_id_frame_frames_version_id_number_fk" FOREIGN KEY ("version_id","frame") REFERENCES "public"."frames"("version_id","number") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "submissions" ADD CONSTRAINT "submissions_sent_by_people_id_fk" FOREIGN KEY ("sent_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "submissions" ADD CONSTRAINT "submissions_version_id_digest_seals_version_id_digest_fk" FOREIGN KEY ("version_id","digest") REFERENCES "public"."seals"("version_id","digest") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "verdicts" ADD CONSTRAINT "verdicts_version_id_submissions_version_id_fk" FOREIGN KEY ("version_id") REFERENCES "public"."submissions"("version_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "verdicts" ADD CONSTRAINT "verdicts_given_by_people_id_fk" FOREIGN KEY ("given_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "verdicts" ADD CONSTRAINT "verdicts_version_id_digest_seals_version_id_digest_fk" FOREIGN KEY ("version_id","digest") REFERENCES "public"."seals"("version_id","digest") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "setups" ADD CONSTRAINT "setups_shot_id_shots_id_fk" FOREIGN KEY ("shot_id") REFERENCES "public"."shots"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "setups" ADD CONSTRAINT "setups_saved_by_people_id_fk" FOREIGN KEY ("saved_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "shots" ADD CONSTRAINT "shots_production_id_productions_id_fk" FOREIGN KEY ("production_id") REFERENCES "public"."productions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "shots" ADD CONSTRAINT "shots_artist_id_people_id_fk" FOREIGN KEY ("artist_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "shots" ADD CONSTRAINT "shots_sequence_id_production_id_sequences_id_production_id_fk" FOREIGN KEY ("sequence_id","production_id") REFERENCES "public"."sequences"("id","production_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "frame_files" ADD CONSTRAINT "frame_files_version_id_frame_frames_version_id_number_fk" FOREIGN KEY ("version_id","frame") REFERENCES "public"."frames"("version_id","number") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "frames" ADD CONSTRAINT "frames_version_id_versions_id_fk" FOREIGN KEY ("version_id") REFERENCES "public"."versions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "renders" ADD CONSTRAINT "renders_version_id_versions_id_fk" FOREIGN KEY ("version_id") REFERENCES "public"."versions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "seals" ADD CONSTRAINT "seals_version_id_versions_id_fk" FOREIGN KEY ("version_id") REFERENCES "public"."versions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "versions" ADD CONSTRAINT "versions_made_by_people_id_fk" FOREIGN KEY ("made_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "versions" ADD CONSTRAINT "versions_shot_id_production_id_shots_id_production_id_fk" FOREIGN KEY ("shot_id","production_id") REFERENCES "public"."shots"("id","production_id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "events_production_at" ON "events" USING btree ("production_id","at");--> statement-breakpoint
CREATE INDEX "outbox_waiting" ON "outbox" USING btree ("due_at") WHERE "outbox"."done_at" is null;--> statement-breakpoint
CREATE UNIQUE INDEX "people_email" ON "people" USING btree ("email");