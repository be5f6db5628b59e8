import { describe, expect, it } from 'vitest'
import { fixedTextWords, isFixedMoment, wasToldToGo } from '@/lib/domain/fixed-texts'
import { refusalWords } from '@/lib/domain/refusal-words'
import { mayMeanStop } from '@/lib/domain/reply-stop'
import { readingWords, receiptOf } from '@/lib/domain/slip-words'

describe('what is known of a text on its way', () => {
  it.each([
    ['queued', 'ring', 'goes: 08:20'],
    ['sending', 'half', 'on its way'],
    ['sent', 'half', 'on its way'],
    ['in doubt', 'half', 'not known whether it went'],
    ['delivered', 'full', 'arrived'],
    ['failed', 'broken', 'failed: code 30005'],
    ['dropped', 'broken', 'not sent: code 30005'],
    ['not confirmed', 'broken', 'never confirmed'],
    ['received', 'half', 'not read yet'],
    ['read', 'full', 'read'],
  ] as const)('%s is a %s bead: %s', (state, receipt, receiptWords) => {
    const told = receiptOf(state, { why: 'code 30005', going: '08:20' })
    expect(told).toEqual({ receipt, receiptWords })
  })

  it('claims no reason where none is known', () => {
    expect(receiptOf('failed', { why: '', going: '' }).receiptWords).toBe('failed')
    expect(receiptOf('queued', { why: '', going: '' }).receiptWords).toBe('goes')
  })
})

describe('what a reply was taken to mean', () => {
  it.each([
    [{ kind: 'slow', minutes: 12, choice: null }, 'read as: 12 minutes a bottle'],
    [{ kind: 'choice', minutes: 2, choice: 2 }, 'read as: 2 minutes a bottle'],
    [{ kind: 'choice', minutes: null, choice: 2 }, 'read as: choice 2'],
    [{ kind: 'slow', minutes: null, choice: null }, 'read as: slow water'],
    [{ kind: 'unclear', minutes: null, choice: null }, 'read as: not clear: for a person to read'],
  ] as const)('%o: %s', (reading, words) => {
    expect(readingWords(reading)).toBe(words)
  })
})

describe('the fixed texts', () => {
  it('are those that are right at once', () => {
    expect(['unwell', 'unwell-now', 'stop-using', 'drink-advice'].every(isFixedMoment)).toBe(true)
    expect(isFixedMoment('wash-due')).toBe(false)
    expect(isFixedMoment(null)).toBe(false)
  })

  it.each([
    ['delivered', 'boil advice arrived 10:41'],
    ['sent', 'boil advice sent 10:41'],
    ['queued', 'boil advice on its way'],
    ['sending', 'boil advice on its way'],
    ['in doubt', 'boil advice: not known whether it went'],
    ['failed', 'boil advice not sent'],
    ['dropped', 'boil advice not sent'],
  ])('that are %s: %s', (state, words) => {
    expect(fixedTextWords('drink-advice', state, '10:41')).toBe(words)
  })

  it('tell nobody to go to the health worker while they wait', () => {
    const text = (state: string) => [{ moment: 'unwell-now', state }]
    expect(wasToldToGo(text('sent'))).toBe(true)
    expect(wasToldToGo(text('delivered'))).toBe(true)
    for (const state of ['queued', 'sending', 'in doubt', 'failed', 'dropped']) {
      expect(wasToldToGo(text(state))).toBe(false)
    }
    expect(wasToldToGo([{ moment: 'unwell', state: 'delivered' }])).toBe(false)
    expect(wasToldToGo([])).toBe(false)
  })
})

describe('a refusal', () => {
  it('says why in words, and says what has none as it is', () => {
    expect(refusalWords('taken by another')).toBe('A colleague has this ticket.')
    expect(refusalWords('something else')).toBe('something else')
  })
})

describe('words that may mean stop or stopped', () => {
  it.each([
    'it stopped',
    'STOP the water',
    'water stops',
    'se paró',
    'dejó de salir',
    'arrêté',
    'বন্ধ হয়ে গেছে',
  ])('are asked about: %s', (text) => {
    expect(mayMeanStop(text)).toBe(true)
  })

  it.each(['step', 'stoppage', 'slow water', 'ça va', 'listo'])('are not found in: %s', (text) => {
    expect(mayMeanStop(text)).toBe(false)
  })
})
