DROP INDEX "kits_next_wash";--> statement-breakpoint
DROP INDEX "kits_next_flow_check";--> statement-breakpoint
ALTER TABLE "kits" ADD COLUMN "welcome_due_on" date;--> statement-breakpoint
UPDATE "kits" SET "welcome_due_on" = "handed_over_on" WHERE NOT EXISTS (
	SELECT 1 FROM "prompts" WHERE "prompts"."kit_id" = "kits"."id" AND "prompts"."kind" = 'welcome' AND "prompts"."state" <> 'planned'
);--> statement-breakpoint
CREATE INDEX "kits_wash_due" ON "kits" USING btree ("next_wash_on") WHERE "kits"."state" = 'in use';--> statement-breakpoint
CREATE INDEX "kits_flow_check_due" ON "kits" USING btree ("next_flow_check_on") WHERE "kits"."state" = 'in use';--> statement-breakpoint
CREATE INDEX "kits_welcome_due" ON "kits" USING btree ("welcome_due_on") WHERE "kits"."state" = 'in use' and "kits"."welcome_due_on" is not null;