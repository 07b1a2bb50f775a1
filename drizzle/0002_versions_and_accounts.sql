-- Rows from before versions were kept: a writer counts as one of the newest draft, and a proof as a copy of it only
-- where it holds the same document. Where that isn't known, people stay writers for longer rather than for shorter.
ALTER TABLE "piece_writers" ADD COLUMN "version" integer;--> statement-breakpoint
UPDATE "piece_writers" SET "version" = "pieces"."version" FROM "pieces" WHERE "pieces"."id" = "piece_writers"."piece_id";--> statement-breakpoint
ALTER TABLE "piece_writers" ALTER COLUMN "version" SET NOT NULL;--> statement-breakpoint
ALTER TABLE "proofs" ADD COLUMN "version" integer;--> statement-breakpoint
UPDATE "proofs" SET "version" = CASE WHEN "proofs"."document" = "pieces"."document" THEN "pieces"."version" ELSE 0 END FROM "pieces" WHERE "pieces"."id" = "proofs"."piece_id";--> statement-breakpoint
ALTER TABLE "proofs" ALTER COLUMN "version" SET NOT NULL;--> statement-breakpoint
ALTER TABLE "releases" ADD COLUMN "account" jsonb;--> statement-breakpoint
ALTER TABLE "outbox" ADD COLUMN "good_until" timestamp with time zone;
