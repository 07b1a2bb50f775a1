CREATE TABLE "house_calculators" (
	"calculator" text NOT NULL,
	"revision" text NOT NULL,
	"definition" jsonb NOT NULL,
	"digest" text NOT NULL,
	"proposed_by" text NOT NULL,
	"proposed_at" timestamp with time zone NOT NULL,
	CONSTRAINT "house_calculators_calculator_revision_pk" PRIMARY KEY("calculator","revision")
);
--> statement-breakpoint
CREATE TABLE "vettings" (
	"seq" bigint PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "vettings_seq_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"calculator" text NOT NULL,
	"revision" text NOT NULL,
	"state" text NOT NULL,
	"person_id" text NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"note" text NOT NULL
);
--> statement-breakpoint
ALTER TABLE "house_calculators" ADD CONSTRAINT "house_calculators_proposed_by_people_id_fk" FOREIGN KEY ("proposed_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "vettings" ADD CONSTRAINT "vettings_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "vettings_revision_index" ON "vettings" USING btree ("calculator","revision");