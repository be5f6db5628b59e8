import { sql } from 'drizzle-orm'
import type { Handle } from '../client'

/** The next instant at which something waits to be done: a text for its hour, a silence for its nudge. */
export async function findNextHour(db: Handle): Promise<number | null> {
  const { rows } = await db.execute<{ at: number | string | null }>(sql`
    select extract(epoch from least(
      (select min(send_after) from texts where state = 'queued'),
      (select min(nudge_after) from prompts where state = 'asked')
    ))::float8 * 1000 as at`)
  const at = rows[0]?.at ?? null
  return at === null ? null : Number(at)
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
