import { isDeepStrictEqual } from 'node:util'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  decide,
  fold,
  isOpen,
  type TicketEffect,
  type TicketEvent,
  type TicketState,
} from '@/lib/domain/ticket'
import { isDanger, isWorse } from '@/lib/domain/trouble'
import { life } from '@/tests/factories/ticket-life'

type Step = {
  before: TicketState | null
  event: TicketEvent
  state: TicketState
  effects: TicketEffect[]
}

const opening = 1_780_000_000_000
const at = (index: number) => opening + index * 3_600_000

/** What was accepted of a life, each with the state before and after. */
function live(events: readonly TicketEvent[]): Step[] {
  const taken: Step[] = []
  let before: TicketState | null = null
  events.forEach((one, index) => {
    const decision = decide(before, one, at(index))
    if (!decision.ok) return
    taken.push({ before, event: one, state: decision.state, effects: decision.effects })
    before = decision.state
  })
  return taken
}

/**
 * The first life in which something does not hold, made as short as can be; null if it always holds.
 */
function breachOf(holds: (step: Step, isLast: boolean) => boolean): TicketEvent[] | null {
  const run = fc.check(
    fc.property(life, (events) => {
      const lived = live(events)
      return lived.every((step, index) => holds(step, index === lived.length - 1))
    }),
    { seed: 8, numRuns: 600 },
  )
  return run.failed ? (run.counterexample?.[0] ?? []) : null
}

const has = (effects: readonly TicketEffect[], kind: TicketEffect['kind']) =>
  effects.some((effect) => effect.kind === kind)
const sends = (effects: readonly TicketEffect[], moment: string) =>
  effects.some((effect) => effect.kind === 'send' && effect.moment === moment)
const stepsIn = (effects: readonly TicketEffect[]) =>
  effects.flatMap((effect) => (effect.kind === 'send step' ? [effect.stepId] : []))

describe('whatever happens to a ticket', { timeout: 60_000 }, () => {
  it('waits for a step if and only if it is waiting', () => {
    const breach = breachOf(
      ({ state }) => (state.waitingFor !== null) === (state.stage === 'waiting'),
    )
    expect(breach).toBeNull()
  })

  it('has an end time and a cause if and only if it has ended', () => {
    const breach = breachOf(({ state }) =>
      isOpen(state.stage) ? state.endedAt === null : state.endedAt !== null && !!state.cause,
    )
    expect(breach).toBeNull()
  })

  it('sends no step by itself once a person has it, or where there is danger', () => {
    const breach = breachOf(({ state, event, effects }) => {
      const mayGo = state.takenBy === null && !isDanger(state.trouble) && isOpen(state.stage)
      const isSent = has(effects, 'send step') && event.kind !== 'part handed over'
      return (!state.automatic || mayGo) && (!isSent || state.automatic)
    })
    expect(breach).toBeNull()
  })

  it('awaits the answer of the one step that goes out', () => {
    const breach = breachOf(({ state, effects }) => {
      const sent = stepsIn(effects)
      return sent.length === 0 || (sent.length === 1 && sent[0] === state.waitingFor)
    })
    expect(breach).toBeNull()
  })

  it('never takes its trouble for lighter than before', () => {
    const breach = breachOf(
      ({ before, state }) => !before || !isWorse(before.trouble, state.trouble),
    )
    expect(breach).toBeNull()
  })

  it('knows the stage of an owed part', () => {
    const breach = breachOf(
      ({ state }) => state.stage !== 'part owed' || state.promisedStage !== null,
    )
    expect(breach).toBeNull()
  })

  it('is without safe water if and only if it is out of service', () => {
    const breach = breachOf(({ state }) => (state.noSafeWaterSince !== null) === state.outOfService)
    expect(breach).toBeNull()
  })

  it('gives advice on what to drink when it goes out of service, and only then', () => {
    const breach = breachOf(({ before, state, effects }) => {
      const isTakenOut = state.outOfService && !before?.outOfService
      return (
        has(effects, 'out of service') === isTakenOut &&
        sends(effects, 'drink-advice') === isTakenOut
      )
    })
    expect(breach).toBeNull()
  })

  it('comes back in service only when it ends as flowing', () => {
    const breach = breachOf(({ before, state, effects }) => {
      const isBack = before?.outOfService === true && !state.outOfService
      return has(effects, 'back in service') === isBack && (!isBack || state.stage === 'flowing')
    })
    expect(breach).toBeNull()
  })

  it('is closed once, with its last event', () => {
    const breach = breachOf(
      ({ state, effects }, isLast) =>
        has(effects, 'closed') === !isOpen(state.stage) && (isOpen(state.stage) || isLast),
    )
    expect(breach).toBeNull()
  })

  it('is not ended by running water where there is illness or danger', () => {
    const breach = breachOf(({ before, state, event }) => {
      const isEndedByAnswer = event.kind === 'answered' && !isOpen(state.stage)
      return !isEndedByAnswer || !before || !isDanger(before.trouble)
    })
    expect(breach).toBeNull()
  })

  it('opens with a fixed answer to danger, and with no step', () => {
    const breach = breachOf(({ event, effects, state }) => {
      if (event.kind !== 'opened' || !isDanger(event.trouble)) return true
      return has(effects, 'send') && !has(effects, 'send step') && !state.automatic
    })
    expect(breach).toBeNull()
  })

  it('comes back whole from JSON', () => {
    const breach = breachOf(({ state }) => {
      const back: unknown = JSON.parse(JSON.stringify(state))
      return isDeepStrictEqual(back, state)
    })
    expect(breach).toBeNull()
  })

  it('is the same folded as lived, refused events or not', () => {
    const run = fc.check(
      fc.property(life, (events) => {
        const last = live(events).at(-1)?.state ?? null
        const folded = fold(events.map((event, index) => ({ event, at: at(index) })))
        return isDeepStrictEqual(folded, last)
      }),
      { seed: 9, numRuns: 300 },
    )
    expect(run.counterexample).toBeNull()
  })
})
