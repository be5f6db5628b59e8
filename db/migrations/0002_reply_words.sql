CREATE TABLE "added_words" (
	"id" text PRIMARY KEY NOT NULL,
	"language" text NOT NULL,
	"concept" text NOT NULL,
	"phrase" text NOT NULL,
	"text_id" text,
	"added_by" text NOT NULL,
	"added_at" timestamp (3) with time zone NOT NULL,
	"retired_by" text,
	"retired_at" timestamp (3) with time zone,
	CONSTRAINT "added_words_retired_by_somebody" CHECK (("added_words"."retired_by" is null) = ("added_words"."retired_at" is null))
);
--> statement-breakpoint
CREATE TABLE "settled_proposals" (
	"reading_n" bigint PRIMARY KEY NOT NULL,
	"outcome" text NOT NULL,
	"settled_by" text NOT NULL,
	"settled_at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "settled_proposals_outcome_known" CHECK ("settled_proposals"."outcome" in ('words added', 'set aside'))
);
--> statement-breakpoint
ALTER TABLE "added_words" ADD CONSTRAINT "added_words_text_id_texts_id_fk" FOREIGN KEY ("text_id") REFERENCES "public"."texts"("id") ON DELETE set null ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "added_words" ADD CONSTRAINT "added_words_added_by_staff_id_fk" FOREIGN KEY ("added_by") REFERENCES "public"."staff"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "added_words" ADD CONSTRAINT "added_words_retired_by_staff_id_fk" FOREIGN KEY ("retired_by") REFERENCES "public"."staff"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "settled_proposals" ADD CONSTRAINT "settled_proposals_reading_n_reply_readings_n_fk" FOREIGN KEY ("reading_n") REFERENCES "public"."reply_readings"("n") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "settled_proposals" ADD CONSTRAINT "settled_proposals_settled_by_staff_id_fk" FOREIGN KEY ("settled_by") REFERENCES "public"."staff"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "added_words_one_meaning" ON "added_words" USING btree ("language","phrase") WHERE "added_words"."retired_at" is null;--> statement-breakpoint
CREATE INDEX "reply_readings_by_people" ON "reply_readings" USING btree ("n") WHERE "reply_readings"."read_by" <> 'desk';--> statement-breakpoint
CREATE INDEX "texts_in_language" ON "texts" USING btree ("language","n") WHERE "texts"."direction" = 'in';