import type { Handle } from '@/db/client'
import { listAvailable } from '@/db/queries/promise'
import { houseInWords } from '@/lib/domain/harm-words'
import { languageNamesInEnglish, type Language } from '@/lib/domain/language'
import { dailyNeed } from '@/lib/domain/need'
import type { Actor } from '@/lib/domain/role'
import { localDay } from '@/lib/domain/round'
import { silenceWords } from '@/lib/domain/silence-words'
import { dayWords, distanceWords } from '@/lib/domain/stamp'
import { stageWords } from '@/lib/domain/ticket-words'
import { answerStep, nextStep, stepOf } from '@/lib/domain/walk'
import { lastRecovery } from '@/lib/domain/walk-trials'
import type { TicketNow, TicketSheetView } from '@/lib/schemas/ticket'
import type { TicketFacts } from './ticket-facts'
import { walkOf } from './ticket-step'

/** Who is in the house and what they need. */
export function peopleLines({ household, settings }: TicketFacts): string[] {
  const { people, place, sourceClass } = household
  const need = Math.round(dailyNeed({ people, ...settings.need }))
  return [
    `${houseInWords(household)}.`,
    `Needs ${need} L a day.`,
    `Fills it with ${sourceClass} water.`,
    ...(place ? [place] : []),
  ]
}

const nameOf = (language: string) => languageNamesInEnglish[language as Language] ?? language

function phoneLines({ phones, sharers }: TicketFacts): string[] {
  const first = phones[0]
  if (!first) return ['There is no phone: no text can reach them.']
  const silent = silenceWords(first.phone)
  const others = sharers.filter(({ phoneId }) => phoneId === first.phone.id)
  return [
    ...(silent ? [`Nothing can be texted: ${silent}.`] : []),
    ...(others.length > 0
      ? [`Shared phone: the ${others.map(({ name }) => name).join(', ')} household may read it.`]
      : []),
    ...(first.link.answeredBy ? [`${first.link.answeredBy} answers the phone.`] : []),
  ]
}

/** What to mind before writing. */
export function carefulLines(facts: TicketFacts, actor: Actor): string[] {
  const { household, kit, area } = facts
  const isSpoken = actor.languages.includes(household.language)
  const outSince = kit.outOfServiceSince
  const day = (at: number) => dayWords(localDay(at, area.timeZone))
  return [
    ...(outSince === null ? [] : [`The filter is out of service since ${day(outSince)}.`]),
    ...phoneLines(facts),
    ...(household.movedAt === null
      ? []
      : [`They said on ${day(household.movedAt)} that they moved.`]),
    ...(isSpoken
      ? []
      : [
          `They read ${nameOf(household.language)}; you have ${actor.languages.map(nameOf).join(', ') || 'none noted'}.`,
        ]),
  ]
}

async function depotLine(db: Handle, { fittings, area }: TicketFacts): Promise<string> {
  const counts: string[] = []
  let depot = 'The depot'
  for (const { part } of fittings) {
    const [own] = await listAvailable(db, part.id, area.depotId)
    if (!own) continue
    depot = own.name
    counts.push(`${part.name.toLowerCase()} ${own.available}`)
  }
  return `${depot} can still promise: ${counts.join(', ')}.`
}

/** What the household is owed, and what the depot has. */
export async function owedView(db: Handle, facts: TicketFacts): Promise<TicketSheetView['owed']> {
  const { promise, visit, area, today } = facts
  return {
    promise: promise
      ? `A part for the ${stageWords[promise.position]} stage from ${promise.depotName}, promised ${dayWords(localDay(promise.promisedAt, area.timeZone))}.`
      : null,
    visit: visit
      ? `Visit ${dayWords(visit.dueOn)}, ${distanceWords(visit.dueOn, today)}${visit.visitor ? `, by ${visit.visitor}` : ''}.`
      : null,
    depot: await depotLine(db, facts),
  }
}

/** What the walk would do if the step now brought nothing. */
export function ifThisFails(facts: TicketFacts, now: TicketNow): string | null {
  const step = now.kind === 'step' ? stepOf(now.step.id) : undefined
  if (!step) return null
  const walk = walkOf(facts)
  const figure = lastRecovery(walk.tried)
  const failed = step.kind === 'cure' ? ('not cured' as const) : ('not done' as const)
  const after = answerStep(walk, {
    stepId: step.id,
    answer: failed,
    // A wash that fails is known by its figure: as slow as now.
    ...(step.kind === 'cure' && figure ? { recovery: figure } : {}),
    at: facts.now,
  })
  const next = nextStep(after)
  if (next.kind === 'step') {
    return next.step.id === step.id ? `${step.name} once more.` : `${next.step.name}.`
  }
  if (next.end === 'part') return `The ${stageWords[next.stage ?? 3]} stage is changed: ${next.why}`
  return next.end === 'visit' ? `A visit. ${next.why}` : next.why
}
