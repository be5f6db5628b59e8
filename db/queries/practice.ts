import { sql } from 'drizzle-orm'
import type { Handle } from '../client'

export type Waiting = {
  /** When the next text may go, and the next silence is to be followed up; null where there is none. */
  textAt: number | null
  nudgeAt: number | null
  /** A text's fate is not known yet. */
  inDoubt: boolean
}

/** What waits to be done by the clock. */
export async function findWaiting(db: Handle): Promise<Waiting> {
  const { rows } = await db.execute<Record<'text_at' | 'nudge_at', number | string | null>>(sql`
    select
      (select extract(epoch from min(send_after))::float8 * 1000 from texts
        where state = 'queued') as text_at,
      (select extract(epoch from min(nudge_after))::float8 * 1000 from prompts
        where state = 'asked') as nudge_at,
      (select count(*)::int from attempts where state in ('posting', 'in doubt')) as in_doubt`)
  const [row] = rows as Record<string, number | string | null>[]
  const at = (value: number | string | null | undefined) => (value == null ? null : Number(value))
  return {
    textAt: at(row?.text_at),
    nudgeAt: at(row?.nudge_at),
    inDoubt: Number(row?.in_doubt ?? 0) > 0,
  }
}

/** What happened after `from` and up to `to`. */
export async function countHappened(db: Handle, { from, to }: { from: number; to: number }) {
  const span = (column: 'created_at' | 'sent_at' | 'opened_at') =>
    sql`${sql.identifier(column)} > ${new Date(from).toISOString()}::timestamptz
      and ${sql.identifier(column)} <= ${new Date(to).toISOString()}::timestamptz`
  const { rows } = await db.execute<Record<'planned' | 'sent' | 'opened', number | string>>(sql`
    select
      (select count(*) from prompts where ${span('created_at')})::int as planned,
      (select count(*) from texts where direction = 'out' and ${span('sent_at')})::int as sent,
      (select count(*) from tickets where ${span('opened_at')})::int as opened`)
  const [row] = rows
  return {
    prompts: Number(row?.planned ?? 0),
    texts: Number(row?.sent ?? 0),
    tickets: Number(row?.opened ?? 0),
  }
}
