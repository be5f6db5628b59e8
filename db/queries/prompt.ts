import { and, asc, eq, inArray, lte, sql, type SQL } from 'drizzle-orm'
import type { Handle } from '../client'
import { prompts } from '../schema/text'

export type PromptRow = typeof prompts.$inferSelect

export type DueRow = {
  kitId: string
  kind: PromptRow['kind']
  dueOn: string
  position: 1 | 2 | 3 | null
}

/**
 * The question that `listDue` puts to the database; a test asks how it is going to be answered. The limits
 * inside make the database look each due kit up by its key: left free, it would rather read all kits.
 */
export function dueQuery(horizon: string, limit: number): SQL {
  return sql`
    with due as (
      select k.id as kit_id, 'wash' as kind, k.next_wash_on as due_on, null::int as position
      from kits k where k.state = 'in use' and k.next_wash_on <= ${horizon}
      union all
      select k.id, 'flow check', k.next_flow_check_on, null
      from kits k where k.state = 'in use' and k.next_flow_check_on <= ${horizon}
      union all
      select f.kit_id, 'change', f.due_on, f.position from fittings f
      where f.removed_on is null and f.due_on <= ${horizon}
      union all
      select k.id, 'welcome', k.welcome_due_on, null
      from kits k where k.state = 'in use' and k.welcome_due_on <= ${horizon}
    )
    select d.kit_id, d.kind, d.due_on::text as due_on, d.position
    from due d
    cross join lateral (
      select k.household_id from kits k where k.id = d.kit_id and k.state = 'in use' limit 1
    ) home
    cross join lateral (
      select 1 from household_phones hp
      join phones ph on ph.id = hp.phone_id
        and ph.state = 'active' and ph.consent = 'given' and not ph.carrier_blocked
      where hp.household_id = home.household_id and hp.first limit 1
    ) reached
    where not exists (
        select 1 from prompts p
        where p.kit_id = d.kit_id and p.kind = d.kind and p.due_on = d.due_on and p.state <> 'dropped'
          and (d.position is null or d.position = any (p.positions))
      )
      and not exists (
        select 1 from tickets t where t.kit_id = d.kit_id and t.ended_at is null and t.trouble <> 'silent'
      )
    order by d.due_on, d.kit_id, d.kind, d.position
    limit ${limit}`
}

/**
 * What is due by `horizon` and has no living prompt, kit by kit. Kits that cannot be texted, are out of
 * service or have an open ticket (but for silence) are left out: their trouble is in hand elsewhere. The
 * cost follows what is due, not how many kits there are: each branch walks an index of due dates.
 */
export async function listDue(db: Handle, horizon: string, limit: number): Promise<DueRow[]> {
  const found = await db.execute(dueQuery(horizon, limit))
  return found.rows.map((row) => ({
    kitId: String(row.kit_id),
    kind: row.kind as DueRow['kind'],
    dueOn: String(row.due_on),
    position: row.position === null ? null : (Number(row.position) as 1 | 2 | 3),
  }))
}

/** A prompt for its kit, kind and date: new, or one that was dropped and is tried again. */
export async function upsertPrompt(db: Handle, row: typeof prompts.$inferInsert) {
  const [made] = await db
    .insert(prompts)
    .values(row)
    .onConflictDoUpdate({
      target: [prompts.kitId, prompts.kind, prompts.dueOn],
      set: {
        state: 'planned',
        textId: row.textId,
        positions: row.positions ?? [],
        tries: sql`${prompts.tries} + 1`,
      },
      setWhere: eq(prompts.state, 'dropped'),
    })
    .returning()
  return made ?? null
}

/** The prompt that a kit has for this kind and date; null when there is none. */
export async function findPrompt(
  db: Handle,
  { kitId, kind, dueOn }: { kitId: string; kind: PromptRow['kind']; dueOn: string },
) {
  const [row] = await db
    .select()
    .from(prompts)
    .where(and(eq(prompts.kitId, kitId), eq(prompts.kind, kind), eq(prompts.dueOn, dueOn)))
  return row ?? null
}

export async function listPromptsOfText(db: Handle, textId: string) {
  return db.select().from(prompts).where(eq(prompts.textId, textId))
}

/** Whether something is asked of a kit, or is about to be. */
export async function hasOpenPrompt(db: Handle, kitId: string, kind: PromptRow['kind']) {
  const [row] = await db
    .select({ id: prompts.id })
    .from(prompts)
    .where(
      and(
        eq(prompts.kitId, kitId),
        eq(prompts.kind, kind),
        inArray(prompts.state, ['planned', 'asked']),
      ),
    )
    .limit(1)
  return row !== undefined
}

/** Prompts of a kit that wait for an answer, oldest first. */
export async function listAskedPrompts(db: Handle, kitId: string) {
  return db
    .select()
    .from(prompts)
    .where(and(eq(prompts.kitId, kitId), eq(prompts.state, 'asked')))
    .orderBy(asc(prompts.dueOn), asc(prompts.id))
}

export async function updatePrompts(
  db: Handle,
  promptIds: string[],
  change: Partial<typeof prompts.$inferInsert>,
) {
  if (promptIds.length > 0)
    await db.update(prompts).set(change).where(inArray(prompts.id, promptIds))
}

export async function listPromptsToNudge(db: Handle, now: number, limit: number) {
  return db
    .select()
    .from(prompts)
    .where(and(eq(prompts.state, 'asked'), lte(prompts.nudgeAfter, now)))
    .orderBy(asc(prompts.nudgeAfter), asc(prompts.id))
    .limit(limit)
}

export async function findPromptForUpdate(db: Handle, promptId: string) {
  const [row] = await db.select().from(prompts).where(eq(prompts.id, promptId)).for('update')
  return row ?? null
}
