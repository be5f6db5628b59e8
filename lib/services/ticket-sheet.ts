import type { Handle } from '@/db/client'
import { listTicketWorkers } from '@/db/queries/ticket-sheet'
import type { Deps } from '@/lib/deps'
import { addDays } from '@/lib/domain/day'
import { causesFor } from '@/lib/domain/end-causes'
import { fixedTextNames, isFixedMoment, wasToldToGo } from '@/lib/domain/fixed-texts'
import { languageNamesInEnglish, ownLanguage, type Language } from '@/lib/domain/language'
import { allow, type Actor } from '@/lib/domain/role'
import { waitedInWords } from '@/lib/domain/shift-words'
import { sinceInWords } from '@/lib/domain/harm-words'
import { receiptOf } from '@/lib/domain/slip-words'
import { momentWords } from '@/lib/domain/stamp'
import { eventWords, houseName, stageWords, troubleWords } from '@/lib/domain/ticket-words'
import { isOpen } from '@/lib/domain/ticket'
import { isUnderWay } from '@/lib/domain/ticket-answer'
import { isDanger, isWorse, type Trouble } from '@/lib/domain/trouble'
import type { Refusal } from '@/lib/schemas/endpoint'
import type { TicketSheetView } from '@/lib/schemas/ticket'
import { slipPage } from './list-slips'
import { ticketColumn } from './ticket-column'
import { ticketFacts, type TicketFacts } from './ticket-facts'
import { ticketHarm } from './ticket-harm'
import { carefulLines, ifThisFails, owedView, peopleLines } from './ticket-margin'
import { otherSteps, ticketNow } from './ticket-step'

/** A visit is booked for so many days ahead unless another day is chosen. */
const USUAL_VISIT_DAYS = 3

/** What an agent may say that words are about. */
const nameable: readonly Trouble[] = ['slow', 'no flow', 'unsafe', 'unwell', 'danger sign']

function holderOf(
  { ticket, nameOf, events }: TicketFacts,
  actor: Actor,
): TicketSheetView['holder'] {
  const me = actor.staffId
  if (ticket.takenBy === null) {
    const isWalking = ticket.automatic && !isUnderWay(ticket)
    return { kind: 'nobody', words: isWalking ? 'Walking by itself' : 'Nobody has it', me }
  }
  if (ticket.takenBy === actor.staffId) return { kind: 'you', words: 'You have it', me }
  const last = events.findLast(({ kind }) => kind === 'taken' || kind === 'handed on')
  const was = last?.kind === 'handed on' ? 'Handed on to' : 'Taken by'
  return { kind: 'another', words: `${was} ${nameOf(ticket.takenBy)}`, me }
}

function headOf(facts: TicketFacts, actor: Actor) {
  const { ticket, household, area, now, settings } = facts
  const held = { ...facts, timeZone: area.timeZone, toldToGo: wasToldToGo(facts.fixed) }
  const language = ownLanguage(actor.languages)
  const harm = ticketHarm(held, { now, need: settings.need, language })
  const until = ticket.endedAt ?? now
  return {
    id: ticket.id,
    version: ticket.version,
    title: harm.sentence.replace(/[.।]$/, ''),
    titleLanguage: language,
    waited: waitedInWords(Math.min(harm.sinceAt, until), until),
    since: `since ${sinceInWords(harm.sinceAt, { now, timeZone: area.timeZone })}`,
    trouble: troubleWords[ticket.trouble],
    isDanger: isDanger(ticket.trouble),
    isOpen: isOpen(ticket.stage),
    household: {
      id: household.id,
      house: houseName(household.name),
      area: area.name,
      language: household.language,
    },
    holder: holderOf(facts, actor),
  }
}

const capital = (words: string) => `${words[0]?.toUpperCase() ?? ''}${words.slice(1)}`

function fixedView({ fixed, area }: TicketFacts): TicketSheetView['fixed'] {
  return fixed.flatMap(({ moment, state, stateWhy, at }) => {
    if (!isFixedMoment(moment)) return []
    const when = momentWords(at, area.timeZone)
    const { receipt, receiptWords } = receiptOf(state, { why: stateWhy, going: when })
    return [
      { name: capital(fixedTextNames[moment]), receipt, receiptWords: `${receiptWords}, ${when}` },
    ]
  })
}

function historyView({ events, nameOf, area }: TicketFacts): TicketSheetView['history'] {
  return events.map(({ n, event, staffId, at }) => ({
    n,
    when: momentWords(at, area.timeZone),
    words: `${eventWords(event, nameOf)}${staffId === null ? '' : `, ${nameOf(staffId)}`}`,
  }))
}

async function colleaguesOf(db: Handle, actor: Actor): Promise<TicketSheetView['colleagues']> {
  const nameOf = (tag: string) => languageNamesInEnglish[tag as Language] ?? tag
  return (await listTicketWorkers(db))
    .filter(({ id }) => id !== actor.staffId)
    .map(({ id, name, languages }) => ({
      staffId: id,
      words: `${name} (${languages.map(nameOf).join(', ')})`,
    }))
}

function choicesOf({ ticket, fittings, today }: TicketFacts) {
  return {
    mayBe: nameable
      .filter((trouble) => isWorse(trouble, ticket.trouble))
      .map((trouble) => ({ trouble, words: troubleWords[trouble] })),
    stages: fittings.map(({ fitting, part }) => ({
      position: fitting.position,
      words: `${stageWords[fitting.position]} stage: ${part.name.toLowerCase()}`,
    })),
    causes: {
      flowing: causesFor('flowing'),
      retired: causesFor('retired'),
      withdrawn: causesFor('withdrawn'),
    },
    visitOn: { first: today, usual: addDays(today, USUAL_VISIT_DAYS) },
  }
}

/** One household's trouble with all that a person needs to decide what is next. */
export async function ticketSheet(
  deps: Deps,
  actor: Actor,
  { ticketId, step }: { ticketId: string; step?: string },
): Promise<TicketSheetView | Refusal> {
  allow(actor, 'work tickets')
  const { db } = deps.store
  const facts = await ticketFacts(db, ticketId, deps.clock.now())
  if (!facts) return { ok: false, reason: 'not found' }
  const now = await ticketNow(db, facts, step)
  const { household, area } = facts
  return {
    ...headOf(facts, actor),
    column: ticketColumn(facts),
    now,
    fixed: fixedView(facts),
    otherSteps: otherSteps(now),
    people: peopleLines(facts),
    careful: carefulLines(facts, actor),
    owed: await owedView(db, facts),
    ifThisFails: ifThisFails(facts, now),
    ...choicesOf(facts),
    colleagues: await colleaguesOf(db, actor),
    history: historyView(facts),
    slips: await slipPage(db, { householdId: household.id, timeZone: area.timeZone, before: null }),
  }
}
