import { describe, expect, it } from 'vitest'
import { pickedAfter, type Picked } from '@/components/reply-words/picked'
import type { ReplyReading } from '@/lib/domain/reply'
import { replyEffect } from '@/lib/domain/reply-effect'
import { meaningWords } from '@/lib/domain/reply-meaning-words'

const reading = (kind: ReplyReading['kind'], more: Partial<ReplyReading> = {}): ReplyReading => ({
  kind,
  sure: 0.9,
  ...more,
})
const slow = reading('slow')
const ill = reading('unwell')
const thanks = reading('thanks')

describe('what words would change', () => {
  it('counts what is taken for something else, not how sure that is', () => {
    const reads = [
      { text: 'a', before: slow, after: { ...slow, sure: 0.7 } },
      { text: 'b', before: slow, after: thanks },
      { text: 'c', before: reading('flow-figure', { minutes: 4 }), after: reading('flow-figure') },
      { text: 'd', before: ill, after: reading('unwell', { dangerSign: true }) },
    ]
    expect(replyEffect(reads, 10)).toMatchObject({ looked: 4, changed: 3, calmed: 0 })
  })

  it('puts texts on top whose danger would no longer be seen, however many they are', () => {
    const reads = [
      { text: 'a', before: slow, after: thanks },
      { text: 'b', before: ill, after: thanks },
      { text: 'c', before: ill, after: reading('broken') },
      { text: 'd', before: reading('unwell', { dangerSign: true }), after: ill },
    ]
    const { calmed, some } = replyEffect(reads, 2)
    expect(calmed).toBe(2)
    expect(some.map(({ text }) => text)).toEqual(['b', 'd'])
  })
})

describe('a reading in words', () => {
  it.each([
    [slow, 'slow water'],
    [reading('unwell', { dangerSign: true }), 'someone unwell, with a danger sign'],
    [
      reading('broken', { alsoSlow: true, minutes: 12.26 }),
      'something broken, 12.3 minutes a bottle, and slow water',
    ],
    [reading('unclear'), 'not clear'],
    [reading('choice', { choice: 2, minutes: 2 }), 'choice 2'],
    [{ kind: 'slow' as const, minutes: null, choice: null }, 'slow water'],
  ])('%j is “%s”', (read, words) => {
    expect(meaningWords(read)).toBe(words)
  })
})

describe('words picked in a row', () => {
  const row = (from: number, to: number): Picked => ({ from, to })

  it.each([
    [null, 3, row(3, 4)],
    [row(3, 4), 4, row(3, 5)],
    [row(3, 4), 2, row(2, 4)],
    [row(3, 4), 3, null],
    [row(3, 6), 3, row(4, 6)],
    [row(3, 6), 5, row(3, 5)],
    [row(3, 6), 4, row(4, 5)],
    [row(3, 4), 6, row(6, 7)],
    [row(3, 7), 7, row(7, 8)],
    [row(3, 7), 2, row(2, 3)],
  ])('%j and then the word at %i: %j', (before, at, after) => {
    expect(pickedAfter(before, at)).toEqual(after)
  })
})
