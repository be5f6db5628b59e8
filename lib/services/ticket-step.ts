import type { Handle } from '@/db/client'
import { receiptOf } from '@/lib/domain/slip-words'
import { clockWords, dayWords, momentWords } from '@/lib/domain/stamp'
import { endInWords, stageWords, troubleWords } from '@/lib/domain/ticket-words'
import { isOpen } from '@/lib/domain/ticket'
import { isDanger } from '@/lib/domain/trouble'
import { nextStep, startWalk, stepOf, steps, type Step, type Walk } from '@/lib/domain/walk'
import type { Next } from '@/lib/domain/walk-rules'
import type { Preview, StepView, TicketNow, TicketSheetView } from '@/lib/schemas/ticket'
import type { TicketFacts } from './ticket-facts'
import { stepText } from './word-text'

/** The walk as it stands; one that nobody has begun starts from its trouble. */
export function walkOf({ state, ticket }: Pick<TicketFacts, 'state' | 'ticket'>): Walk {
  return state.walk ?? startWalk({ trouble: ticket.trouble })
}

const kindWords = { cure: 'a cure', question: 'a question', safety: 'a safety question' } as const

/** `a cure, about 4 minutes of their time`. */
function stepLead({ kind, minutes }: Step): string {
  return `${kindWords[kind]}, about ${minutes} minutes of their time`
}

async function previewOf(db: Handle, facts: TicketFacts, step: Step): Promise<Preview> {
  const { household } = facts
  const { worded, staffText } = await stepText(db, { moment: step.moment, household })
  if (!worded.ok) return worded
  return { ok: true, text: worded.text, language: worded.wording.language, staffText }
}

/** When the awaited step went, and how far it has come. */
function awaitedWords({ lastStep, area, ticket }: TicketFacts, step: Step): string | null {
  if (ticket.waitingFor !== step.id) return null
  if (lastStep?.stepId !== step.id) return 'asked; the answer is awaited'
  const at = lastStep.sentAt ?? lastStep.createdAt
  const going = momentWords(lastStep.sendAfter ?? at, area.timeZone)
  const { receiptWords } = receiptOf(lastStep.state, { why: lastStep.stateWhy, going })
  return `sent ${clockWords(at, area.timeZone)}, ${receiptWords}; the answer is awaited`
}

async function stepView(
  db: Handle,
  facts: TicketFacts,
  { step, why }: { step: Step; why: string },
): Promise<StepView> {
  return {
    id: step.id,
    name: step.name,
    lead: `Step ${walkOf(facts).tried.length + 1} · ${stepLead(step)}`,
    why,
    preview: await previewOf(db, facts, step),
    answers: step.answers.map(({ answer, label }) => ({
      answer,
      label,
      withMinutes: label.endsWith('…'),
    })),
    awaited: awaitedWords(facts, step),
  }
}

function endTitle(next: Extract<Next, { kind: 'end' }>): string {
  switch (next.end) {
    case 'restored':
      return 'It flows again'
    case 'part':
      return `Change the ${stageWords[next.stage ?? 3]} stage`
    case 'visit':
      return 'Send a pair of hands'
    case 'stop using':
      return 'Stop using it'
  }
}

/** What a part or a visit that is on the way means for who opens the sheet. */
function underWay(facts: TicketFacts, next: Next): TicketNow | null {
  const { ticket, state, promise, visit } = facts
  if (ticket.stage === 'part owed') {
    const stage = stageWords[promise?.position ?? state.promisedStage ?? 3]
    const title = promise
      ? `A part for the ${stage} stage is promised`
      : `A part for the ${stage} stage is owed, and no depot has promised one`
    return { kind: 'end', title, why: next.kind === 'end' ? next.why : 'It is to be handed over.' }
  }
  if (ticket.stage === 'visit due') {
    const title = visit ? `A visit is due ${dayWords(visit.dueOn)}` : 'A visit is to be booked'
    return { kind: 'end', title, why: next.kind === 'end' ? next.why : 'Somebody is to look.' }
  }
  return null
}

function plainNow(facts: TicketFacts, next: Next): TicketNow | null {
  const { ticket, state } = facts
  if (!isOpen(ticket.stage)) {
    const why = ticket.endedAt === null ? '' : momentWords(ticket.endedAt, facts.area.timeZone)
    return { kind: 'ended', title: endInWords(state), why }
  }
  const onTheWay = underWay(facts, next)
  if (onTheWay) return onTheWay
  if (isDanger(ticket.trouble)) return { kind: 'danger' }
  if (ticket.trouble === 'unread') return { kind: 'words', words: facts.words }
  return ticket.trouble === 'silent' ? { kind: 'silent' } : null
}

/**
 * What there is to do now. `chosen` is a step that the agent picked in place of the proposed one.
 */
export async function ticketNow(
  db: Handle,
  facts: TicketFacts,
  chosen: string | undefined,
): Promise<TicketNow> {
  const next = nextStep(walkOf(facts))
  const picked = chosen !== undefined && isOpen(facts.ticket.stage) ? stepOf(chosen) : undefined
  if (picked) {
    const step = await stepView(db, facts, { step: picked, why: 'You chose this step.' })
    return { kind: 'step', step }
  }
  const plain = plainNow(facts, next)
  if (plain) return plain
  const awaited = facts.ticket.waitingFor === null ? undefined : stepOf(facts.ticket.waitingFor)
  if (next.kind === 'end' && !awaited) return { kind: 'end', title: endTitle(next), why: next.why }
  const proposed = next.kind === 'step' ? next : null
  const step = awaited ?? proposed?.step
  if (!step) return { kind: 'end', title: troubleWords[facts.ticket.trouble], why: next.why }
  const why =
    proposed?.step.id === step.id ? proposed.why : 'It was sent before; the walk waits for it.'
  return { kind: 'step', step: await stepView(db, facts, { step, why }) }
}

/** The steps that an agent may send instead. */
export function otherSteps(now: TicketNow): TicketSheetView['otherSteps'] {
  const shown = now.kind === 'step' ? now.step.id : null
  return steps
    .filter(({ id }) => id !== shown)
    .map((step) => ({ id: step.id, name: step.name, lead: stepLead(step) }))
}
