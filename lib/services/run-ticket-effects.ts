import type { Transaction } from '@/db/client'
import { listOpenFittings, updateKit, type KitFacts } from '@/db/queries/kit-facts'
import { findFirstPhone } from '@/db/queries/phone'
import { findOpenPromise, withdrawPromises } from '@/db/queries/promise'
import { insertVisit, withdrawVisits } from '@/db/queries/visit'
import { findDueVisit } from '@/db/queries/wording-values'
import type { Deps } from '@/lib/deps'
import { boilMinutes } from './boil-minutes'
import { addDays } from '@/lib/domain/day'
import type { Moment } from '@/lib/domain/moments'
import { localDay } from '@/lib/domain/round'
import type { TicketEffect, TicketEvent, TicketState } from '@/lib/domain/ticket-types'
import { stepOf } from '@/lib/domain/walk-catalogue'
import type { Values } from '@/lib/domain/wording'
import { logWash } from './care-for-kit'
import { promisePart } from './promise-part'
import { queueText } from './queue-text'
import { tellCoordinator } from './tell-coordinator'

export type EffectsRun = {
  facts: KitFacts
  ticketId: string
  /** Number of the event that had these effects: part of each text's purpose. */
  n: number
  state: TicketState
  effects: readonly TicketEffect[]
  minutes?: number
  staffId?: string
}

const VISIT_WITHIN_DAYS = 3

async function valuesFor(tx: Transaction, deps: Deps, run: EffectsRun): Promise<Values> {
  const { facts, state } = run
  const today = localDay(deps.clock.now(), facts.area.timeZone)
  const stage = state.promisedStage ?? 3
  const fitting = (await listOpenFittings(tx, facts.kit.id)).find(
    (row) => row.stage.position === stage,
  )
  const promise = await findOpenPromise(tx, facts.kit.id)
  const visit = await findDueVisit(tx, facts.household.id)
  return {
    stage,
    ...(fitting ? { part: fitting.part.name, dueOn: fitting.fitting.dueOn } : {}),
    ...(promise ? { depot: promise.depotName } : {}),
    litres: facts.model.bottleLitres,
    minutes: run.minutes ?? boilMinutes(facts.area.altitudeMetres),
    visitOn: visit?.dueOn ?? addDays(today, VISIT_WITHIN_DAYS),
    visitor: visit?.visitor ?? 'your visitor',
  }
}

async function sendMoment(
  tx: Transaction,
  deps: Deps,
  {
    run,
    moment,
    stepId,
    values,
  }: { run: EffectsRun; moment: Moment; stepId?: string; values?: Values },
): Promise<void> {
  const { facts } = run
  const phone = await findFirstPhone(tx, facts.household.id)
  if (!phone) return
  const known = await valuesFor(tx, deps, run)
  await queueText(tx, deps, {
    purpose: `ticket:${run.ticketId}:${run.n}:${moment}`,
    moment,
    phone,
    household: facts.household,
    kitId: facts.kit.id,
    ticketId: run.ticketId,
    values: { ...known, ...values },
    stepId,
    staffId: run.staffId,
    sendAfter: deps.clock.now(),
    anyHour: true,
  })
}

async function bookVisit(
  tx: Transaction,
  deps: Deps,
  run: EffectsRun,
): Promise<TicketEvent | null> {
  const now = deps.clock.now()
  const visit = await insertVisit(tx, {
    ticketId: run.ticketId,
    householdId: run.facts.household.id,
    why: run.state.cause ?? run.state.trouble,
    dueOn: addDays(localDay(now, run.facts.area.timeZone), VISIT_WITHIN_DAYS),
    createdAt: now,
  })
  return visit && { kind: 'visit booked', visitId: visit.id }
}

async function promise(
  tx: Transaction,
  deps: Deps,
  { run, position }: { run: EffectsRun; position: 1 | 2 | 3 },
): Promise<TicketEvent | null> {
  const { facts, ticketId } = run
  const promised = await promisePart(tx, deps, { facts, ticketId, position })
  return promised.ok ? promised.event : null
}

async function close(tx: Transaction, deps: Deps, run: EffectsRun): Promise<void> {
  const now = deps.clock.now()
  await withdrawPromises(tx, run.facts.kit.id, now)
  await withdrawVisits(tx, run.ticketId, now)
  if (run.state.stage === 'retired') {
    await updateKit(tx, run.facts.kit.id, { state: 'retired', outOfServiceSince: null })
  }
}

async function runEffect(
  tx: Transaction,
  deps: Deps,
  { run, effect }: { run: EffectsRun; effect: TicketEffect },
): Promise<TicketEvent | null> {
  switch (effect.kind) {
    case 'promise part':
      return promise(tx, deps, { run, position: effect.stage })
    case 'ask for visit':
      return bookVisit(tx, deps, run)
    default:
      await runPlain(tx, deps, { run, effect })
      return null
  }
}

type PlainEffect = Exclude<TicketEffect, { kind: 'promise part' | 'ask for visit' }>

/** Effects that the ticket need not hear of again. */
async function runPlain(
  tx: Transaction,
  deps: Deps,
  { run, effect }: { run: EffectsRun; effect: PlainEffect },
): Promise<void> {
  const { facts, ticketId } = run
  switch (effect.kind) {
    case 'send step': {
      const step = stepOf(effect.stepId)
      if (step) await sendMoment(tx, deps, { run, moment: step.moment, stepId: step.id })
      return
    }
    case 'send': {
      const isAdvice = effect.moment === 'drink-advice'
      const values = isAdvice ? { minutes: boilMinutes(facts.area.altitudeMetres) } : {}
      return sendMoment(tx, deps, { run, moment: effect.moment, values })
    }
    case 'log wash':
      return logWash(tx, deps, { facts, ticketId, known: effect.known })
    case 'out of service': {
      const outOfServiceSince = deps.clock.now()
      return updateKit(tx, facts.kit.id, { state: 'out of service', outOfServiceSince })
    }
    case 'back in service':
      return updateKit(tx, facts.kit.id, { state: 'in use', outOfServiceSince: null })
    case 'tell coordinator':
      return tellCoordinator(tx, deps, { subject: effect.why, ticketId })
    case 'closed':
      return close(tx, deps, run)
  }
}

/**
 * Carries out what the core decided, in the transaction that keeps the decision. Answers with what the
 * ticket has to hear of in turn: a part that was promised, a visit that was booked.
 */
export async function runTicketEffects(
  tx: Transaction,
  deps: Deps,
  run: EffectsRun,
): Promise<TicketEvent[]> {
  const events: TicketEvent[] = []
  for (const effect of run.effects) {
    const event = await runEffect(tx, deps, { run, effect })
    if (event) events.push(event)
  }
  return events
}
