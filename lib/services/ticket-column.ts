import { monthOf } from '@/lib/domain/day'
import { recovery, type Recovery } from '@/lib/domain/flow'
import { columnWords, stageLooks, vesselLevel } from '@/lib/domain/kit-column'
import { dailyNeed, enough } from '@/lib/domain/need'
import { oddsInWords, originWords } from '@/lib/domain/odds-words'
import { localDay } from '@/lib/domain/round'
import { distanceWords } from '@/lib/domain/stamp'
import { stageWords } from '@/lib/domain/ticket-words'
import { bottleWords, verdictWords } from '@/lib/domain/verdict-words'
import {
  likelihoodWord,
  suspectIds,
  suspectNames,
  suspectStage,
  type SuspectId,
  type Walk,
} from '@/lib/domain/walk'
import type { TicketColumn } from '@/lib/schemas/ticket'
import type { TicketFacts } from './ticket-facts'
import { walkOf } from './ticket-step'

type Label = TicketColumn['labels'][number]
type Odds = Walk['odds'] | null

/** A suspect with less than this is not worth a line. */
const SHOWN = 0.02

function likeliest(odds: Walk['odds'], among: readonly SuspectId[]): SuspectId | undefined {
  return [...among].sort((a, b) => odds[b] - odds[a])[0]
}

function suspected(odds: Odds, among: readonly SuspectId[]) {
  const id = odds ? likeliest(odds, among) : undefined
  if (!odds || !id || odds[id] < SHOWN) return null
  return { title: suspectNames[id], word: likelihoodWord(odds[id]), odds: oddsInWords(odds[id]) }
}

const inStage = (position: 0 | 1 | 2 | 3) =>
  suspectIds.filter((id) => suspectStage[id] === position)

function stageLabels(facts: TicketFacts, odds: Odds): Label[] {
  return facts.fittings.map(({ fitting, stage }) => {
    const { position } = fitting
    const due = `change due ${distanceWords(fitting.dueOn, facts.today)}`
    const isFibre = stage.kind === 'fibre'
    const washed = isFibre ? [`washed ${distanceWords(facts.kit.lastWashOn, facts.today)}`] : []
    const name = stageWords[position]
    const title = `${name[0]?.toUpperCase() ?? ''}${name.slice(1)} stage`
    return { at: position, title, ...suspected(odds, inStage(position)), notes: [due, ...washed] }
  })
}

/** How a reading was judged on its day; one that the walk has not heard of is judged by the settings of now. */
function recoveryOf(
  { state, model, settings }: TicketFacts,
  reading: NonNullable<TicketFacts['reading']>,
): Recovery {
  const { normalised, first } = reading
  const nominal = model.nominalLitresPerHour
  const now = recovery({ flow: normalised, first, nominal, settings: settings.flow })
  const heard = state.walk?.readings.at(-1)
  return heard && Math.abs(heard.share - now.share) < 1e-9 ? heard : now
}

/** The last litre in words: what it comes to beside the vessel, how it is judged below the drawing. */
function flowWords(facts: TicketFacts, litresPerDay: number): { label: Label; verdict: string } {
  const { reading, model, area } = facts
  if (!reading) {
    const label = { at: 'vessel' as const, title: 'Nobody has timed a litre', notes: [] }
    return { label, verdict: '' }
  }
  const nominal = model.nominalLitresPerHour
  const [flow, ...verdict] = verdictWords({
    ...reading,
    month: monthOf(localDay(reading.at, area.timeZone)),
    reference: reading.first ?? nominal,
    recovery: recoveryOf(facts, reading),
    need: enough({ litresPerHour: reading.litresPerHour, litresPerDay, ...facts.settings.need }),
  })
  const label = { at: 'vessel' as const, title: bottleWords(reading), notes: flow ? [flow] : [] }
  return { label, verdict: verdict.join(' ') }
}

/** Suspects that sit in no stage, and what the water's temperature says. */
function alsoWords(walk: Walk | null, celsius: number | null): string | null {
  if (!walk) return null
  const loose = inStage(0).filter((id) => id !== 'cold-water' && id !== 'low-container')
  const shown = loose.filter((id) => walk.odds[id] >= SHOWN)
  const named = shown.map((id) => `${suspectNames[id].toLowerCase()} ${oddsInWords(walk.odds[id])}`)
  const also = named.length > 0 ? `Also: ${named.join(', ')}.` : ''
  const cold =
    celsius === null
      ? ''
      : celsius >= 18
        ? `Cold is ruled out: ${celsius} °C.`
        : `Water at ${celsius} °C runs slower by itself; the figure allows for it.`
  return [also, cold].filter(Boolean).join(' ') || null
}

/** The kit drawn large: its suspects lit, with their odds, and what the last litre comes to. */
export function ticketColumn(facts: TicketFacts): TicketColumn {
  const { ticket, state, kit, household, settings, reading } = facts
  const isWalked = ticket.trouble === 'slow' || ticket.trouble === 'no flow'
  const walk = state.walk ?? (isWalked ? walkOf(facts) : null)
  const odds = walk?.odds ?? null
  const { need, sending } = settings
  const litresPerDay = dailyNeed({ people: household.people, ...need })
  const isOut = kit.state === 'out of service'
  const stages = stageLooks(
    facts.fittings.map(({ fitting }) => fitting),
    {
      today: facts.today,
      outPosition: isOut ? (state.promisedStage ?? 3) : null,
      dueDays: sending.bundleDays,
    },
  )
  const level = vesselLevel(reading?.litresPerHour ?? null, litresPerDay, need.enoughHours)
  const flow = flowWords(facts, litresPerDay)
  const container = suspected(odds, ['low-container']) ?? { title: 'Container' }
  return {
    stages,
    level,
    description: columnWords(stages, level),
    suspects: stages.flatMap(({ position }) => {
      const found = suspected(odds, inStage(position))
      return found ? [{ position, word: found.word }] : []
    }),
    labels: [{ at: 'container', ...container, notes: [] }, ...stageLabels(facts, odds), flow.label],
    verdict: flow.verdict || null,
    oddsFrom: walk && originWords(walk.origin ?? null),
    also: alsoWords(walk, reading?.celsius ?? walk?.celsius ?? null),
  }
}
