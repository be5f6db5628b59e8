import { describe, expect, it } from 'vitest'
import type { TicketEvent } from '@/lib/domain/ticket'
import { defaultPriors } from '@/lib/domain/walk'
import {
  advice,
  after,
  answered,
  decided,
  now,
  opened,
  refused,
  taken,
} from '@/tests/factories/ticket'

describe('an answer', () => {
  it('that the filter runs too fast takes it out of service', () => {
    const { state, effects } = after(opened('slow'), answered('ask-flow', 1.5))
    expect(effects).toEqual([{ kind: 'send', moment: 'stop-using' }, ...advice])
    expect(state).toMatchObject({ trouble: 'unsafe', automatic: false, stage: 'walking' })
  })

  it('that a crack is seen does the same, once', () => {
    const crack: TicketEvent = { kind: 'answered', stepId: 'check-cracks', answer: 'choice-1' }
    const { state } = after(opened('slow'), taken, crack)
    expect(state).toMatchObject({ trouble: 'unsafe', outOfService: true, noSafeWaterSince: now })
    expect(decided(state, crack).effects).toEqual([])
  })

  it('that water runs well does not end illness', () => {
    const { state, effects } = after(opened('unwell'), taken, answered('ask-flow', 0.9))
    expect(state.stage).toBe('walking')
    expect(effects).toEqual([])
  })

  it('that water runs well ends silence, without a wash', () => {
    const { state, effects } = after(opened('silent'), answered('ask-flow', 0.9))
    expect(effects).toEqual([{ kind: 'send', moment: 'flowing' }, { kind: 'closed' }])
    expect(state.cause).toBe('no fault found')
  })

  it('that water runs well does not end words that nobody has read', () => {
    const { state, effects } = after(opened('unread'), answered('ask-flow', 0.9))
    expect(state).toMatchObject({ stage: 'walking', trouble: 'unread', endedAt: null })
    expect(effects).toEqual([])
  })

  it('that nothing comes is more than slow water, whatever step it answers to but a cure', () => {
    const nothing = (stepId: string): TicketEvent => ({ kind: 'answered', stepId, answer: 'no' })
    expect(after(opened('slow'), nothing('ask-flow')).state.trouble).toBe('no flow')
    expect(after(opened('slow'), nothing('ask-again')).state.trouble).toBe('no flow')
    expect(after(opened('slow'), nothing('wash-fibre')).state.trouble).toBe('slow')
    expect(after(opened('slow'), answered('ask-flow', 0.1)).state.trouble).toBe('slow')
    expect(after(opened('unwell'), nothing('ask-flow')).state.trouble).toBe('unwell')
  })

  it.each([
    [8, 'cold-water'],
    [10, 'cold-water'],
    [11, 'no fault found'],
  ])('in water of %i °C names the cause %s', (celsius, cause) => {
    const { state } = after({ kind: 'opened', trouble: 'slow', celsius }, answered('ask-flow', 0.9))
    expect(state.cause).toBe(cause)
  })

  it('after a cure for two faults names the likelier', () => {
    const odds = { ...defaultPriors.slow, 'fouled-fibre': 0.01, 'air-lock': 0.57 }
    const washed = after({ kind: 'opened', trouble: 'slow', odds }, answered('wash-fibre', 0.95))
    expect(washed.state.cause).toBe('air-lock')
  })

  it('after another cure names what it cured, and logs no wash', () => {
    const { state, effects } = after(
      opened('slow'),
      taken,
      answered('ask-flow', 0.3),
      answered('straighten-hose', 0.95),
    )
    expect(state.cause).toBe('kinked-hose')
    expect(effects).toEqual([{ kind: 'send', moment: 'flowing' }, { kind: 'closed' }])
  })

  it('names what the cure is for, however unlikely that was', () => {
    const odds = { ...defaultPriors.slow, 'fouled-fibre': 0.985, 'misfitted-cap': 0.001 }
    const { state } = after({ kind: 'opened', trouble: 'slow', odds }, answered('refit-cap', 0.95))
    expect(state.cause).toBe('misfitted-cap')
  })

  it('that the cloth is torn owes a cloth', () => {
    const { state, effects } = after(opened('slow'), taken, {
      kind: 'answered',
      stepId: 'rinse-cloth',
      answer: 'choice-1',
      need: 'enough',
    })
    expect(effects).toEqual([{ kind: 'promise part', stage: 1 }])
    expect(state).toMatchObject({ promisedStage: 1, cause: 'full-cloth' })
  })

  it('that ends in a visit asks for one, with advice if there is too little to drink', () => {
    const silence: TicketEvent = { kind: 'answered', stepId: 'ask-flow', answer: 'no answer' }
    const { state, effects } = after(opened('slow'), silence, { ...silence, need: 'short' })
    expect(effects).toEqual([{ kind: 'ask for visit' }, ...advice])
    expect(state.stage).toBe('visit due')
  })

  it('while a part is owed ends the ticket if water is back, and changes nothing if not', () => {
    const owed = after(opened('slow'), { kind: 'part promised', promiseId: 'p', stage: 3 })
    expect(decided(owed.state, answered('ask-flow', 0.2))).toMatchObject({
      state: { stage: 'part owed' },
      effects: [],
    })
    expect(decided(owed.state, answered('ask-flow', 0.9)).state.stage).toBe('flowing')
  })

  it('while a visit is due leaves it due', () => {
    const booked = after(opened('slow'), { kind: 'visit booked', visitId: 'v' })
    expect(decided(booked.state, answered('ask-flow', 0.2))).toMatchObject({
      state: { stage: 'visit due', waitingFor: null },
      effects: [],
    })
  })

  it('that fails to come while a part is owed asks for no visit', () => {
    const silence: TicketEvent = { kind: 'answered', stepId: 'ask-flow', answer: 'no answer' }
    const owed = after(opened('slow'), { kind: 'part promised', promiseId: 'p', stage: 3 })
    const twice = decided(decided(owed.state, silence).state, { ...silence, need: 'short' })
    expect(twice.effects).toEqual([])
    expect(twice.state).toMatchObject({ stage: 'part owed', outOfService: false })
  })

  it('to a step that is none is refused', () => {
    const { state } = after(opened('slow'))
    const event: TicketEvent = { kind: 'answered', stepId: 'shake-it', answer: 'done' }
    expect(refused(state, event)).toBe('unknown step')
    expect(refused(state, { kind: 'step sent', stepId: 'shake-it', by: 'ana' })).toBe(
      'unknown step',
    )
  })
})
