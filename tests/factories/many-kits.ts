import { sql } from 'drizzle-orm'
import type { Deps } from '@/lib/deps'
import type { World } from './world'

type Many = {
  /** Kits in all; the first `due` of them have one thing due, by turns a wash, a check, a change, a welcome. */
  kits: number
  due: number
  today: string
}

/**
 * A programme of many kits with a past: each has been welcomed and has answered its washes, and what comes
 * next lies ten days ahead or more, but for the first `due`. Made in SQL: entering them one by one through
 * the service would take minutes. For measuring what planning costs and how the database goes about it.
 */
export async function manyKits(
  deps: Deps,
  { areaId, modelId }: World,
  { kits, due, today }: Many,
): Promise<void> {
  const all = sql`generate_series(1, ${kits}::int) as i`
  const isDue = (turn: number) => sql`(i <= ${due}::int and i % 4 = ${turn}::int)`
  const day = sql`${today}::date`
  const now = sql`${new Date(deps.clock.now()).toISOString()}::timestamptz`
  const ahead = (from: number, spread: number) =>
    sql`(${day} + ${from}::int + (i * 7919) % ${spread}::int)`
  const statements = [
    sql`insert into households (id, name, area_id, language, people, source_class, created_at)
      select 'house-' || i, 'House ' || i, ${areaId}, 'es', 5, 'cloudy', ${now} from ${all}`,
    sql`insert into phones (id, e164, consent, created_at)
      select 'phone-' || i, '+999' || lpad(i::text, 9, '0'), 'given', ${now} from ${all}`,
    sql`insert into household_phones (household_id, phone_id)
      select 'house-' || i, 'phone-' || i from ${all}`,
    sql`insert into kits (id, household_id, model_id, handed_over_on, last_wash_on, wash_counted_from,
        calendar_wash_on, next_wash_on, next_flow_check_on, welcome_due_on, created_at)
      select 'kit-' || i, 'house-' || i, ${modelId}, ${day} - 90, ${day} - 14, ${day} - 14,
        case when ${isDue(0)} then ${day} else ${ahead(10, 30)} end,
        case when ${isDue(0)} then ${day} else ${ahead(10, 30)} end,
        case when ${isDue(1)} then ${day} else ${ahead(10, 50)} end,
        case when ${isDue(3)} then ${day} - 90 end, ${now} from ${all}`,
    sql`insert into fittings (id, kit_id, position, part_id, fitted_on, due_on, created_at)
      select 'fitting-' || i || '-' || s.position, 'kit-' || i, s.position, s.part_id, ${day} - 30,
        case when ${isDue(2)} and s.position = 1 then ${day} else ${ahead(10, 60)} end, ${now}
      from ${all} cross join kit_model_stages s where s.model_id = ${modelId}`,
    sql`insert into texts (id, direction, purpose, phone_id, household_id, kit_id, e164, language, body,
        state, send_after, sent_at, created_at)
      select 'text-' || i || '-' || w, 'out', 'prompt:kit-' || i || ':past:' || w, 'phone-' || i,
        'house-' || i, 'kit-' || i, '+999' || lpad(i::text, 9, '0'), 'es', 'a past text', 'delivered',
        ${now} - w * interval '14 days', ${now} - w * interval '14 days', ${now} - w * interval '14 days'
      from ${all} cross join generate_series(1, 5) as w`,
    sql`insert into prompts (id, kit_id, kind, due_on, state, text_id, created_at)
      select 'prompt-' || i || '-' || w, 'kit-' || i, case when w = 5 then 'welcome' else 'wash' end,
        case when w = 5 then ${day} - 90 else ${day} - w * 14 end, 'answered',
        'text-' || i || '-' || w, ${now} - w * interval '14 days'
      from ${all} cross join generate_series(1, 5) as w where not (w = 5 and ${isDue(3)})`,
  ]
  for (const statement of statements) await deps.store.db.execute(statement)
  // As the desk does every hour: without statistics the database guesses.
  await deps.store.keepHouse()
}
