import { listDueVisits } from '@/db/queries/visit'
import type { Deps } from '@/lib/deps'
import { causeWords } from '@/lib/domain/end-causes'
import { languageNamesInEnglish } from '@/lib/domain/language'
import { allow, type Actor } from '@/lib/domain/role'
import type { DueVisit } from '@/lib/schemas/visit'
import { dayNames } from './day-names'

/** The visits that are due and this person's to do, or still anybody's. */
export async function listVisits(deps: Deps, actor: Actor): Promise<DueVisit[]> {
  allow(actor, 'see own visits')
  const rows = await listDueVisits(deps.store.db, actor.staffId)
  return rows.map(({ visitorId, dueOn, language, why, ...visit }) => ({
    ...visit,
    day: dayNames(dueOn).long,
    language: languageNamesInEnglish[language],
    // A visit that the desk booked by itself carries the cause it found, not a sentence.
    why: causeWords(why),
    given: visitorId !== null,
  }))
}
