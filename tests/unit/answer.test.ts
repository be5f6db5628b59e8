import { describe, expect, it } from 'vitest'
import { answerTo, type AnswerAct, type AnswerInput } from '@/lib/domain/answer'
import type { ReplyReading } from '@/lib/domain/reply'

type Situation = Partial<Omit<AnswerInput, 'reading'>>

function acts(reading: Omit<ReplyReading, 'sure'>, situation: Situation = {}): AnswerAct[] {
  return answerTo({
    reading: { sure: 1, ...reading },
    asked: 'none',
    waitingFor: null,
    hasOpenTicket: false,
    handledByCarrier: false,
    mayMeanStop: false,
    ...situation,
  })
}

const close: AnswerAct = { kind: 'close prompts' }
const thanks: AnswerAct = { kind: 'send', moment: 'thanks' }
const raise = (trouble: Extract<AnswerAct, { kind: 'raise trouble' }>['trouble']): AnswerAct => ({
  kind: 'raise trouble',
  trouble,
})
const forAPerson = [close, raise('unread')]

describe('a word about texting itself', () => {
  it('ends it, with one confirmation of our own', () => {
    expect(acts({ kind: 'stop' })).toEqual([
      { kind: 'withdraw consent' },
      close,
      { kind: 'send', moment: 'stopped' },
    ])
  })

  it('begins it again', () => {
    expect(acts({ kind: 'start' })).toEqual([
      { kind: 'give consent' },
      { kind: 'send', moment: 'started' },
    ])
  })

  it('asks for help', () => {
    expect(acts({ kind: 'help' })).toEqual([{ kind: 'send', moment: 'help' }])
  })

  it.each([
    ['stop', [{ kind: 'withdraw consent' }, close]],
    ['start', [{ kind: 'give consent' }]],
    ['help', []],
  ] as const)('is noted only where the carrier has answered it: %s', (kind, expected) => {
    expect(acts({ kind }, { handledByCarrier: true })).toEqual(expected)
  })

  it('from another house suspends the phone after one apology', () => {
    expect(acts({ kind: 'wrong-number' })).toEqual([
      close,
      { kind: 'send', moment: 'wrong-number' },
      { kind: 'suspend phone', why: 'Somebody there says it is the wrong number.' },
    ])
  })

  it('that the family moved is for a person', () => {
    expect(acts({ kind: 'moved' })).toEqual([{ kind: 'mark moved' }, ...forAPerson])
  })
})

describe('danger', () => {
  it.each([
    [{ kind: 'unwell' }, 'unwell'],
    [{ kind: 'unwell', dangerSign: true }, 'danger sign'],
    [{ kind: 'broken' }, 'unsafe'],
    [{ kind: 'odd-water' }, 'unsafe'],
  ] as const)('%o is the trouble "%s", whatever step was asked for', (reading, trouble) => {
    expect(acts(reading, { waitingFor: 'wash-fibre', hasOpenTicket: true })).toEqual([
      close,
      raise(trouble),
    ])
  })
})

describe('slow or stopped water', () => {
  it.each([
    ['slow', 'slow'],
    ['no-flow', 'no flow'],
  ] as const)('out of the blue is a trouble: %s', (kind, trouble) => {
    expect(acts({ kind })).toEqual([close, raise(trouble)])
  })

  it('with its minutes is a flow reading of water they call slow', () => {
    expect(acts({ kind: 'slow', minutes: 12 })).toEqual([
      close,
      { kind: 'log flow', minutes: 12, saysSlow: true },
    ])
  })

  it('with its minutes answers the step that was asked by the figure', () => {
    expect(acts({ kind: 'slow', minutes: 12 }, { waitingFor: 'wash-fibre' })).toEqual([
      { kind: 'answer step', stepId: 'wash-fibre', answer: 'done', minutes: 12 },
    ])
  })

  it('after a cure says that it did not cure', () => {
    expect(acts({ kind: 'slow' }, { waitingFor: 'wash-fibre' })).toEqual([
      { kind: 'answer step', stepId: 'wash-fibre', answer: 'not cured' },
    ])
  })

  it('where a litre was to be timed: nothing comes is an answer, slow is none', () => {
    expect(acts({ kind: 'no-flow' }, { waitingFor: 'ask-flow' })).toEqual([
      { kind: 'answer step', stepId: 'ask-flow', answer: 'no' },
    ])
    expect(acts({ kind: 'slow' }, { waitingFor: 'ask-flow' })).toEqual([close, raise('slow')])
    expect(acts({ kind: 'no-flow' }, { waitingFor: 'look-hose' })).toEqual([
      close,
      raise('no flow'),
    ])
  })
})

