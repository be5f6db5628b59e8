ALTER TABLE "kits" ADD COLUMN "wash_counted_from" date;--> statement-breakpoint
ALTER TABLE "kits" ADD COLUMN "calendar_wash_on" date;--> statement-breakpoint
-- Not before the last wash that was asked for: planned anew onto its day, the next would never be asked.
UPDATE "kits" SET
  "wash_counted_from" = greatest("last_wash_on", (
    SELECT max("due_on") FROM "prompts" WHERE "prompts"."kit_id" = "kits"."id" AND "prompts"."kind" = 'wash'
  )),
  "calendar_wash_on" = "next_wash_on";--> statement-breakpoint
ALTER TABLE "kits" ALTER COLUMN "wash_counted_from" SET NOT NULL;--> statement-breakpoint
ALTER TABLE "kits" ALTER COLUMN "calendar_wash_on" SET NOT NULL;--> statement-breakpoint
ALTER TABLE "kits" ADD CONSTRAINT "kits_wash_never_put_off" CHECK ("kits"."next_wash_on" <= "kits"."calendar_wash_on");
