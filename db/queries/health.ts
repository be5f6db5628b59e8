import { sql } from 'drizzle-orm'
import type { Handle } from '../client'

function instantOf(value: unknown): number | null {
  return value === null || value === undefined ? null : Number(value)
}

/** Figures by which one sees whether texts move; instants in epoch milliseconds. */
export async function findHealth(db: Handle, now: number) {
  const found = await db.execute(sql`
    select
      (select count(*)::int from attempts where state in ('posting', 'in doubt')) as in_doubt,
      (select (extract(epoch from max(sent_at)) * 1000)::float8 from texts) as last_sent_at,
      (select (extract(epoch from max(created_at)) * 1000)::float8 from prompts) as last_plan_at,
      (select (extract(epoch from min(send_after)) * 1000)::float8 from texts
        where state = 'queued' and send_after <= ${new Date(now).toISOString()}::timestamptz) as oldest_unsent_at`)
  const row = found.rows[0] ?? {}
  return {
    inDoubt: Number(row.in_doubt ?? 0),
    lastSentAt: instantOf(row.last_sent_at),
    lastPlanAt: instantOf(row.last_plan_at),
    oldestUnsentAt: instantOf(row.oldest_unsent_at),
  }
}
