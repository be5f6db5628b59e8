import { sql } from 'drizzle-orm'
import {
  bigserial,
  check,
  index,
  integer,
  jsonb,
  pgTable,
  text,
  uniqueIndex,
} from 'drizzle-orm/pg-core'
import { id, instant } from './columns'

/** People who sign in. A raised session version ends every session opened before it. */
export const staff = pgTable(
  'staff',
  {
    id: id(),
    email: text('email').notNull(),
    name: text('name').notNull(),
    role: text('role').$type<'agent' | 'coordinator' | 'visitor'>().notNull(),
    languages: text('languages').array().notNull(),
    passwordHash: text('password_hash').notNull(),
    sessionVersion: integer('session_version').notNull().default(1),
    disabledAt: instant('disabled_at'),
    createdAt: instant('created_at').notNull(),
  },
  (t) => [
    uniqueIndex('staff_email_one').on(sql`lower(${t.email})`),
    check('staff_role_known', sql`${t.role} in ('agent', 'coordinator', 'visitor')`),
  ],
)

/** Who did what to whom, append-only. `staffId` is null when the desk acted by itself. */
export const audit = pgTable(
  'audit',
  {
    n: bigserial('n', { mode: 'number' }).primaryKey(),
    staffId: text('staff_id').references(() => staff.id),
    act: text('act').notNull(),
    subject: text('subject').notNull(),
    subjectId: text('subject_id').notNull(),
    detail: jsonb('detail').$type<Record<string, unknown>>().notNull(),
    at: instant('at').notNull(),
  },
  (t) => [index('audit_subject').on(t.subject, t.subjectId)],
)
