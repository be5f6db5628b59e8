import type { OpenTicket } from '@/db/queries/shift'
import { fixedTextWords, isFixedMoment, wasToldToGo } from '@/lib/domain/fixed-texts'
import { sinceInWords } from '@/lib/domain/harm-words'
import type { Language } from '@/lib/domain/language'
import { dailyNeed } from '@/lib/domain/need'
import { localDay } from '@/lib/domain/round'
import { waitedInWords } from '@/lib/domain/shift-words'
import { clockWords, dayWords } from '@/lib/domain/stamp'
import { houseName } from '@/lib/domain/ticket-words'
import { isUnderWay } from '@/lib/domain/ticket-answer'
import { stepOf } from '@/lib/domain/walk-catalogue'
import type { ShiftRow } from '@/lib/schemas/shift'
import { kitLook } from './kit-look'
import type { ShiftFacts } from './shift-facts'
import { isOfNow, ticketHarm, type TicketHarm } from './ticket-harm'

export type Judged = OpenTicket & {
  harm: TicketHarm
  facts: ShiftFacts
  now: number
  language: Language
}

function readingOf({ ticket, kit }: OpenTicket, facts: ShiftFacts) {
  const reading = facts.readings.get(kit.id)
  const fibre = facts.fittings.get(kit.id)?.find(({ position }) => position === 3)
  const known = { openedAt: ticket.openedAt, fibreFittingId: fibre?.id }
  return reading && isOfNow(reading, known) ? reading : null
}

/** An open ticket with its place in the shift. */
export function judge(
  open: OpenTicket,
  { facts, now, language }: { facts: ShiftFacts; now: number; language: Language },
): Judged {
  const held = {
    ...open,
    timeZone: open.area.timeZone,
    reading: readingOf(open, facts),
    toldToGo: wasToldToGo(facts.fixed.get(open.ticket.id) ?? []),
  }
  const { need } = facts.settings
  return { ...open, harm: ticketHarm(held, { now, need, language }), facts, now, language }
}

/** What was sent at once, where the walk stands, how often it was washed. */
function aboutWords({ ticket, area, facts }: Judged): string | null {
  const latest = new Map((facts.fixed.get(ticket.id) ?? []).map((text) => [text.moment, text]))
  const fixed = [...latest.values()].flatMap(({ moment, state, at }) =>
    isFixedMoment(moment) ? [fixedTextWords(moment, state, clockWords(at, area.timeZone))] : [],
  )
  const walk = facts.walks.get(ticket.id)
  const step = ticket.waitingFor === null ? undefined : stepOf(ticket.waitingFor)
  const at = step && `step ${(walk?.tried ?? 0) + 1} of the walk: ${step.name.toLowerCase()}`
  const washes = walk?.washes ?? 0
  const isWalking = ticket.automatic && !isUnderWay(ticket)
  const washed =
    washes > 0 && `washed ${washes === 1 ? 'once' : washes === 2 ? 'twice' : `${washes} times`}`
  const all = [...fixed, washed, isWalking && 'walking by itself', at].filter(Boolean)
  return all.length > 0 ? all.join(', ') : null
}

function owedMark({ ticket, kit, facts }: Judged): ShiftRow['marks'][number] | null {
  if (ticket.stage !== 'part owed') return null
  const promise = facts.promises.get(kit.id)
  if (!promise) return { before: '', strong: 'part owed', after: ', no depot has it' }
  const here = facts.inHand.find(
    ({ depotId, partId }) => depotId === promise.depotId && partId === promise.partId,
  )
  const depot = facts.depots.get(promise.depotId)?.name ?? 'the depot'
  return { before: '', strong: 'part owed', after: `, ${here?.inHand ?? 0} in ${depot}` }
}

function marksOf(judged: Judged, staffId: string): ShiftRow['marks'] {
  const { ticket, household, holder, facts } = judged
  const visit = facts.visits.get(household.id)
  const isMine = ticket.takenBy === staffId
  const was = facts.holders.get(ticket.id)?.kind === 'handed on' ? 'handed on to ' : 'taken by '
  return [
    owedMark(judged),
    visit ? { before: '', strong: 'visit due', after: ` ${dayWords(visit.dueOn)}` } : null,
    holder === null ? null : { before: was, strong: isMine ? 'you' : holder, after: '' },
  ].filter((mark) => mark !== null)
}

const failedStates: readonly string[] = ['failed', 'not confirmed']

function beadOf({ ticket, household, harm, facts }: Judged) {
  const isHarm = harm.harmClass <= 6
  const tone = isHarm ? ('clay' as const) : ('water' as const)
  const hasFailed = failedStates.includes(facts.lastOut.get(household.id)?.state ?? '')
  if (hasFailed) return { bead: 'broken' as const, beadWords: 'the last text failed', tone }
  if (isHarm) return { bead: 'full' as const, beadWords: 'nothing safe', tone }
  return ticket.trouble === 'slow'
    ? { bead: 'half' as const, beadWords: 'slow', tone }
    : { bead: 'ring' as const, beadWords: 'to be found out', tone }
}

/** The flow that the vessel shows: what was timed since this began, and none where nothing comes. */
function flowNow({ ticket, kit, facts, ...open }: Judged): number | null {
  if (ticket.trouble === 'no flow' || kit.state === 'out of service') return 0
  const last = facts.readings.get(kit.id)?.litresPerHour ?? null
  const now = readingOf({ ticket, kit, ...open }, facts)?.litresPerHour ?? null
  return ticket.trouble === 'slow' ? now : last
}

function columnOf(judged: Judged): ShiftRow['column'] {
  const { kit, household, area, facts, now } = judged
  return kitLook(
    {
      state: kit.state,
      fittings: facts.fittings.get(kit.id) ?? [],
      litresPerHour: flowNow(judged),
      litresPerDay: dailyNeed({ people: household.people, ...facts.settings.need }),
    },
    { today: localDay(now, area.timeZone), settings: facts.settings },
  )
}

/** A ticket as its row in the shift. */
export function rowOf(judged: Judged, staffId: string): ShiftRow {
  const { ticket, household, area, harm, facts, now, language } = judged
  return {
    ticketId: ticket.id,
    house: houseName(household.name),
    area: area.name,
    language: household.language,
    sentence: harm.sentence,
    sentenceLanguage: language,
    words: facts.lastIn.get(household.id)?.body ?? null,
    about: aboutWords(judged),
    waited: waitedInWords(harm.sinceAt, now),
    since: `since ${sinceInWords(harm.sinceAt, { now, timeZone: area.timeZone })}`,
    ...beadOf(judged),
    waits: ticket.takenBy === null && (!ticket.automatic || isUnderWay(ticket)),
    marks: marksOf(judged, staffId),
    column: columnOf(judged),
  }
}
