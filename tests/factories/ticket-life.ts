import fc from 'fast-check'
import { recovery } from '@/lib/domain/flow'
import type { TicketEvent } from '@/lib/domain/ticket'
import type { Trouble } from '@/lib/domain/trouble'
import { steps, type StepAnswer } from '@/lib/domain/walk'

const troubles: Trouble[] = [
  'slow',
  'no flow',
  'unwell',
  'danger sign',
  'unsafe',
  'unread',
  'silent',
]
const answers: StepAnswer[] = [
  'done',
  'not done',
  'cured',
  'partly',
  'not cured',
  'yes',
  'no',
  'choice-1',
  'choice-2',
  'choice-3',
  'no answer',
]

const staff = fc.constantFrom('ana', 'ben')
const trouble = fc.constantFrom(...troubles)
const stage = fc.constantFrom(1 as const, 2 as const, 3 as const)
const stepId = fc.constantFrom(...steps.map(({ id }) => id), 'shake-it')
const figure = fc
  .double({ min: 0, max: 25, noNaN: true })
  .map((flow) => recovery({ flow, first: 15, nominal: 15 }))

const event: fc.Arbitrary<TicketEvent> = fc.oneof(
  { weight: 1, arbitrary: fc.record({ kind: fc.constant('opened' as const), trouble }) },
  { weight: 2, arbitrary: fc.record({ kind: fc.constant('taken' as const), staffId: staff }) },
  {
    weight: 1,
    arbitrary: fc.record({
      kind: fc.constant('handed on' as const),
      staffId: fc.option(staff),
    }),
  },
  { weight: 1, arbitrary: fc.record({ kind: fc.constant('worsened' as const), trouble }) },
  {
    weight: 2,
    arbitrary: fc.record({
      kind: fc.constant('step sent' as const),
      stepId,
      by: fc.option(staff),
    }),
  },
  {
    weight: 6,
    arbitrary: fc.record(
      {
        kind: fc.constant('answered' as const),
        stepId,
        answer: fc.constantFrom(...answers),
        recovery: figure,
        need: fc.constantFrom('enough' as const, 'slow' as const, 'short' as const),
      },
      { requiredKeys: ['kind', 'stepId', 'answer'] },
    ),
  },
  {
    weight: 1,
    arbitrary: fc.record({
      kind: fc.constant('part promised' as const),
      promiseId: fc.constant('p'),
      stage,
    }),
  },
  {
    weight: 1,
    arbitrary: fc.constant<TicketEvent>({ kind: 'part handed over', promiseId: 'p' }),
  },
  { weight: 1, arbitrary: fc.constant<TicketEvent>({ kind: 'visit booked', visitId: 'v' }) },
  {
    weight: 1,
    arbitrary: fc.record({ kind: fc.constant('visit done' as const), flowing: fc.boolean() }),
  },
  { weight: 1, arbitrary: fc.constant<TicketEvent>({ kind: 'stopped using' }) },
  { weight: 2, arbitrary: fc.constant<TicketEvent>({ kind: 'no answer' }) },
  {
    weight: 1,
    arbitrary: fc.record({
      kind: fc.constant('ended' as const),
      end: fc.constantFrom('flowing' as const, 'retired' as const, 'withdrawn' as const),
      cause: fc.constant('full-cloth'),
    }),
  },
)

/** Starts as every ticket does, so that a run is not spent on events that are all refused. */
export const life = fc
  .tuple(
    fc.record({ kind: fc.constant('opened' as const), trouble }),
    fc.array(event, { maxLength: 24 }),
  )
  .map(([first, rest]): TicketEvent[] => [first, ...rest])
