import { describe, expect, it } from 'vitest'
import { normalisedFlow, recovery, type Recovery } from '@/lib/domain/flow'
import {
  decide,
  fold,
  isOpen,
  type TicketEffect,
  type TicketEvent,
  type TicketState,
} from '@/lib/domain/ticket'
import { nextStep } from '@/lib/domain/walk'

const hour = 3_600_000
const opening = 1_780_000_000_000

/** A litre in so many minutes, against a first reading of 3.5 minutes; 20 °C, full head. */
function after(minutes: number): Recovery {
  const flow = (m: number) =>
    normalisedFlow({ litres: 1, seconds: m * 60, celsius: 20, headRatio: 1 })
  return recovery({ flow: flow(minutes), first: flow(3.5), nominal: 15 })
}

type Played = { state: TicketState; effects: TicketEffect[] }

/** Plays events one hour apart; a refusal fails the test. */
function play(events: readonly TicketEvent[], from: TicketState | null = null): Played {
  let last: Played | null = from && { state: from, effects: [] }
  for (const [index, event] of events.entries()) {
    const decision = decide(last?.state ?? null, event, opening + index * hour)
    if (!decision.ok) throw new Error(`${event.kind} refused: ${decision.reason}`)
    last = decision
  }
  if (!last) throw new Error('no events')
  return last
}

const openedSlow: TicketEvent = { kind: 'opened', trouble: 'slow' }
const figure = (stepId: string, minutes: number): TicketEvent => ({
  kind: 'answered',
  stepId,
  answer: 'done',
  minutes,
  recovery: after(minutes),
  need: 'slow',
})

describe('a slow filter that an agent takes', () => {
  it('opens by asking how long a litre takes, by itself', () => {
    const { state, effects } = play([openedSlow])
    expect(effects).toEqual([{ kind: 'send step', stepId: 'ask-flow' }])
    expect(state).toMatchObject({ stage: 'waiting', waitingFor: 'ask-flow', automatic: true })
  })

  it('is washed after a slow figure, flows again, and the wash counts', () => {
    const walking = play([openedSlow, { kind: 'taken', staffId: 'ana' }, figure('ask-flow', 12)])
    expect(walking.effects).toEqual([])
    expect(nextStep(walking.state.walk!)).toMatchObject({
      kind: 'step',
      step: { id: 'wash-fibre' },
    })
    const { state, effects } = play(
      [{ kind: 'step sent', stepId: 'wash-fibre', by: 'ana' }, figure('wash-fibre', 4)],
      walking.state,
    )
    expect(effects).toEqual([
      { kind: 'log wash', known: 'measured' },
      { kind: 'send', moment: 'flowing' },
      { kind: 'closed' },
    ])
    expect(state).toMatchObject({ stage: 'flowing', cause: 'fouled-fibre', waitingFor: null })
    expect(isOpen(state.stage)).toBe(false)
  })
})

describe('a slow filter that is walked by itself', () => {
  const twiceWashed: TicketEvent[] = [
    openedSlow,
    { kind: 'step sent', stepId: 'ask-flow', by: null },
    figure('ask-flow', 12),
    { kind: 'step sent', stepId: 'wash-fibre', by: null },
    figure('wash-fibre', 12),
    { kind: 'step sent', stepId: 'wash-fibre', by: null },
  ]

  it('is washed twice', () => {
    expect(play(twiceWashed.slice(0, 3)).effects).toEqual([
      { kind: 'send step', stepId: 'wash-fibre' },
    ])
    const once = play(twiceWashed.slice(0, 5))
    expect(once.effects).toEqual([
      { kind: 'log wash', known: 'measured' },
      { kind: 'send step', stepId: 'wash-fibre' },
    ])
    expect(once.state.failedWashes).toBe(1)
  })

  it.each([
    ['done', [{ kind: 'log wash', known: 'said' }]],
    ['not cured', [{ kind: 'log wash', known: 'said' }]],
    ['not done', []],
    ['no answer', []],
  ] as const)('counts the wash when the answer is %s', (answer, logged) => {
    const { effects } = play([
      ...twiceWashed.slice(0, 4),
      { kind: 'answered', stepId: 'wash-fibre', answer },
    ])
    expect(effects.filter(({ kind }) => kind === 'log wash')).toEqual(logged)
  })

  it('is owed a fibre stage after the second wash that fails', () => {
    const { state, effects } = play([...twiceWashed, figure('wash-fibre', 11)])
    expect(effects).toEqual([
      { kind: 'log wash', known: 'measured' },
      { kind: 'promise part', stage: 3 },
    ])
    expect(state).toMatchObject({
      stage: 'part owed',
      cause: 'spent-fibre',
      promisedStage: 3,
      failedWashes: 2,
      outOfService: false,
    })
  })

  it('is out of service with advice on what to drink when it cannot give the day', () => {
    const { state, effects } = play([
      ...twiceWashed,
      { ...figure('wash-fibre', 11), need: 'short' } as TicketEvent,
    ])
    expect(effects).toEqual([
      { kind: 'log wash', known: 'measured' },
      { kind: 'promise part', stage: 3 },
      { kind: 'out of service' },
      { kind: 'send', moment: 'drink-advice' },
    ])
    expect(state.noSafeWaterSince).toBe(opening + 6 * hour)
  })

  it('asks for the flow after the part, and ends when it runs', () => {
    const owed = play([
      ...twiceWashed,
      { ...figure('wash-fibre', 11), need: 'short' } as TicketEvent,
    ])
    const fitted = play(
      [
        { kind: 'part promised', promiseId: 'p1', stage: 3 },
        { kind: 'part handed over', promiseId: 'p1' },
      ],
      owed.state,
    )
    expect(fitted.effects).toEqual([{ kind: 'send step', stepId: 'ask-flow' }])
    expect(fitted.state).toMatchObject({ stage: 'waiting', outOfService: true })
    const { state, effects } = play([figure('ask-flow', 3.5)], fitted.state)
    expect(effects).toEqual([
      { kind: 'send', moment: 'flowing' },
      { kind: 'back in service' },
      { kind: 'closed' },
    ])
    expect(state).toMatchObject({ stage: 'flowing', cause: 'spent-fibre', outOfService: false })
  })

  it('stops going by itself when an agent takes it', () => {
    const { state } = play([...twiceWashed.slice(0, 4), { kind: 'taken', staffId: 'ana' }])
    expect(state).toMatchObject({ stage: 'waiting', automatic: false, takenBy: 'ana' })
    const answered = play([figure('wash-fibre', 12)], state)
    expect(answered.effects).toEqual([{ kind: 'log wash', known: 'measured' }])
    expect(answered.state.stage).toBe('walking')
    expect(
      decide(answered.state, { kind: 'step sent', stepId: 'wash-fibre', by: null }, 0),
    ).toEqual({
      ok: false,
      reason: 'not automatic',
    })
  })
})

it('folds to the same state as it was decided', () => {
  const events: TicketEvent[] = [
    openedSlow,
    figure('ask-flow', 12),
    { kind: 'taken', staffId: 'ana' },
  ]
  const folded = fold(events.map((event, index) => ({ event, at: opening + index * hour })))
  expect(folded).toEqual(play(events).state)
})
