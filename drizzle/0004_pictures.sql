CREATE TABLE "pictures" (
	"id" text PRIMARY KEY NOT NULL,
	"file_name" text NOT NULL,
	"source_type" text NOT NULL,
	"source_digest" text NOT NULL,
	"width" integer NOT NULL,
	"height" integer NOT NULL,
	"files" jsonb NOT NULL,
	"record" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"added_by" text NOT NULL,
	"added_at" timestamp with time zone NOT NULL,
	"saved_by" text NOT NULL,
	"saved_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
ALTER TABLE "pictures" ADD CONSTRAINT "pictures_added_by_people_id_fk" FOREIGN KEY ("added_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pictures" ADD CONSTRAINT "pictures_saved_by_people_id_fk" FOREIGN KEY ("saved_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "pictures_added_index" ON "pictures" USING btree ("added_at");