import { describe, expect, it } from 'vitest'
import type { TicketEffect, TicketEvent } from '@/lib/domain/ticket'
import type { Trouble } from '@/lib/domain/trouble'
import {
  advice,
  after,
  decided,
  now,
  opened,
  refused,
  share,
  taken,
} from '@/tests/factories/ticket'

describe('opening', () => {
  it.each<{ trouble: Trouble; effects: TicketEffect[]; stage: string }>([
    { trouble: 'slow', effects: [{ kind: 'send step', stepId: 'ask-flow' }], stage: 'waiting' },
    { trouble: 'no flow', effects: [{ kind: 'send step', stepId: 'ask-flow' }], stage: 'waiting' },
    { trouble: 'unwell', effects: [{ kind: 'send', moment: 'unwell' }], stage: 'new' },
    { trouble: 'danger sign', effects: [{ kind: 'send', moment: 'unwell-now' }], stage: 'new' },
    {
      trouble: 'unsafe',
      effects: [{ kind: 'send', moment: 'stop-using' }, ...advice],
      stage: 'new',
    },
    { trouble: 'unread', effects: [], stage: 'new' },
    { trouble: 'silent', effects: [], stage: 'new' },
  ])('for $trouble', ({ trouble, effects, stage }) => {
    const { state, effects: had } = after(opened(trouble))
    expect(had).toEqual(effects)
    expect(state).toMatchObject({ stage, trouble, openedAt: now, takenBy: null })
  })

  it('promises nothing and books nothing yet', () => {
    const { state } = after(opened('silent'))
    expect(state).toMatchObject({
      promisedStage: null,
      promiseId: null,
      visitId: null,
      cause: null,
    })
  })

  it('goes on from a figure that came with the complaint', () => {
    const { state, effects } = after({
      kind: 'opened',
      trouble: 'slow',
      figure: { recovery: share(0.33), need: 'slow' },
    })
    expect(effects).toEqual([{ kind: 'send step', stepId: 'wash-fibre' }])
    expect(state.walk?.readings).toHaveLength(1)
    expect(state.walk?.tried).toMatchObject([{ stepId: 'ask-flow', answer: 'done' }])
    expect(after(opened('slow')).state.walk?.tried).toEqual([])
  })

  it('asks about a crack first when the filter was dropped', () => {
    const { effects } = after({ kind: 'opened', trouble: 'no flow', cues: ['dropped'] })
    expect(effects).toEqual([{ kind: 'send step', stepId: 'check-cracks' }])
  })

  it('rules cold out in warm water', () => {
    const { state } = after({ kind: 'opened', trouble: 'slow', celsius: 24 })
    expect(state.walk?.celsius).toBe(24)
    expect(state.walk?.odds['cold-water']).toBeLessThan(0.001)
  })
})

describe('taking and handing on', () => {
  it('is refused while another has it, and no matter twice by the same', () => {
    const { state } = after(opened('slow'), taken)
    expect(refused(state, { kind: 'taken', staffId: 'ben' })).toBe('taken by another')
    expect(refused(state, taken)).toBe('accepted')
  })

  it('starts a walk of a new ticket, and leaves a waiting one waiting', () => {
    expect(after(opened('unread'), taken).state.stage).toBe('walking')
    expect(after(opened('slow'), taken).state.stage).toBe('waiting')
  })

  it('does not set steps going again when it goes back to the shift', () => {
    const { state } = after(opened('slow'), taken, { kind: 'handed on', staffId: null })
    expect(state).toMatchObject({ takenBy: null, automatic: false })
    expect(refused(state, { kind: 'taken', staffId: 'ben' })).toBe('accepted')
  })

  it('goes on by itself when nobody had it', () => {
    const { state } = after(opened('slow'), { kind: 'handed on', staffId: null })
    expect(state.automatic).toBe(true)
  })

  it('passes it to another', () => {
    expect(after(opened('slow'), { kind: 'handed on', staffId: 'ben' }).state).toMatchObject({
      takenBy: 'ben',
      automatic: false,
    })
  })

  it('keeps others from sending steps', () => {
    const { state } = after(opened('slow'), taken)
    const by = (who: string | null): TicketEvent => ({
      kind: 'step sent',
      stepId: 'wash-fibre',
      by: who,
    })
    expect(refused(state, by('ben'))).toBe('taken by another')
    expect(refused(state, by(null))).toBe('not automatic')
    expect(decided(state, by('ana')).state.waitingFor).toBe('wash-fibre')
  })
})

describe('worse news', () => {
  it('raises the trouble and stops what goes by itself', () => {
    const { state, effects } = after(opened('slow'), { kind: 'worsened', trouble: 'unwell' })
    expect(state).toMatchObject({ trouble: 'unwell', automatic: false })
    expect(effects).toEqual([{ kind: 'send', moment: 'unwell' }])
  })

  it('never lowers it', () => {
    const { state, effects } = after(opened('danger sign'), { kind: 'worsened', trouble: 'slow' })
    expect(state.trouble).toBe('danger sign')
    expect(effects).toEqual([])
  })

  it('starts the walk of a ticket that had none', () => {
    const { state, effects } = after(opened('silent'), { kind: 'worsened', trouble: 'slow' })
    expect(state).toMatchObject({ trouble: 'slow', automatic: true })
    expect(effects).toEqual([{ kind: 'send step', stepId: 'ask-flow' }])
  })

  it('leaves the walk to who has taken it', () => {
    const { state, effects } = after(opened('unread'), taken, { kind: 'worsened', trouble: 'slow' })
    expect(state).toMatchObject({ trouble: 'slow', automatic: false })
    expect(effects).toEqual([])
  })

  it('does not ask twice when slow water stops', () => {
    expect(after(opened('slow'), { kind: 'worsened', trouble: 'no flow' }).effects).toEqual([])
  })
})