describe('minutes', () => {
  const figure = { kind: 'flow-figure', minutes: 7 } as const
  const logged = { kind: 'log flow', minutes: 7, saysSlow: false }

  it('go to the step that waits for them', () => {
    expect(acts(figure, { waitingFor: 'ask-again', hasOpenTicket: true })).toEqual([
      { kind: 'answer step', stepId: 'ask-again', answer: 'done', minutes: 7 },
    ])
  })

  it('go to the open ticket even when no step waits', () => {
    expect(acts(figure, { hasOpenTicket: true })).toEqual([
      { kind: 'answer step', stepId: 'ask-flow', answer: 'done', minutes: 7 },
    ])
  })

  it('without a ticket are a flow reading, and in answer to a wash prompt a wash too', () => {
    expect(acts(figure, { asked: 'flow' })).toEqual([close, logged])
    expect(acts(figure, { asked: 'wash' })).toEqual([close, { kind: 'log wash' }, logged])
    expect(acts({ ...figure, alsoSlow: true })).toEqual([close, { ...logged, saysSlow: true }])
  })

  it('that are none go to a person', () => {
    expect(acts({ kind: 'flow-figure' })).toEqual(forAPerson)
  })
})

describe('done', () => {
  it('answers the step that waits, before any prompt', () => {
    expect(acts({ kind: 'done' }, { waitingFor: 'wash-fibre', asked: 'wash' })).toEqual([
      { kind: 'answer step', stepId: 'wash-fibre', answer: 'done' },
    ])
  })

  it.each([
    ['wash', [close, { kind: 'log wash' }, thanks]],
    ['change', [{ kind: 'log change' }, close, thanks]],
    ['flow', [close]],
    ['step', [close]],
    ['none', [close]],
  ] as const)('after %s was asked stands only for that', (asked, expected) => {
    expect(acts({ kind: 'done' }, { asked })).toEqual(expected)
  })

  it('that is put off is waited for: "later" refuses neither a step nor a prompt', () => {
    expect(acts({ kind: 'not-yet' }, { waitingFor: 'wash-fibre', asked: 'step' })).toEqual([])
    expect(acts({ kind: 'not-yet' }, { asked: 'wash' })).toEqual([])
  })
})

describe('a pick', () => {
  it('answers the choices of the step that waits', () => {
    const asked: Situation = { waitingFor: 'check-cracks', asked: 'step' }
    expect(acts({ kind: 'choice', choice: 2, minutes: 2 }, asked)).toEqual([
      { kind: 'answer step', stepId: 'check-cracks', answer: 'choice-2' },
    ])
    expect(acts({ kind: 'choice' }, asked)).toEqual([
      { kind: 'answer step', stepId: 'check-cracks', answer: 'choice-1' },
    ])
  })

  it('where a step offers none is minutes, or a plain done', () => {
    expect(acts({ kind: 'choice', choice: 3, minutes: 3 }, { waitingFor: 'ask-flow' })).toEqual([
      { kind: 'answer step', stepId: 'ask-flow', answer: 'done', minutes: 3 },
    ])
    expect(acts({ kind: 'yes' }, { waitingFor: 'wash-fibre' })).toEqual([
      { kind: 'answer step', stepId: 'wash-fibre', answer: 'done' },
    ])
  })

  it('of no to a timed litre says that nothing comes; to a cure it is for a person', () => {
    expect(acts({ kind: 'no' }, { waitingFor: 'ask-flow' })).toEqual([
      { kind: 'answer step', stepId: 'ask-flow', answer: 'no' },
    ])
    expect(acts({ kind: 'no' }, { waitingFor: 'wash-fibre' })).toEqual(forAPerson)
  })

  it.each(['wash', 'flow'] as const)(
    'that is a bare number after %s was asked is minutes',
    (asked) => {
      expect(acts({ kind: 'choice', choice: 3, minutes: 3 }, { asked })).toEqual([
        close,
        { kind: 'log flow', minutes: 3, saysSlow: false },
      ])
    },
  )

  it.each(['change', 'step', 'none'] as const)(
    'that nothing offered is for a person after %s was asked',
    (asked) => {
      expect(acts({ kind: 'choice', choice: 3, minutes: 3 }, { asked })).toEqual(forAPerson)
      expect(acts({ kind: 'yes' }, { asked })).toEqual(forAPerson)
    },
  )

  it('for a step that is in no catalogue is for a person', () => {
    expect(acts({ kind: 'yes' }, { waitingFor: 'shake-it' })).toEqual(forAPerson)
  })
})

describe('the rest', () => {
  it.each(['need-part', 'ask', 'unclear'] as const)('is for a person: %s', (kind) => {
    expect(acts({ kind })).toEqual(forAPerson)
  })

  it('of thanks asks for nothing', () => {
    expect(acts({ kind: 'thanks' })).toEqual([])
  })

  it('that may mean stop or stopped is asked about too', () => {
    expect(acts({ kind: 'unclear' }, { mayMeanStop: true })).toEqual([
      ...forAPerson,
      { kind: 'send', moment: 'stop-or-stopped' },
    ])
  })
})
