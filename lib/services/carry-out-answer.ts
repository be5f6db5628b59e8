import type { Transaction } from '@/db/client'
import { updateHousehold, type KitFacts } from '@/db/queries/kit-facts'
import { findPhone, updatePhone } from '@/db/queries/phone'
import { listAskedPrompts, updatePrompts } from '@/db/queries/prompt'
import { updateText, type TextRow } from '@/db/queries/text'
import { findOpenTicket } from '@/db/queries/ticket-events'
import type { Deps } from '@/lib/deps'
import type { AnswerAct } from '@/lib/domain/answer'
import type { Moment } from '@/lib/domain/moments'
import type { TicketEvent } from '@/lib/domain/ticket-types'
import { applyTicketEvent, raiseTrouble } from './apply-ticket-event'
import { closePrompts, logWash, refitStage } from './care-for-kit'
import { changeConsent } from './change-consent'
import { queueText } from './queue-text'
import { recordFlow } from './record-flow'

export type AnswerRun = {
  text: TextRow
  phoneId: string
  facts: KitFacts
  acts: readonly AnswerAct[]
}

async function reply(
  tx: Transaction,
  deps: Deps,
  { run, moment }: { run: AnswerRun; moment: Moment },
) {
  const phone = await findPhone(tx, run.phoneId)
  if (!phone) return
  await queueText(tx, deps, {
    purpose: `reply:${run.text.id}:${moment}`,
    moment,
    phone,
    household: run.facts.household,
    kitId: run.facts.kit.id,
    values: { dueOn: run.facts.kit.nextWashOn },
    sendAfter: deps.clock.now(),
    anyHour: true,
  })
}

async function raise(
  tx: Transaction,
  deps: Deps,
  { run, ...raised }: { run: AnswerRun } & Omit<Parameters<typeof raiseTrouble>[2], 'facts'>,
) {
  const applied = await raiseTrouble(tx, deps, { facts: run.facts, ...raised })
  if (applied.ok) await updateText(tx, run.text.id, { ticketId: applied.ticketId })
}

/** Keeps a figure that no step asked for; slow water opens a ticket, which then has its figure already. */
async function logFlow(
  tx: Transaction,
  deps: Deps,
  { run, act }: { run: AnswerRun; act: Extract<AnswerAct, { kind: 'log flow' }> },
) {
  const { facts, text } = run
  const flow = { facts, minutes: act.minutes, known: 'said' as const, textId: text.id }
  const { recovery, need } = await recordFlow(tx, deps, flow)
  if (recovery.kind === 'too-fast') return raise(tx, deps, { run, trouble: 'unsafe' })
  const isSlow = recovery.kind !== 'restored' || need.kind !== 'enough'
  if (!isSlow && !act.saysSlow) return reply(tx, deps, { run, moment: 'thanks' })
  return raise(tx, deps, { run, trouble: 'slow', figure: { recovery, need: need.kind } })
}

async function answerStep(
  tx: Transaction,
  deps: Deps,
  { run, act }: { run: AnswerRun; act: Extract<AnswerAct, { kind: 'answer step' }> },
) {
  const ticket = await findOpenTicket(tx, run.facts.kit.id)
  if (!ticket) return
  const event: TicketEvent = { kind: 'answered', stepId: act.stepId, answer: act.answer }
  if (act.minutes === undefined) {
    await applyTicketEvent(tx, deps, { ticketId: ticket.id, event })
    return
  }
  const verdict = await recordFlow(tx, deps, {
    facts: run.facts,
    minutes: act.minutes,
    known: 'said',
    textId: run.text.id,
    ticketId: ticket.id,
  })
  await applyTicketEvent(tx, deps, {
    ticketId: ticket.id,
    minutes: act.minutes,
    event: { ...event, recovery: verdict.recovery, minutes: act.minutes, need: verdict.need.kind },
  })
}

/** Stages that the household says it changed: those the open prompts asked for. */
async function logChange(tx: Transaction, deps: Deps, run: AnswerRun) {
  const asked = (await listAskedPrompts(tx, run.facts.kit.id)).filter(
    ({ kind }) => kind === 'change',
  )
  const answeredAt = deps.clock.now()
  await updatePrompts(
    tx,
    asked.map(({ id }) => id),
    { state: 'answered', nudgeAfter: null, answeredAt },
  )
  const positions = new Set(asked.flatMap((prompt) => prompt.positions))
  for (const position of positions) {
    if (position !== 1 && position !== 2 && position !== 3) continue
    await refitStage(tx, deps, { facts: run.facts, position, removedFor: 'due' })
  }
}

async function carryOut(
  tx: Transaction,
  deps: Deps,
  { run, act }: { run: AnswerRun; act: AnswerAct },
): Promise<unknown> {
  switch (act.kind) {
    case 'withdraw consent':
      return changeConsent(tx, deps, { text: run.text, consent: 'withdrawn' })
    case 'give consent':
      return changeConsent(tx, deps, { text: run.text, consent: 'given' })
    case 'suspend phone':
      return updatePhone(tx, run.phoneId, { state: 'suspended', stateWhy: act.why })
    case 'mark moved':
      return updateHousehold(tx, run.facts.household.id, { movedAt: deps.clock.now() })
    case 'close prompts':
      return closePrompts(tx, deps, { facts: run.facts, state: 'answered' })
    case 'log wash':
      return logWash(tx, deps, { facts: run.facts, known: 'said' })
    case 'log change':
      return logChange(tx, deps, run)
    case 'log flow':
      return logFlow(tx, deps, { run, act })
    case 'answer step':
      return answerStep(tx, deps, { run, act })
    case 'raise trouble':
      return raise(tx, deps, { run, trouble: act.trouble })
    case 'send':
      return reply(tx, deps, { run, moment: act.moment })
  }
}

/** Carries out what a reply means, in the transaction that marks it read. */
export async function carryOutAnswer(tx: Transaction, deps: Deps, run: AnswerRun): Promise<void> {
  for (const act of run.acts) await carryOut(tx, deps, { run, act })
}
