import { describe, expect, it } from 'vitest'
import { kitPast, kitPlan, type KitPast, type KitPlan } from '@/lib/domain/kit-life'

const today = '2026-06-15'
const none: KitPast = {
  handedOverOn: '2025-12-01',
  fittings: [],
  washes: [],
  prompts: [],
  tickets: [],
}
const past = (change: Partial<KitPast>) => kitPast({ ...none, ...change }, today)
const last = (change: Partial<KitPast>) => past(change).at(-1)

describe('what happened to a kit', () => {
  it('begins with the hand-over, the year beside it where it is not this one', () => {
    expect(past({})).toEqual([
      {
        id: 'hand-over',
        on: '2025-12-01',
        day: '1 Dec',
        beside: '2025',
        bead: 'full',
        title: 'Handed over',
      },
    ])
    expect(past({ handedOverOn: '2026-01-01' })[0]).not.toHaveProperty('beside')
  })

  it('goes from old to new; on one day the asking comes before the doing and the trouble', () => {
    const beads = past({
      washes: [
        { n: 2, washedOn: '2026-03-01', known: 'said' },
        { n: 1, washedOn: '2026-02-01', known: 'said' },
      ],
      prompts: [{ id: 'p', kind: 'wash', dueOn: '2026-03-01', positions: [], state: 'answered' }],
      tickets: [
        {
          id: 't',
          trouble: 'slow water',
          openedOn: '2026-03-01',
          endedOn: null,
          stage: 'walking',
          cause: null,
        },
      ],
    })
    expect(beads.map(({ id }) => id)).toEqual([
      'hand-over',
      'wash-1',
      'prompt-p',
      'wash-2',
      'ticket-t',
    ])
  })

  it.each([
    ['said', 'as they said'],
    ['measured', 'measured after it'],
    ['seen', 'seen by a person'],
  ] as const)('tells how a wash is known: %s', (known, note) => {
    expect(last({ washes: [{ n: 1, washedOn: '2026-02-01', known }] })).toMatchObject({
      title: 'Washed',
      bead: 'full',
      note,
    })
  })

  it.each([
    ['wash', [], 'Asked to wash'],
    ['change', [1], 'Asked to change cloth'],
    ['change', [1, 2], 'Asked to change cloth and carbon'],
    ['change', [], 'Asked to change a stage'],
    ['flow check', [], 'Asked for a flow reading'],
    ['welcome', [], 'Welcomed'],
  ] as const)('says what was asked: %s of %j', (kind, positions, title) => {
    const prompts = [{ id: 'p', kind, dueOn: '2026-02-01', positions, state: 'asked' }] as const
    expect(last({ prompts })).toMatchObject({ title, bead: 'half', note: 'no answer yet' })
  })

  it.each([
    ['planned', 'ring', 'waits for its hour'],
    ['answered', 'full', 'answered'],
    ['silent', 'broken', 'no answer'],
    ['dropped', 'broken', 'could not go, planned anew'],
  ] as const)('shows a prompt that is %s', (state, bead, note) => {
    const prompts = [{ id: 'p', kind: 'wash', dueOn: '2026-02-01', positions: [], state }] as const
    expect(last({ prompts })).toMatchObject({ bead, note })
  })

  it('tells a new stage from those it came with, and why the old one went', () => {
    const fitting = { position: 3, dueOn: '2027-01-01', removedOn: null, removedFor: null } as const
    const beads = past({
      fittings: [
        {
          ...fitting,
          id: 'old',
          fittedOn: '2025-12-01',
          removedOn: '2026-04-02',
          removedFor: 'spent',
        },
        { ...fitting, id: 'new', fittedOn: '2026-04-02' },
        { ...fitting, id: 'cloth', position: 1, fittedOn: '2026-04-02' },
      ],
    })
    expect(beads.map(({ id, title, note }) => [id, title, note])).toEqual([
      ['hand-over', 'Handed over', undefined],
      ['fitting-new', 'New fibre fitted', 'the old one: spent'],
      ['fitting-cloth', 'New cloth fitted', undefined],
    ])
  })

  it('tells of trouble in clay, open or with its end and cause', () => {
    const ticket = { id: 't', trouble: 'slow water', openedOn: '2026-02-01', stage: 'flowing' }
    expect(last({ tickets: [{ ...ticket, endedOn: null, cause: null }] })).toMatchObject({
      bead: 'half',
      tone: 'clay',
      title: 'Trouble: slow water',
      note: 'the ticket is open',
    })
    const ended = { ...ticket, endedOn: '2026-02-03' }
    expect(last({ tickets: [{ ...ended, cause: 'fibre fouled' }] })).toMatchObject({
      bead: 'full',
      note: 'flowing on 3 Feb 2026: fibre fouled',
    })
    expect(last({ tickets: [{ ...ended, cause: null }] })?.note).toBe('flowing on 3 Feb 2026')
  })
})

describe('what comes next for a kit', () => {
  const plan: KitPlan = {
    state: 'in use',
    nextWashOn: '2026-06-20',
    calendarWashOn: '2026-06-20',
    nextFlowCheckOn: '2026-06-15',
    fittings: [
      { position: 3, dueOn: '2026-12-01' },
      { position: 1, dueOn: '2026-06-01' },
    ],
  }

  it('is told soonest first, with how far off it is', () => {
    const beads = kitPlan(plan, today)
    expect(beads.map(({ id, title, day, beside }) => [id, title, day, beside])).toEqual([
      ['next-change-1', 'Change of cloth', '1 Jun', '14 days late'],
      ['next-flow-check', 'Flow reading', '15 Jun', 'today'],
      ['next-wash', 'Wash', '20 Jun', 'in 5 days'],
      ['next-change-3', 'Change of fibre', '1 Dec', 'in 169 days'],
    ])
    expect(beads.every(({ bead, note }) => bead === 'ring' && note === undefined)).toBe(true)
  })

  it('says where the trend brought a wash forward, and from which day', () => {
    const beads = kitPlan({ ...plan, calendarWashOn: '2026-06-28' }, today)
    const noteOf = (id: string) => beads.find((bead) => bead.id === id)?.note
    expect(noteOf('next-wash')).toBe('brought forward from 28 Jun by the trend of the flow')
    expect(noteOf('next-flow-check')).toBeUndefined()
  })

  it('waits while the kit is out of service, and is nothing once it is retired', () => {
    const waiting = kitPlan({ ...plan, state: 'out of service' }, today)
    expect(waiting.map(({ note }) => note)).toEqual(Array(4).fill('waits: out of service'))
    expect(kitPlan({ ...plan, state: 'retired' }, today)).toEqual([])
  })
})
