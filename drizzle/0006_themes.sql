CREATE TABLE "themes" (
	"id" text PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"ground" text NOT NULL,
	"accent" text NOT NULL,
	"face" text NOT NULL,
	"radius" integer NOT NULL,
	"saved_by" text NOT NULL,
	"saved_at" timestamp with time zone NOT NULL,
	CONSTRAINT "themes_name_unique" UNIQUE("name")
);
--> statement-breakpoint
ALTER TABLE "themes" ADD CONSTRAINT "themes_saved_by_people_id_fk" FOREIGN KEY ("saved_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;