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

function holdsAlways(check: (step: Step, steps: readonly Step[]) => void) {
  fc.assert(
    fc.property(life, (events) => {
      const lived = live(events)
      for (const step of lived) check(step, lived)
    }),
    { seed: 8, numRuns: 500 },
  )
}

const has = (effects: readonly TicketEffect[], kind: TicketEffect['kind']) =>
  effects.some((effect) => effect.kind === kind)

describe('whatever happens to a ticket', { timeout: 60_000 }, () => {
  it('it waits for a step if and only if it is waiting', () => {
    holdsAlways(({ state }) => expect(state.waitingFor !== null).toBe(state.stage === 'waiting'))
  })

  it('it has an end time if and only if it has ended, and then a cause', () => {
    holdsAlways(({ state }) => {
      expect(state.endedAt !== null).toBe(!isOpen(state.stage))
      if (!isOpen(state.stage)) expect(state.cause).toBeTruthy()
    })
  })

  it('no step goes out by itself once a person has it, or where there is danger', () => {
    holdsAlways(({ state, event: what, effects }) => {
      if (state.automatic) {
        expect(state.takenBy).toBeNull()
        expect(isDanger(state.trouble)).toBe(false)
        expect(isOpen(state.stage)).toBe(true)
      }
      if (has(effects, 'send step') && what.kind !== 'part handed over') {
        expect(state.automatic).toBe(true)
      }
    })
  })

  it('a step that goes out is the step whose answer is awaited', () => {
    holdsAlways(({ state, effects }) => {
      for (const effect of effects) {
        if (effect.kind === 'send step') expect(state.waitingFor).toBe(effect.stepId)
      }
      expect(effects.filter(({ kind }) => kind === 'send step').length).toBeLessThanOrEqual(1)
    })
  })

  it('its trouble never weighs less than before', () => {
    holdsAlways(({ before, state }) => {
      if (before) expect(isWorse(before.trouble, state.trouble)).toBe(false)
    })
  })

  it('an owed part has a stage, until it is handed over', () => {
    holdsAlways(({ state }) => {
      if (state.stage === 'part owed') expect([1, 2, 3]).toContain(state.promisedStage)
    })
  })

  it('out of service and without safe water are one thing', () => {
    holdsAlways(({ state }) => {
      expect(state.noSafeWaterSince !== null).toBe(state.outOfService)
    })
  })

  it('advice on what to drink goes out with every taking out of service, and only then', () => {
    holdsAlways(({ before, state, effects }) => {
      const isTakenOut = state.outOfService && !before?.outOfService
      expect(has(effects, 'out of service')).toBe(isTakenOut)
      const isAdvised = effects.some((one) => one.kind === 'send' && one.moment === 'drink-advice')
      expect(isAdvised).toBe(isTakenOut)
    })
  })

  it('it is put back in service only when it ends as flowing', () => {
    holdsAlways(({ before, state, effects }) => {
      const isBack = before?.outOfService === true && !state.outOfService
      expect(has(effects, 'back in service')).toBe(isBack)
      if (isBack) expect(state.stage).toBe('flowing')
    })
  })

  it('it is closed once, with its last event', () => {
    holdsAlways((step, lived) => {
      expect(has(step.effects, 'closed')).toBe(!isOpen(step.state.stage))
      if (!isOpen(step.state.stage)) expect(step).toBe(lived.at(-1))
    })
  })

  it('illness and danger are never ended by running water', () => {
    holdsAlways(({ before, state, event: what }) => {
      if (what.kind !== 'answered' || isOpen(state.stage)) return
      expect(before && isDanger(before.trouble)).toBe(false)
    })
  })

  it('it opens with a fixed answer to danger, and with no step', () => {
    holdsAlways(({ event: what, effects, state }) => {
      if (what.kind !== 'opened' || !isDanger(what.trouble)) return
      expect(has(effects, 'send')).toBe(true)
      expect(has(effects, 'send step')).toBe(false)
      expect(state.automatic).toBe(false)
    })
  })

  it('it is the same folded as lived, refused events or not', () => {
    fc.assert(
      fc.property(life, (events) => {
        const last = live(events).at(-1)?.state ?? null
        expect(fold(events.map((one, index) => ({ event: one, at: at(index) })))).toEqual(last)
      }),
      { seed: 9, numRuns: 300 },
    )
  })

  it('it comes back whole from JSON', () => {
    holdsAlways(({ state }) => expect(JSON.parse(JSON.stringify(state))).toEqual(state))
  })
})
