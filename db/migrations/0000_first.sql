CREATE TABLE "areas" (
	"id" text PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"time_zone" text NOT NULL,
	"language" text NOT NULL,
	"window_opens_minute" integer DEFAULT 480 NOT NULL,
	"window_closes_minute" integer DEFAULT 1200 NOT NULL,
	"sundays_off" boolean DEFAULT true NOT NULL,
	"holidays" text[] DEFAULT '{}'::text[] NOT NULL,
	"altitude_metres" integer DEFAULT 0 NOT NULL,
	"wet_months" integer[] DEFAULT '{}'::integer[] NOT NULL,
	"month_celsius" integer[] NOT NULL,
	"depot_id" text NOT NULL,
	"created_at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "areas_name_unique" UNIQUE("name"),
	CONSTRAINT "areas_window_whole" CHECK ("areas"."window_opens_minute" >= 0 and "areas"."window_closes_minute" <= 1440 and "areas"."window_opens_minute" < "areas"."window_closes_minute"),
	CONSTRAINT "areas_month_celsius_twelve" CHECK (cardinality("areas"."month_celsius") = 12)
);
--> statement-breakpoint
CREATE TABLE "depots" (
	"id" text PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"place" text DEFAULT '' NOT NULL,
	"created_at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "depots_name_unique" UNIQUE("name")
);
--> statement-breakpoint
CREATE TABLE "settings" (
	"key" text PRIMARY KEY NOT NULL,
	"value" jsonb NOT NULL,
	"set_at" timestamp (3) with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "consents" (
	"n" bigserial PRIMARY KEY NOT NULL,
	"phone_id" text NOT NULL,
	"consent" text NOT NULL,
	"how" text NOT NULL,
	"text_id" text,
	"staff_id" text,
	"at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "consents_known" CHECK ("consents"."consent" in ('given', 'withdrawn'))
);
--> statement-breakpoint
CREATE TABLE "household_phones" (
	"household_id" text NOT NULL,
	"phone_id" text NOT NULL,
	"answered_by" text DEFAULT '' NOT NULL,
	"first" boolean DEFAULT true NOT NULL,
	CONSTRAINT "household_phones_household_id_phone_id_pk" PRIMARY KEY("household_id","phone_id")
);
--> statement-breakpoint
CREATE TABLE "households" (
	"id" text PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"area_id" text NOT NULL,
	"language" text NOT NULL,
	"place" text DEFAULT '' NOT NULL,
	"people" integer NOT NULL,
	"infant" boolean DEFAULT false NOT NULL,
	"pregnant" boolean DEFAULT false NOT NULL,
	"elderly" boolean DEFAULT false NOT NULL,
	"ill" boolean DEFAULT false NOT NULL,
	"source_class" text NOT NULL,
	"moved_at" timestamp (3) with time zone,
	"created_at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "households_people_sane" CHECK ("households"."people" between 1 and 60),
	CONSTRAINT "households_source_known" CHECK ("households"."source_class" in ('clear', 'cloudy', 'very cloudy'))
);
--> statement-breakpoint
CREATE TABLE "phones" (
	"id" text PRIMARY KEY NOT NULL,
	"e164" text NOT NULL,
	"state" text DEFAULT 'active' NOT NULL,
	"state_why" text DEFAULT '' NOT NULL,
	"consent" text DEFAULT 'none' NOT NULL,
	"carrier_blocked" boolean DEFAULT false NOT NULL,
	"created_at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "phones_e164_unique" UNIQUE("e164"),
	CONSTRAINT "phones_e164_shape" CHECK ("phones"."e164" ~ '^[+][1-9][0-9]{6,14}$'),
	CONSTRAINT "phones_state_known" CHECK ("phones"."state" in ('active', 'suspended', 'gone')),
	CONSTRAINT "phones_consent_known" CHECK ("phones"."consent" in ('none', 'given', 'withdrawn'))
);
--> statement-breakpoint
CREATE TABLE "fittings" (
	"id" text PRIMARY KEY NOT NULL,
	"kit_id" text NOT NULL,
	"position" integer NOT NULL,
	"part_id" text NOT NULL,
	"fitted_on" date NOT NULL,
	"due_on" date NOT NULL,
	"removed_on" date,
	"removed_for" text,
	"created_at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "fittings_position_known" CHECK ("fittings"."position" between 1 and 3),
	CONSTRAINT "fittings_removed_after_fitted" CHECK ("fittings"."removed_on" is null or "fittings"."removed_on" >= "fittings"."fitted_on"),
	CONSTRAINT "fittings_due_after_fitted" CHECK ("fittings"."due_on" > "fittings"."fitted_on")
);
--> statement-breakpoint
CREATE TABLE "kit_model_stages" (
	"id" text PRIMARY KEY NOT NULL,
	"model_id" text NOT NULL,
	"position" integer NOT NULL,
	"kind" text NOT NULL,
	"part_id" text NOT NULL,
	"change_months" integer NOT NULL,
	"washed" boolean NOT NULL,
	CONSTRAINT "kit_model_stages_position_one" UNIQUE("model_id","position"),
	CONSTRAINT "kit_model_stages_position_known" CHECK ("kit_model_stages"."position" between 1 and 3),
	CONSTRAINT "kit_model_stages_kind_known" CHECK ("kit_model_stages"."kind" in ('cloth', 'carbon', 'fibre')),
	CONSTRAINT "kit_model_stages_months_sane" CHECK ("kit_model_stages"."change_months" between 1 and 60)
);
--> statement-breakpoint
CREATE TABLE "kit_models" (
	"id" text PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"nominal_litres_per_hour" double precision NOT NULL,
	"bottle_litres" double precision DEFAULT 1 NOT NULL,
	CONSTRAINT "kit_models_name_unique" UNIQUE("name")
);
--> statement-breakpoint
CREATE TABLE "kits" (
	"id" text PRIMARY KEY NOT NULL,
	"number" bigserial NOT NULL,
	"household_id" text NOT NULL,
	"model_id" text NOT NULL,
	"handed_over_on" date NOT NULL,
	"state" text DEFAULT 'in use' NOT NULL,
	"out_of_service_since" timestamp (3) with time zone,
	"last_wash_on" date NOT NULL,
	"next_wash_on" date NOT NULL,
	"next_flow_check_on" date NOT NULL,
	"created_at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "kits_number_unique" UNIQUE("number"),
	CONSTRAINT "kits_state_known" CHECK ("kits"."state" in ('in use', 'out of service', 'retired')),
	CONSTRAINT "kits_out_has_since" CHECK (("kits"."state" = 'out of service') = ("kits"."out_of_service_since" is not null))
);
--> statement-breakpoint
CREATE TABLE "parts" (
	"id" text PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"kind" text NOT NULL,
	CONSTRAINT "parts_name_unique" UNIQUE("name")
);
--> statement-breakpoint
CREATE TABLE "part_promises" (
	"id" text PRIMARY KEY NOT NULL,
	"ticket_id" text,
	"kit_id" text NOT NULL,
	"position" integer NOT NULL,
	"part_id" text NOT NULL,
	"depot_id" text NOT NULL,
	"state" text DEFAULT 'promised' NOT NULL,
	"promised_at" timestamp (3) with time zone NOT NULL,
	"ended_at" timestamp (3) with time zone,
	CONSTRAINT "part_promises_state_known" CHECK ("part_promises"."state" in ('promised', 'handed over', 'withdrawn'))
);
--> statement-breakpoint
CREATE TABLE "flow_readings" (
	"n" bigserial PRIMARY KEY NOT NULL,
	"kit_id" text NOT NULL,
	"fibre_fitting_id" text NOT NULL,
	"ticket_id" text,
	"text_id" text,
	"litres" double precision NOT NULL,
	"seconds" double precision NOT NULL,
	"celsius" double precision NOT NULL,
	"celsius_from" text NOT NULL,
	"head_ratio" double precision DEFAULT 1 NOT NULL,
	"litres_per_hour" double precision NOT NULL,
	"normalised" double precision NOT NULL,
	"error_share" double precision NOT NULL,
	"known" text NOT NULL,
	"at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "flow_readings_one_a_text" UNIQUE("text_id"),
	CONSTRAINT "flow_readings_positive" CHECK ("flow_readings"."litres" > 0 and "flow_readings"."seconds" > 0 and "flow_readings"."head_ratio" > 0 and "flow_readings"."head_ratio" <= 1),
	CONSTRAINT "flow_readings_known_how" CHECK ("flow_readings"."known" in ('said', 'measured', 'seen'))
);
--> statement-breakpoint
CREATE TABLE "washes" (
	"n" bigserial PRIMARY KEY NOT NULL,
	"kit_id" text NOT NULL,
	"ticket_id" text,
	"washed_on" date NOT NULL,
	"known" text NOT NULL,
	"at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "washes_known_how" CHECK ("washes"."known" in ('said', 'measured', 'seen'))
);
--> statement-breakpoint
CREATE TABLE "audit" (
	"n" bigserial PRIMARY KEY NOT NULL,
	"staff_id" text,
	"act" text NOT NULL,
	"subject" text NOT NULL,
	"subject_id" text NOT NULL,
	"detail" jsonb NOT NULL,
	"at" timestamp (3) with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "staff" (
	"id" text PRIMARY KEY NOT NULL,
	"email" text NOT NULL,
	"name" text NOT NULL,
	"role" text NOT NULL,
	"languages" text[] NOT NULL,
	"password_hash" text NOT NULL,
	"session_version" integer DEFAULT 1 NOT NULL,
	"disabled_at" timestamp (3) with time zone,
	"created_at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "staff_role_known" CHECK ("staff"."role" in ('agent', 'coordinator', 'visitor'))
);
--> statement-breakpoint
CREATE TABLE "stock_moves" (
	"n" bigserial PRIMARY KEY NOT NULL,
	"depot_id" text NOT NULL,
	"part_id" text NOT NULL,
	"quantity" integer NOT NULL,
	"why" text NOT NULL,
	"promise_id" text,
	"staff_id" text,
	"at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "stock_moves_one_a_promise" UNIQUE("promise_id"),
	CONSTRAINT "stock_moves_not_nothing" CHECK ("stock_moves"."quantity" <> 0),
	CONSTRAINT "stock_moves_why_known" CHECK ("stock_moves"."why" in ('received', 'handed over', 'counted', 'lost'))
);
--> statement-breakpoint
CREATE TABLE "attempts" (
	"id" text PRIMARY KEY NOT NULL,
	"text_id" text NOT NULL,
	"phone_id" text NOT NULL,
	"n" integer NOT NULL,
	"state" text NOT NULL,
	"sid" text,
	"code" text DEFAULT '' NOT NULL,
	"rank" integer DEFAULT 0 NOT NULL,
	"looks" integer DEFAULT 0 NOT NULL,
	"looked_at" timestamp (3) with time zone,
	"posting_at" timestamp (3) with time zone NOT NULL,
	"ended_at" timestamp (3) with time zone,
	CONSTRAINT "attempts_sid_unique" UNIQUE("sid"),
	CONSTRAINT "attempts_number" UNIQUE("text_id","n"),
	CONSTRAINT "attempts_state_known" CHECK ("attempts"."state" in ('posting', 'accepted', 'refused', 'in doubt', 'not created'))
);
--> statement-breakpoint
CREATE TABLE "prompts" (
	"id" text PRIMARY KEY NOT NULL,
	"kit_id" text NOT NULL,
	"kind" text NOT NULL,
	"due_on" date NOT NULL,
	"positions" integer[] DEFAULT '{}'::integer[] NOT NULL,
	"state" text DEFAULT 'planned' NOT NULL,
	"text_id" text NOT NULL,
	"tries" integer DEFAULT 1 NOT NULL,
	"nudges" integer DEFAULT 0 NOT NULL,
	"nudge_after" timestamp (3) with time zone,
	"answered_at" timestamp (3) with time zone,
	"created_at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "prompts_one_a_kit_kind_and_date" UNIQUE("kit_id","kind","due_on"),
	CONSTRAINT "prompts_kind_known" CHECK ("prompts"."kind" in ('wash', 'change', 'flow check', 'welcome')),
	CONSTRAINT "prompts_state_known" CHECK ("prompts"."state" in ('planned', 'asked', 'answered', 'silent', 'dropped'))
);
--> statement-breakpoint
CREATE TABLE "receipts" (
	"n" bigserial PRIMARY KEY NOT NULL,
	"attempt_id" text,
	"sid" text NOT NULL,
	"status" text NOT NULL,
	"code" text DEFAULT '' NOT NULL,
	"raw" jsonb NOT NULL,
	"at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "receipts_once" UNIQUE("sid","status","code")
);
--> statement-breakpoint
CREATE TABLE "reply_readings" (
	"n" bigserial PRIMARY KEY NOT NULL,
	"text_id" text NOT NULL,
	"read_by" text DEFAULT 'desk' NOT NULL,
	"asked" text NOT NULL,
	"kind" text NOT NULL,
	"minutes" double precision,
	"choice" integer,
	"sure" double precision NOT NULL,
	"at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "reply_readings_once_a_reader" UNIQUE("text_id","read_by"),
	CONSTRAINT "reply_readings_sure_share" CHECK ("reply_readings"."sure" between 0 and 1)
);
--> statement-breakpoint
CREATE TABLE "texts" (
	"n" bigserial NOT NULL,
	"id" text PRIMARY KEY NOT NULL,
	"direction" text NOT NULL,
	"purpose" text NOT NULL,
	"phone_id" text,
	"household_id" text,
	"kit_id" text,
	"ticket_id" text,
	"e164" text NOT NULL,
	"moment" text,
	"wording_id" text,
	"language" text NOT NULL,
	"body" text NOT NULL,
	"values" jsonb,
	"staff_body" text,
	"segments" integer DEFAULT 0 NOT NULL,
	"asked" text DEFAULT 'none' NOT NULL,
	"step_id" text,
	"state" text NOT NULL,
	"state_why" text DEFAULT '' NOT NULL,
	"send_after" timestamp (3) with time zone,
	"not_after" timestamp (3) with time zone,
	"any_hour" boolean DEFAULT false NOT NULL,
	"sid" text,
	"raw" jsonb,
	"staff_id" text,
	"created_at" timestamp (3) with time zone NOT NULL,
	"sent_at" timestamp (3) with time zone,
	CONSTRAINT "texts_n_unique" UNIQUE("n"),
	CONSTRAINT "texts_purpose_unique" UNIQUE("purpose"),
	CONSTRAINT "texts_sid_unique" UNIQUE("sid"),
	CONSTRAINT "texts_direction_known" CHECK ("texts"."direction" in ('in', 'out')),
	CONSTRAINT "texts_state_fits_direction" CHECK (("texts"."direction" = 'in') = ("texts"."state" in ('received', 'read'))),
	CONSTRAINT "texts_out_has_hour" CHECK ("texts"."direction" = 'in' or "texts"."send_after" is not null)
);
--> statement-breakpoint
CREATE TABLE "ticket_events" (
	"id" bigserial PRIMARY KEY NOT NULL,
	"ticket_id" text NOT NULL,
	"n" integer NOT NULL,
	"kind" text NOT NULL,
	"event" jsonb NOT NULL,
	"staff_id" text,
	"at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "ticket_events_in_order" UNIQUE("ticket_id","n")
);
--> statement-breakpoint
CREATE TABLE "tickets" (
	"id" text PRIMARY KEY NOT NULL,
	"kit_id" text NOT NULL,
	"household_id" text NOT NULL,
	"stage" text NOT NULL,
	"trouble" text NOT NULL,
	"waiting_for" text,
	"no_safe_water_since" timestamp (3) with time zone,
	"taken_by" text,
	"automatic" boolean NOT NULL,
	"version" integer NOT NULL,
	"opened_at" timestamp (3) with time zone NOT NULL,
	"ended_at" timestamp (3) with time zone,
	"cause" text,
	CONSTRAINT "tickets_stage_known" CHECK ("tickets"."stage" in ('new', 'walking', 'waiting', 'part owed', 'visit due', 'flowing', 'retired', 'withdrawn')),
	CONSTRAINT "tickets_ended_means_closed_stage" CHECK (("tickets"."ended_at" is not null) = ("tickets"."stage" in ('flowing', 'retired', 'withdrawn')))
);
--> statement-breakpoint
CREATE TABLE "walks" (
	"ticket_id" text PRIMARY KEY NOT NULL,
	"walk" jsonb NOT NULL,
	"changed_at" timestamp (3) with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "visits" (
	"id" text PRIMARY KEY NOT NULL,
	"ticket_id" text,
	"household_id" text NOT NULL,
	"visitor_id" text,
	"why" text NOT NULL,
	"due_on" date NOT NULL,
	"state" text DEFAULT 'due' NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"created_at" timestamp (3) with time zone NOT NULL,
	"ended_at" timestamp (3) with time zone,
	CONSTRAINT "visits_state_known" CHECK ("visits"."state" in ('due', 'done', 'withdrawn'))
);
--> statement-breakpoint
CREATE TABLE "wordings" (
	"id" text PRIMARY KEY NOT NULL,
	"moment" text NOT NULL,
	"language" text NOT NULL,
	"edition" integer NOT NULL,
	"body" text NOT NULL,
	"state" text NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"first_language_edition" integer NOT NULL,
	"written_by" text,
	"approved_by" text,
	"second_approved_by" text,
	"written_at" timestamp (3) with time zone NOT NULL,
	"in_use_from" timestamp (3) with time zone,
	CONSTRAINT "wordings_edition_one" UNIQUE("moment","language","edition"),
	CONSTRAINT "wordings_state_known" CHECK ("wordings"."state" in ('draft', 'approved', 'in use', 'retired')),
	CONSTRAINT "wordings_two_people" CHECK ("wordings"."second_approved_by" is null or "wordings"."second_approved_by" <> "wordings"."approved_by")
);
--> statement-breakpoint
ALTER TABLE "areas" ADD CONSTRAINT "areas_depot_id_depots_id_fk" FOREIGN KEY ("depot_id") REFERENCES "public"."depots"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "consents" ADD CONSTRAINT "consents_phone_id_phones_id_fk" FOREIGN KEY ("phone_id") REFERENCES "public"."phones"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "consents" ADD CONSTRAINT "consents_text_id_texts_id_fk" FOREIGN KEY ("text_id") REFERENCES "public"."texts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "consents" ADD CONSTRAINT "consents_staff_id_staff_id_fk" FOREIGN KEY ("staff_id") REFERENCES "public"."staff"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "household_phones" ADD CONSTRAINT "household_phones_household_id_households_id_fk" FOREIGN KEY ("household_id") REFERENCES "public"."households"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "household_phones" ADD CONSTRAINT "household_phones_phone_id_phones_id_fk" FOREIGN KEY ("phone_id") REFERENCES "public"."phones"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "households" ADD CONSTRAINT "households_area_id_areas_id_fk" FOREIGN KEY ("area_id") REFERENCES "public"."areas"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fittings" ADD CONSTRAINT "fittings_kit_id_kits_id_fk" FOREIGN KEY ("kit_id") REFERENCES "public"."kits"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fittings" ADD CONSTRAINT "fittings_part_id_parts_id_fk" FOREIGN KEY ("part_id") REFERENCES "public"."parts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "kit_model_stages" ADD CONSTRAINT "kit_model_stages_model_id_kit_models_id_fk" FOREIGN KEY ("model_id") REFERENCES "public"."kit_models"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "kit_model_stages" ADD CONSTRAINT "kit_model_stages_part_id_parts_id_fk" FOREIGN KEY ("part_id") REFERENCES "public"."parts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "kits" ADD CONSTRAINT "kits_household_id_households_id_fk" FOREIGN KEY ("household_id") REFERENCES "public"."households"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "kits" ADD CONSTRAINT "kits_model_id_kit_models_id_fk" FOREIGN KEY ("model_id") REFERENCES "public"."kit_models"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "part_promises" ADD CONSTRAINT "part_promises_ticket_id_tickets_id_fk" FOREIGN KEY ("ticket_id") REFERENCES "public"."tickets"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "part_promises" ADD CONSTRAINT "part_promises_kit_id_kits_id_fk" FOREIGN KEY ("kit_id") REFERENCES "public"."kits"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "part_promises" ADD CONSTRAINT "part_promises_part_id_parts_id_fk" FOREIGN KEY ("part_id") REFERENCES "public"."parts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "part_promises" ADD CONSTRAINT "part_promises_depot_id_depots_id_fk" FOREIGN KEY ("depot_id") REFERENCES "public"."depots"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "flow_readings" ADD CONSTRAINT "flow_readings_kit_id_kits_id_fk" FOREIGN KEY ("kit_id") REFERENCES "public"."kits"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "flow_readings" ADD CONSTRAINT "flow_readings_fibre_fitting_id_fittings_id_fk" FOREIGN KEY ("fibre_fitting_id") REFERENCES "public"."fittings"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "flow_readings" ADD CONSTRAINT "flow_readings_ticket_id_tickets_id_fk" FOREIGN KEY ("ticket_id") REFERENCES "public"."tickets"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "flow_readings" ADD CONSTRAINT "flow_readings_text_id_texts_id_fk" FOREIGN KEY ("text_id") REFERENCES "public"."texts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "washes" ADD CONSTRAINT "washes_kit_id_kits_id_fk" FOREIGN KEY ("kit_id") REFERENCES "public"."kits"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "washes" ADD CONSTRAINT "washes_ticket_id_tickets_id_fk" FOREIGN KEY ("ticket_id") REFERENCES "public"."tickets"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "audit" ADD CONSTRAINT "audit_staff_id_staff_id_fk" FOREIGN KEY ("staff_id") REFERENCES "public"."staff"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "stock_moves" ADD CONSTRAINT "stock_moves_depot_id_depots_id_fk" FOREIGN KEY ("depot_id") REFERENCES "public"."depots"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "stock_moves" ADD CONSTRAINT "stock_moves_part_id_parts_id_fk" FOREIGN KEY ("part_id") REFERENCES "public"."parts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "stock_moves" ADD CONSTRAINT "stock_moves_promise_id_part_promises_id_fk" FOREIGN KEY ("promise_id") REFERENCES "public"."part_promises"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "stock_moves" ADD CONSTRAINT "stock_moves_staff_id_staff_id_fk" FOREIGN KEY ("staff_id") REFERENCES "public"."staff"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "attempts" ADD CONSTRAINT "attempts_text_id_texts_id_fk" FOREIGN KEY ("text_id") REFERENCES "public"."texts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "attempts" ADD CONSTRAINT "attempts_phone_id_phones_id_fk" FOREIGN KEY ("phone_id") REFERENCES "public"."phones"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "prompts" ADD CONSTRAINT "prompts_kit_id_kits_id_fk" FOREIGN KEY ("kit_id") REFERENCES "public"."kits"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "prompts" ADD CONSTRAINT "prompts_text_id_texts_id_fk" FOREIGN KEY ("text_id") REFERENCES "public"."texts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "receipts" ADD CONSTRAINT "receipts_attempt_id_attempts_id_fk" FOREIGN KEY ("attempt_id") REFERENCES "public"."attempts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reply_readings" ADD CONSTRAINT "reply_readings_text_id_texts_id_fk" FOREIGN KEY ("text_id") REFERENCES "public"."texts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "texts" ADD CONSTRAINT "texts_phone_id_phones_id_fk" FOREIGN KEY ("phone_id") REFERENCES "public"."phones"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "texts" ADD CONSTRAINT "texts_household_id_households_id_fk" FOREIGN KEY ("household_id") REFERENCES "public"."households"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "texts" ADD CONSTRAINT "texts_kit_id_kits_id_fk" FOREIGN KEY ("kit_id") REFERENCES "public"."kits"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "texts" ADD CONSTRAINT "texts_ticket_id_tickets_id_fk" FOREIGN KEY ("ticket_id") REFERENCES "public"."tickets"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "texts" ADD CONSTRAINT "texts_wording_id_wordings_id_fk" FOREIGN KEY ("wording_id") REFERENCES "public"."wordings"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "texts" ADD CONSTRAINT "texts_staff_id_staff_id_fk" FOREIGN KEY ("staff_id") REFERENCES "public"."staff"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "ticket_events" ADD CONSTRAINT "ticket_events_ticket_id_tickets_id_fk" FOREIGN KEY ("ticket_id") REFERENCES "public"."tickets"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "ticket_events" ADD CONSTRAINT "ticket_events_staff_id_staff_id_fk" FOREIGN KEY ("staff_id") REFERENCES "public"."staff"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tickets" ADD CONSTRAINT "tickets_kit_id_kits_id_fk" FOREIGN KEY ("kit_id") REFERENCES "public"."kits"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tickets" ADD CONSTRAINT "tickets_household_id_households_id_fk" FOREIGN KEY ("household_id") REFERENCES "public"."households"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tickets" ADD CONSTRAINT "tickets_taken_by_staff_id_fk" FOREIGN KEY ("taken_by") REFERENCES "public"."staff"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "walks" ADD CONSTRAINT "walks_ticket_id_tickets_id_fk" FOREIGN KEY ("ticket_id") REFERENCES "public"."tickets"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visits" ADD CONSTRAINT "visits_ticket_id_tickets_id_fk" FOREIGN KEY ("ticket_id") REFERENCES "public"."tickets"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visits" ADD CONSTRAINT "visits_household_id_households_id_fk" FOREIGN KEY ("household_id") REFERENCES "public"."households"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visits" ADD CONSTRAINT "visits_visitor_id_staff_id_fk" FOREIGN KEY ("visitor_id") REFERENCES "public"."staff"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "wordings" ADD CONSTRAINT "wordings_written_by_staff_id_fk" FOREIGN KEY ("written_by") REFERENCES "public"."staff"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "wordings" ADD CONSTRAINT "wordings_approved_by_staff_id_fk" FOREIGN KEY ("approved_by") REFERENCES "public"."staff"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "wordings" ADD CONSTRAINT "wordings_second_approved_by_staff_id_fk" FOREIGN KEY ("second_approved_by") REFERENCES "public"."staff"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "consents_phone" ON "consents" USING btree ("phone_id");--> statement-breakpoint
CREATE INDEX "household_phones_phone" ON "household_phones" USING btree ("phone_id");--> statement-breakpoint
CREATE UNIQUE INDEX "household_phones_one_first" ON "household_phones" USING btree ("household_id") WHERE "household_phones"."first";--> statement-breakpoint
CREATE INDEX "households_area" ON "households" USING btree ("area_id");--> statement-breakpoint
CREATE UNIQUE INDEX "fittings_one_in_a_stage" ON "fittings" USING btree ("kit_id","position") WHERE "fittings"."removed_on" is null;--> statement-breakpoint
CREATE INDEX "fittings_due" ON "fittings" USING btree ("due_on") WHERE "fittings"."removed_on" is null;--> statement-breakpoint
CREATE INDEX "kits_household" ON "kits" USING btree ("household_id");--> statement-breakpoint
CREATE INDEX "kits_next_wash" ON "kits" USING btree ("next_wash_on");--> statement-breakpoint
CREATE INDEX "kits_next_flow_check" ON "kits" USING btree ("next_flow_check_on");--> statement-breakpoint
CREATE UNIQUE INDEX "part_promises_one_open" ON "part_promises" USING btree ("kit_id","position") WHERE "part_promises"."state" = 'promised';--> statement-breakpoint
CREATE INDEX "part_promises_depot" ON "part_promises" USING btree ("depot_id","part_id") WHERE "part_promises"."state" = 'promised';--> statement-breakpoint
CREATE INDEX "flow_readings_kit" ON "flow_readings" USING btree ("kit_id","at");--> statement-breakpoint
CREATE INDEX "washes_kit" ON "washes" USING btree ("kit_id");--> statement-breakpoint
CREATE INDEX "audit_subject" ON "audit" USING btree ("subject","subject_id");--> statement-breakpoint
CREATE UNIQUE INDEX "staff_email_one" ON "staff" USING btree (lower("email"));--> statement-breakpoint
CREATE INDEX "stock_moves_place" ON "stock_moves" USING btree ("depot_id","part_id");--> statement-breakpoint
CREATE UNIQUE INDEX "attempts_one_in_flight" ON "attempts" USING btree ("phone_id") WHERE "attempts"."state" in ('posting', 'in doubt');--> statement-breakpoint
CREATE INDEX "prompts_nudge" ON "prompts" USING btree ("nudge_after") WHERE "prompts"."nudge_after" is not null;--> statement-breakpoint
CREATE INDEX "prompts_text" ON "prompts" USING btree ("text_id");--> statement-breakpoint
CREATE INDEX "texts_due" ON "texts" USING btree ("send_after") WHERE "texts"."state" = 'queued';--> statement-breakpoint
CREATE INDEX "texts_household" ON "texts" USING btree ("household_id","n");--> statement-breakpoint
CREATE INDEX "texts_phone" ON "texts" USING btree ("phone_id","n");--> statement-breakpoint
CREATE INDEX "texts_ticket" ON "texts" USING btree ("ticket_id");--> statement-breakpoint
CREATE UNIQUE INDEX "tickets_one_open_a_kit" ON "tickets" USING btree ("kit_id") WHERE "tickets"."ended_at" is null;--> statement-breakpoint
CREATE INDEX "tickets_open" ON "tickets" USING btree ("opened_at") WHERE "tickets"."ended_at" is null;--> statement-breakpoint
CREATE INDEX "tickets_household" ON "tickets" USING btree ("household_id");--> statement-breakpoint
CREATE UNIQUE INDEX "visits_one_due_a_household" ON "visits" USING btree ("household_id") WHERE "visits"."state" = 'due';--> statement-breakpoint
CREATE INDEX "visits_visitor" ON "visits" USING btree ("visitor_id","state");--> statement-breakpoint
CREATE UNIQUE INDEX "wordings_one_in_use" ON "wordings" USING btree ("moment","language") WHERE "wordings"."state" = 'in use';--> statement-breakpoint
CREATE UNIQUE INDEX "wordings_one_open" ON "wordings" USING btree ("moment","language") WHERE "wordings"."state" in ('draft', 'approved');