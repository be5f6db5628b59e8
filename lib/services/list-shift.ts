import { countSince } from '@/db/queries/shift'
import { listTimeZones } from '@/db/queries/time-zone'
import type { Deps } from '@/lib/deps'
import { compareHarm, type Band } from '@/lib/domain/harm'
import { sinceInWords } from '@/lib/domain/harm-words'
import { languageNamesInEnglish, ownLanguage, type Language } from '@/lib/domain/language'
import { allow, type Actor } from '@/lib/domain/role'
import { bandNote, dayStart, eitherOf, shiftTitle } from '@/lib/domain/shift-words'
import { houseName } from '@/lib/domain/ticket-words'
import type { Shift, ShiftBand } from '@/lib/schemas/shift'
import { shiftFacts } from './shift-facts'
import { judge, rowOf, type Judged } from './shift-row'

const bandNames: readonly Band[] = ['Unwell', 'No safe water', 'Slow', 'Unread words', 'Silent']

/** Open tickets in order of harm, with what the rows are made of. */
export async function judgedShift(
  deps: Deps,
  actor: Actor,
): Promise<{ judged: Judged[]; cut: boolean }> {
  const language = ownLanguage(actor.languages)
  const now = deps.clock.now()
  const facts = await shiftFacts(deps.store.db)
  const judged = facts.open
    .map((open) => judge(open, { facts, now, language }))
    .sort((a, b) => compareHarm(a.harm, b.harm) || a.ticket.openedAt - b.ticket.openedAt)
  return { judged, cut: facts.cut }
}

export function isServedBy({ household }: Pick<Judged, 'household'>, actor: Actor): boolean {
  return actor.languages.includes(household.language)
}

const nameOf = (language: string) => languageNamesInEnglish[language as Language] ?? language

/** Which is the next for this person, or what there is instead. */
export function nextFor(judged: readonly Judged[], actor: Actor): Shift['next'] {
  const waiting = judged.filter(({ ticket }) => ticket.takenBy === null)
  const mine = eitherOf(actor.languages.map(nameOf))
  const next = waiting.find((one) => isServedBy(one, actor))
  if (next) {
    const words = `The worst you can serve in ${mine}: the ${houseName(next.household.name)}.`
    return { ticketId: next.ticket.id, words }
  }
  if (waiting.length === 0) return { ticketId: null, words: 'Nobody waits.' }
  const others = [...new Set(waiting.map(({ household }) => nameOf(household.language)))]
  const words = `None that you can serve in ${mine}. ${waiting.length} in ${eitherOf(others)}.`
  return { ticketId: null, words }
}

function bandOf(name: Band, judged: readonly Judged[], staffId: string): ShiftBand[] {
  const here = judged.filter(({ harm }) => harm.band === name)
  if (here.length === 0) return []
  const houses = new Map(here.map((one) => [one.household.id, one]))
  const people = [...houses.values()].reduce((sum, { household }) => sum + household.people, 0)
  const enough = name === 'Slow' ? here.filter(({ harm }) => harm.need === 'enough').length : 0
  const note = bandNote({ houses: houses.size, people, enough })
  return [{ name, note, rows: here.map((one) => rowOf(one, staffId)) }]
}

/** The staff inbox: open tickets in bands by the harm they do, and what came of today. */
export async function listShift(deps: Deps, actor: Actor): Promise<Shift> {
  allow(actor, 'see the shift')
  const { db } = deps.store
  const now = deps.clock.now()
  const timeZone = (await listTimeZones(db))[0] ?? 'UTC'
  const { judged, cut } = await judgedShift(deps, actor)
  const waiting = judged.filter(({ ticket }) => ticket.takenBy === null)
  const [longest] = [...waiting].sort((a, b) => a.harm.sinceAt - b.harm.sinceAt)
  return {
    title: shiftTitle(now, timeZone),
    bands: bandNames.flatMap((name) => bandOf(name, judged, actor.staffId)),
    waiting: waiting.length,
    taken: judged.length - waiting.length,
    longest: longest
      ? sinceInWords(longest.harm.sinceAt, { now, timeZone: longest.area.timeZone })
      : null,
    today: await countSince(db, dayStart(now, timeZone)),
    next: nextFor(judged, actor),
    cut,
  }
}
