import { sql } from 'drizzle-orm'
import {
  bigserial,
  boolean,
  check,
  date,
  doublePrecision,
  index,
  integer,
  jsonb,
  pgTable,
  text,
  unique,
  uniqueIndex,
} from 'drizzle-orm/pg-core'
import type { Language } from '@/lib/domain/language'
import type { Asked, ReplyKind } from '@/lib/domain/reply'
import { id, instant } from './columns'
import { households, phones } from './household'
import { kits } from './kit'
import { staff } from './staff'
import { tickets } from './ticket'
import { wordings } from './wording'

/** A planned nudge for a kit. One a kit, kind and due date, for ever. */
export const prompts = pgTable(
  'prompts',
  {
    id: id(),
    kitId: text('kit_id')
      .notNull()
      .references(() => kits.id),
    kind: text('kind').$type<'wash' | 'change' | 'flow check' | 'welcome'>().notNull(),
    dueOn: date('due_on').notNull(),
    positions: integer('positions')
      .array()
      .notNull()
      .default(sql`'{}'::integer[]`),
    state: text('state')
      .$type<'planned' | 'asked' | 'answered' | 'silent' | 'dropped'>()
      .notNull()
      .default('planned'),
    textId: text('text_id')
      .notNull()
      .references(() => texts.id),
    tries: integer('tries').notNull().default(1),
    nudges: integer('nudges').notNull().default(0),
    nudgeAfter: instant('nudge_after'),
    answeredAt: instant('answered_at'),
    createdAt: instant('created_at').notNull(),
  },
  (t) => [
    unique('prompts_one_a_kit_kind_and_date').on(t.kitId, t.kind, t.dueOn),
    index('prompts_nudge')
      .on(t.nudgeAfter)
      .where(sql`${t.nudgeAfter} is not null`),
    index('prompts_text').on(t.textId),
    check('prompts_kind_known', sql`${t.kind} in ('wash', 'change', 'flow check', 'welcome')`),
    check(
      'prompts_state_known',
      sql`${t.state} in ('planned', 'asked', 'answered', 'silent', 'dropped')`,
    ),
  ],
)

/**
 * One SMS either way. `purpose` says what for, for whom and when, and is unique: nothing is texted twice
 * for one thing, and an inbound text (`in:<carrier id>`) is stored once however often the carrier calls.
 */
export const texts = pgTable(
  'texts',
  {
    n: bigserial('n', { mode: 'number' }).notNull().unique(),
    id: id(),
    direction: text('direction').$type<'in' | 'out'>().notNull(),
    purpose: text('purpose').notNull().unique(),
    phoneId: text('phone_id').references(() => phones.id),
    householdId: text('household_id').references(() => households.id),
    kitId: text('kit_id').references(() => kits.id),
    ticketId: text('ticket_id').references(() => tickets.id),
    e164: text('e164').notNull(),
    moment: text('moment'),
    wordingId: text('wording_id').references(() => wordings.id),
    language: text('language').$type<Language>().notNull(),
    body: text('body').notNull(),
    /** What the wording was filled with: a text that waits is worded anew when an edition changes. */
    values: jsonb('values').$type<Record<string, string | number>>(),
    staffBody: text('staff_body'),
    segments: integer('segments').notNull().default(0),
    asked: text('asked').$type<Asked>().notNull().default('none'),
    stepId: text('step_id'),
    state: text('state')
      .$type<
        | 'queued'
        | 'sending'
        | 'in doubt'
        | 'sent'
        | 'delivered'
        | 'failed'
        | 'dropped'
        | 'not confirmed'
        | 'received'
        | 'read'
      >()
      .notNull(),
    stateWhy: text('state_why').notNull().default(''),
    sendAfter: instant('send_after'),
    notAfter: instant('not_after'),
    anyHour: boolean('any_hour').notNull().default(false),
    sid: text('sid').unique(),
    raw: jsonb('raw').$type<Record<string, unknown>>(),
    staffId: text('staff_id').references(() => staff.id),
    createdAt: instant('created_at').notNull(),
    sentAt: instant('sent_at'),
  },
  (t) => [
    index('texts_due')
      .on(t.sendAfter)
      .where(sql`${t.state} = 'queued'`),
    index('texts_household').on(t.householdId, t.n),
    index('texts_phone').on(t.phoneId, t.n),
    index('texts_ticket').on(t.ticketId),
    index('texts_in_language')
      .on(t.language, t.n)
      .where(sql`${t.direction} = 'in'`),
    check('texts_direction_known', sql`${t.direction} in ('in', 'out')`),
    check(
      'texts_state_fits_direction',
      sql`(${t.direction} = 'in') = (${t.state} in ('received', 'read'))`,
    ),
    check('texts_out_has_hour', sql`${t.direction} = 'in' or ${t.sendAfter} is not null`),
  ],
)

/** One POST to the carrier, written before it is made. The id travels in the signed receipt address. */
export const attempts = pgTable(
  'attempts',
  {
    id: text('id').primaryKey(),
    textId: text('text_id')
      .notNull()
      .references(() => texts.id),
    phoneId: text('phone_id')
      .notNull()
      .references(() => phones.id),
    n: integer('n').notNull(),
    state: text('state')
      .$type<'posting' | 'accepted' | 'refused' | 'in doubt' | 'not created'>()
      .notNull(),
    sid: text('sid').unique(),
    code: text('code').notNull().default(''),
    rank: integer('rank').notNull().default(0),
    looks: integer('looks').notNull().default(0),
    lookedAt: instant('looked_at'),
    postingAt: instant('posting_at').notNull(),
    endedAt: instant('ended_at'),
  },
  (t) => [
    unique('attempts_number').on(t.textId, t.n),
    uniqueIndex('attempts_one_in_flight')
      .on(t.phoneId)
      .where(sql`${t.state} in ('posting', 'in doubt')`),
    check(
      'attempts_state_known',
      sql`${t.state} in ('posting', 'accepted', 'refused', 'in doubt', 'not created')`,
    ),
  ],
)

/** What the carrier reported, every callback once, in the order of arrival; never updated. */
export const receipts = pgTable(
  'receipts',
  {
    n: bigserial('n', { mode: 'number' }).primaryKey(),
    attemptId: text('attempt_id').references(() => attempts.id),
    sid: text('sid').notNull(),
    status: text('status').notNull(),
    code: text('code').notNull().default(''),
    raw: jsonb('raw').$type<Record<string, unknown>>().notNull(),
    at: instant('at').notNull(),
  },
  (t) => [unique('receipts_once').on(t.sid, t.status, t.code)],
)

/** What a reply was taken to mean; a person's correction is a second row, never a change of the first. */
export const replyReadings = pgTable(
  'reply_readings',
  {
    n: bigserial('n', { mode: 'number' }).primaryKey(),
    textId: text('text_id')
      .notNull()
      .references(() => texts.id),
    readBy: text('read_by').notNull().default('desk'),
    asked: text('asked').$type<Asked>().notNull(),
    kind: text('kind').$type<ReplyKind>().notNull(),
    minutes: doublePrecision('minutes'),
    choice: integer('choice'),
    sure: doublePrecision('sure').notNull(),
    at: instant('at').notNull(),
  },
  (t) => [
    unique('reply_readings_once_a_reader').on(t.textId, t.readBy),
    index('reply_readings_by_people')
      .on(t.n)
      .where(sql`${t.readBy} <> 'desk'`),
    check('reply_readings_sure_share', sql`${t.sure} between 0 and 1`),
  ],
)
