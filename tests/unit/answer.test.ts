import { describe, expect, it } from 'vitest'
import { answerTo, type AnswerInput } from '@/lib/domain/answer'

function input(part: Partial<AnswerInput>): AnswerInput {
  return {
    reading: { kind: 'not-yet', sure: 0.9 },
    asked: 'step',
    waitingFor: 'wash-fibre',
    hasOpenTicket: true,
    handledByCarrier: false,
    mayMeanStop: false,
    ...part,
  }
}

describe('a household that puts a step off', () => {
  it('is waited for: "later" is no refusal of the step', () => {
    expect(answerTo(input({}))).toEqual([])
  })

  it('answers the step when it has been done', () => {
    expect(answerTo(input({ reading: { kind: 'done', sure: 0.9 } }))).toEqual([
      { kind: 'answer step', stepId: 'wash-fibre', answer: 'done' },
    ])
  })

  it('keeps its wash prompt open', () => {
    expect(answerTo(input({ asked: 'wash', waitingFor: null, hasOpenTicket: false }))).toEqual([])
  })
})

describe('a text that nobody could read', () => {
  it.each([true, false])(
    'asks about "stop" only where the word may be meant: %s',
    (mayMeanStop) => {
      const acts = answerTo(input({ reading: { kind: 'unclear', sure: 0.3 }, mayMeanStop }))
      expect(acts.some((act) => act.kind === 'send')).toBe(mayMeanStop)
    },
  )
})
