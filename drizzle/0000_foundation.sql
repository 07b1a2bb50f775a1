CREATE TABLE "people" (
	"id" text PRIMARY KEY NOT NULL,
	"email" text NOT NULL,
	"name" text NOT NULL,
	"passphrase_hash" text,
	"created_at" timestamp with time zone NOT NULL,
	"disabled_at" timestamp with time zone,
	CONSTRAINT "people_email_unique" UNIQUE("email")
);
--> statement-breakpoint
CREATE TABLE "person_roles" (
	"person_id" text NOT NULL,
	"role" text NOT NULL,
	CONSTRAINT "person_roles_person_id_role_pk" PRIMARY KEY("person_id","role")
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"id" text PRIMARY KEY NOT NULL,
	"person_id" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"last_seen_at" timestamp with time zone NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"revoked_at" timestamp with time zone,
	"fresh_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "sign_in_attempts" (
	"id" text PRIMARY KEY NOT NULL,
	"kind" text NOT NULL,
	"account_hash" text NOT NULL,
	"address_hash" text NOT NULL,
	"device_hash" text,
	"succeeded" boolean NOT NULL,
	"at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "sign_in_links" (
	"id" text PRIMARY KEY NOT NULL,
	"person_id" text NOT NULL,
	"token_hash" text NOT NULL,
	"nonce_hash" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"used_at" timestamp with time zone,
	CONSTRAINT "sign_in_links_token_unique" UNIQUE("token_hash")
);
--> statement-breakpoint
CREATE TABLE "piece_writers" (
	"piece_id" text NOT NULL,
	"person_id" text NOT NULL,
	"changed_at" timestamp with time zone NOT NULL,
	CONSTRAINT "piece_writers_piece_id_person_id_pk" PRIMARY KEY("piece_id","person_id")
);
--> statement-breakpoint
CREATE TABLE "pieces" (
	"id" text PRIMARY KEY NOT NULL,
	"slug" text NOT NULL,
	"document" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_by" text NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"saved_by" text NOT NULL,
	"saved_at" timestamp with time zone NOT NULL,
	CONSTRAINT "pieces_slug_unique" UNIQUE("slug")
);
--> statement-breakpoint
CREATE TABLE "proofs" (
	"id" text PRIMARY KEY NOT NULL,
	"piece_id" text NOT NULL,
	"number" integer NOT NULL,
	"document" jsonb NOT NULL,
	"digest" text NOT NULL,
	"pulled_by" text NOT NULL,
	"pulled_at" timestamp with time zone NOT NULL,
	"writers" jsonb NOT NULL,
	"passed_by" text,
	"passed_at" timestamp with time zone,
	CONSTRAINT "proofs_number_unique" UNIQUE("piece_id","number")
);
--> statement-breakpoint
CREATE TABLE "queries" (
	"id" text PRIMARY KEY NOT NULL,
	"piece_id" text NOT NULL,
	"proof_id" text NOT NULL,
	"claim" text NOT NULL,
	"question" text NOT NULL,
	"asked_by" text NOT NULL,
	"asked_at" timestamp with time zone NOT NULL,
	"answer" text,
	"answered_by" text,
	"answered_at" timestamp with time zone,
	"closed_by" text,
	"closed_at" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "signatures" (
	"id" text PRIMARY KEY NOT NULL,
	"piece_id" text NOT NULL,
	"claim" text NOT NULL,
	"cover_hash" text NOT NULL,
	"cover" jsonb NOT NULL,
	"sentence" text NOT NULL,
	"proof_id" text NOT NULL,
	"person_id" text NOT NULL,
	"signed_at" timestamp with time zone NOT NULL,
	"taken_back_at" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "releases" (
	"id" text PRIMARY KEY NOT NULL,
	"piece_id" text NOT NULL,
	"number" integer NOT NULL,
	"digest" text NOT NULL,
	"proof_id" text NOT NULL,
	"document" jsonb NOT NULL,
	"manifest" jsonb NOT NULL,
	"released_by" text NOT NULL,
	"released_at" timestamp with time zone NOT NULL,
	CONSTRAINT "releases_number_unique" UNIQUE("piece_id","number"),
	CONSTRAINT "releases_proof_unique" UNIQUE("proof_id")
);
--> statement-breakpoint
CREATE TABLE "outbox" (
	"id" text PRIMARY KEY NOT NULL,
	"event" text NOT NULL,
	"to_name" text NOT NULL,
	"to_address" text NOT NULL,
	"input" jsonb NOT NULL,
	"created_at" timestamp with time zone NOT NULL,
	"due_at" timestamp with time zone NOT NULL,
	"lease_until" timestamp with time zone,
	"attempts" integer DEFAULT 0 NOT NULL,
	"last_error" text,
	"sent_at" timestamp with time zone,
	"parked_at" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "daybook" (
	"seq" bigint PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "daybook_seq_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"at" timestamp with time zone NOT NULL,
	"person_id" text,
	"event" text NOT NULL,
	"piece_id" text,
	"details" jsonb NOT NULL
);
--> statement-breakpoint
ALTER TABLE "person_roles" ADD CONSTRAINT "person_roles_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sessions" ADD CONSTRAINT "sessions_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sign_in_links" ADD CONSTRAINT "sign_in_links_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "piece_writers" ADD CONSTRAINT "piece_writers_piece_id_pieces_id_fk" FOREIGN KEY ("piece_id") REFERENCES "public"."pieces"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "piece_writers" ADD CONSTRAINT "piece_writers_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pieces" ADD CONSTRAINT "pieces_created_by_people_id_fk" FOREIGN KEY ("created_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pieces" ADD CONSTRAINT "pieces_saved_by_people_id_fk" FOREIGN KEY ("saved_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "proofs" ADD CONSTRAINT "proofs_piece_id_pieces_id_fk" FOREIGN KEY ("piece_id") REFERENCES "public"."pieces"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "proofs" ADD CONSTRAINT "proofs_pulled_by_people_id_fk" FOREIGN KEY ("pulled_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "proofs" ADD CONSTRAINT "proofs_passed_by_people_id_fk" FOREIGN KEY ("passed_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "queries" ADD CONSTRAINT "queries_piece_id_pieces_id_fk" FOREIGN KEY ("piece_id") REFERENCES "public"."pieces"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "queries" ADD CONSTRAINT "queries_proof_id_proofs_id_fk" FOREIGN KEY ("proof_id") REFERENCES "public"."proofs"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "queries" ADD CONSTRAINT "queries_asked_by_people_id_fk" FOREIGN KEY ("asked_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "queries" ADD CONSTRAINT "queries_answered_by_people_id_fk" FOREIGN KEY ("answered_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "queries" ADD CONSTRAINT "queries_closed_by_people_id_fk" FOREIGN KEY ("closed_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "signatures" ADD CONSTRAINT "signatures_piece_id_pieces_id_fk" FOREIGN KEY ("piece_id") REFERENCES "public"."pieces"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "signatures" ADD CONSTRAINT "signatures_proof_id_proofs_id_fk" FOREIGN KEY ("proof_id") REFERENCES "public"."proofs"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "signatures" ADD CONSTRAINT "signatures_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "releases" ADD CONSTRAINT "releases_piece_id_pieces_id_fk" FOREIGN KEY ("piece_id") REFERENCES "public"."pieces"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "releases" ADD CONSTRAINT "releases_proof_id_proofs_id_fk" FOREIGN KEY ("proof_id") REFERENCES "public"."proofs"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "releases" ADD CONSTRAINT "releases_released_by_people_id_fk" FOREIGN KEY ("released_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "sessions_person_index" ON "sessions" USING btree ("person_id");--> statement-breakpoint
CREATE INDEX "sign_in_attempts_account_index" ON "sign_in_attempts" USING btree ("account_hash","at");--> statement-breakpoint
CREATE INDEX "sign_in_attempts_address_index" ON "sign_in_attempts" USING btree ("address_hash","at");--> statement-breakpoint
CREATE INDEX "sign_in_links_person_index" ON "sign_in_links" USING btree ("person_id");--> statement-breakpoint
CREATE INDEX "pieces_saved_index" ON "pieces" USING btree ("saved_at");--> statement-breakpoint
CREATE INDEX "queries_piece_index" ON "queries" USING btree ("piece_id","claim");--> statement-breakpoint
CREATE INDEX "signatures_piece_index" ON "signatures" USING btree ("piece_id","claim");--> statement-breakpoint
CREATE INDEX "outbox_due_index" ON "outbox" USING btree ("sent_at","due_at");--> statement-breakpoint
CREATE INDEX "daybook_piece_index" ON "daybook" USING btree ("piece_id","seq");