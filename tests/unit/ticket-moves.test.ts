import { describe, expect, it } from 'vitest'
import type { TicketEvent } from '@/lib/domain/ticket'
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

describe('parts and visits', () => {
  it('tells the household of a promise, and asks for the flow once it is handed over', () => {
    const owed = after(opened('slow'), { kind: 'part promised', promiseId: 'p', stage: 2 })
    expect(owed.effects).toEqual([{ kind: 'send', moment: 'part-owed' }])
    expect(owed.state).toMatchObject({ stage: 'part owed', promisedStage: 2, promiseId: 'p' })
    const fitted = decided(owed.state, { kind: 'part handed over', promiseId: 'p' })
    expect(fitted.effects).toEqual([{ kind: 'send step', stepId: 'ask-flow' }])
    expect(fitted.state).toMatchObject({ promiseId: null, promisedStage: null, failedWashes: 0 })
    expect(fitted.state.walk?.tried).toEqual([])
  })

  it('refuses to hand over what nobody promised', () => {
    const { state } = after(opened('slow'))
    expect(refused(state, { kind: 'part handed over', promiseId: 'p' })).toBe('nothing promised')
  })

  it('books a visit and ends with it when water runs', () => {
    const booked = after(opened('silent'), { kind: 'visit booked', visitId: 'v' })
    expect(booked.effects).toEqual([{ kind: 'send', moment: 'visit-booked' }])
    expect(booked.state).toMatchObject({ stage: 'visit due', visitId: 'v' })
    const done = decided(booked.state, { kind: 'visit done', flowing: true })
    expect(done.state).toMatchObject({ stage: 'flowing', cause: 'mended at a visit' })
  })

  it('goes back to a person when the visitor could not mend it', () => {
    const { state } = after(
      opened('slow'),
      { kind: 'visit booked', visitId: 'v' },
      { kind: 'visit done', flowing: false },
    )
    expect(state).toMatchObject({ stage: 'walking', visitId: null, automatic: false })
  })

  it('keeps owing the part while it is brought by a visitor', () => {
    const brought = after(
      opened('slow'),
      { kind: 'part promised', promiseId: 'p', stage: 3 },
      { kind: 'visit booked', visitId: 'v' },
    )
    expect(brought.state.stage).toBe('part owed')
    expect(decided(brought.state, { kind: 'visit done', flowing: false }).state.stage).toBe(
      'part owed',
    )
  })

  it('ends with a visit that was asked for, booked in the desk or not', () => {
    const asked = after(opened('silent'), { kind: 'no answer' })
    expect(asked.state).toMatchObject({ stage: 'visit due', visitId: null })
    expect(decided(asked.state, { kind: 'visit done', flowing: true }).state.stage).toBe('flowing')
  })

  it('lets the desk ask by itself for the flow of a part, and for nothing else', () => {
    const { state } = after(
      opened('slow'),
      taken,
      { kind: 'part promised', promiseId: 'p', stage: 3 },
      { kind: 'part handed over', promiseId: 'p' },
    )
    const sent = (stepId: string) => refused(state, { kind: 'step sent', stepId, by: null })
    expect(sent('ask-flow')).toBe('accepted')
    expect(sent('wash-fibre')).toBe('not automatic')
  })

  it('refuses a visit that was not due', () => {
    const { state } = after(opened('slow'))
    expect(refused(state, { kind: 'visit done', flowing: true })).toBe('no visit due')
  })
})

describe('no answer', () => {
  it('to one step leaves it to a person; to two it needs a visit', () => {
    const once = after(opened('slow'), { kind: 'no answer' })
    expect(once.state).toMatchObject({ stage: 'walking', automatic: false, waitingFor: null })
    expect(once.effects).toEqual([])
    const again = decided(
      decided(once.state, { kind: 'step sent', stepId: 'ask-flow', by: 'ana' }).state,
      { kind: 'no answer' },
    )
    expect(again.effects).toEqual([{ kind: 'ask for visit' }])
    expect(again.state.stage).toBe('visit due')
  })

  it('to silence needs a visit', () => {
    expect(after(opened('silent'), { kind: 'no answer' }).effects).toEqual([
      { kind: 'ask for visit' },
    ])
  })

  it('leaves a ticket nobody has begun as new', () => {
    expect(after(opened('unread'), { kind: 'no answer' }).state.stage).toBe('new')
  })

  it('needs no visit where the last that was heard is running water', () => {
    const { state, effects } = after(opened('unread'), answered('ask-flow', 0.9), {
      kind: 'no answer',
    })
    expect(state.stage).toBe('walking')
    expect(effects).toEqual([])
  })

  it('to danger is the coordinator’s to know', () => {
    expect(after(opened('danger sign'), { kind: 'no answer' }).effects).toEqual([
      { kind: 'tell coordinator', why: 'danger, and nobody answers' },
    ])
  })

  it('while a part is owed changes nothing', () => {
    const owed = after(opened('slow'), { kind: 'part promised', promiseId: 'p', stage: 3 })
    expect(decided(owed.state, { kind: 'no answer' })).toMatchObject({
      state: owed.state,
      effects: [],
    })
  })
})

describe('ending', () => {
  it('takes the cause it is given', () => {
    const { state, effects } = after(opened('slow'), {
      kind: 'ended',
      end: 'withdrawn',
      cause: 'no fault found',
    })
    expect(state).toMatchObject({ stage: 'withdrawn', cause: 'no fault found', endedAt: now })
    expect(effects).toEqual([{ kind: 'closed' }])
  })

  it('puts the filter back in service only when it flows', () => {
    const ended = (end: 'flowing' | 'retired') =>
      after(opened('unsafe'), { kind: 'ended', end, cause: 'misfitted-cap' })
    expect(ended('flowing').effects).toEqual([{ kind: 'back in service' }, { kind: 'closed' }])
    expect(ended('retired').effects).toEqual([{ kind: 'closed' }])
    expect(ended('retired').state.outOfService).toBe(true)
  })

  it('is the last that can happen', () => {
    const { state } = after(opened('slow'), { kind: 'ended', end: 'flowing', cause: 'air-lock' })
    expect(refused(state, taken)).toBe('not open')
    expect(refused(state, opened('slow'))).toBe('already open')
    expect(refused(null, taken)).toBe('not open')
  })

  it('stops the use of a filter at an agent’s word', () => {
    const { state, effects } = after(opened('slow'), taken, { kind: 'stopped using' })
    expect(effects).toEqual([{ kind: 'send', moment: 'stop-using' }, ...advice])
    expect(state.trouble).toBe('unsafe')
    expect(after(opened('unwell'), { kind: 'stopped using' }).state.trouble).toBe('unwell')
  })

  it('stops the use of a filter that gives too little, without the same advice twice', () => {
    const silence: TicketEvent = { kind: 'answered', stepId: 'ask-flow', answer: 'no answer' }
    const short = after(opened('slow'), silence, { ...silence, need: 'short' })
    expect(short.state.outOfService).toBe(true)
    const stopped = decided(short.state, { kind: 'stopped using' })
    expect(stopped.effects).toEqual([{ kind: 'send', moment: 'stop-using' }])
    expect(stopped.state.trouble).toBe('unsafe')
    expect(decided(stopped.state, { kind: 'stopped using' }).effects).toEqual([])
  })
})
