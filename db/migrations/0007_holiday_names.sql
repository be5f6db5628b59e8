ALTER TABLE "areas" ADD COLUMN "named_holidays" jsonb DEFAULT '[]'::jsonb NOT NULL;--> statement-breakpoint
UPDATE "areas" SET "named_holidays" = (
	SELECT coalesce(jsonb_agg(jsonb_build_object('on', "day", 'name', '') ORDER BY "day"), '[]'::jsonb) FROM unnest("holidays") AS "day"
);--> statement-breakpoint
ALTER TABLE "areas" DROP COLUMN "holidays";--> statement-breakpoint
ALTER TABLE "areas" RENAME COLUMN "named_holidays" TO "holidays";
