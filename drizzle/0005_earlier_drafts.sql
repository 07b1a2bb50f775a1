CREATE TABLE "draft_versions" (
	"piece_id" text NOT NULL,
	"version" integer NOT NULL,
	"document" jsonb NOT NULL,
	"saved_by" text NOT NULL,
	"saved_at" timestamp with time zone NOT NULL,
	"since" timestamp with time zone NOT NULL,
	"name" text,
	"named_by" text,
	"restored_from" integer,
	CONSTRAINT "draft_versions_piece_id_version_pk" PRIMARY KEY("piece_id","version")
);
--> statement-breakpoint
ALTER TABLE "pieces" ADD COLUMN "slip" jsonb DEFAULT '{"reader":"","partner":"","embargo":"","words":null,"due":null}'::jsonb NOT NULL;--> statement-breakpoint
ALTER TABLE "pieces" ADD COLUMN "spiked_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "pieces" ADD COLUMN "spiked_by" text;--> statement-breakpoint
ALTER TABLE "draft_versions" ADD CONSTRAINT "draft_versions_piece_id_pieces_id_fk" FOREIGN KEY ("piece_id") REFERENCES "public"."pieces"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "draft_versions" ADD CONSTRAINT "draft_versions_saved_by_people_id_fk" FOREIGN KEY ("saved_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "draft_versions" ADD CONSTRAINT "draft_versions_named_by_people_id_fk" FOREIGN KEY ("named_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "draft_versions_saved_index" ON "draft_versions" USING btree ("saved_at");--> statement-breakpoint
ALTER TABLE "pieces" ADD CONSTRAINT "pieces_spiked_by_people_id_fk" FOREIGN KEY ("spiked_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;