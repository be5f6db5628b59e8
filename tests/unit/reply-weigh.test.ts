import { describe, expect, it } from 'vitest'
import type { ReplyKind, ReplyReading } from '@/lib/domain/reply-kind'
import { senseOf } from '@/lib/domain/reply-sense'
import { weigh, type Chance } from '@/lib/domain/reply-weigh'

const words = (kind: ReplyKind, more: Partial<ReplyReading> = {}): ReplyReading => ({
  kind,
  sure: 0.85,
  ...more,
})

/** The likeliest first; what is left is spread over a kind that harms nobody. */
const chances = (...given: [ReplyKind, number][]): Chance[] => {
  const rest = 1 - given.reduce((sum, [, chance]) => sum + chance, 0)
  return [...given, ['thanks', rest] as [ReplyKind, number]]
    .map(([kind, chance]) => ({ kind, chance }))
    .sort((one, other) => other.chance - one.chance)
}

const read = (text: string, byWords: ReplyReading, likely: Chance[]) =>
  weigh(senseOf(text, 'en', 'wash'), byWords, likely)

describe('one reading from two', () => {
  it.each<[string, ReplyReading, Chance[], ReplyKind]>([
    ['both say so', words('slow'), chances(['slow', 0.7]), 'slow'],
    ['both say so, hardly', words('slow'), chances(['slow', 0.45]), 'unclear'],
    ['the examples alone are sure', words('unclear'), chances(['slow', 0.8]), 'slow'],
    ['the examples alone are not', words('ask'), chances(['slow', 0.55]), 'unclear'],
    ['danger is not ruled out', words('done'), chances(['done', 0.7], ['unwell', 0.25]), 'unclear'],
    ['the words see danger', words('broken'), chances(['done', 0.8]), 'unclear'],
    ['danger is all but ruled out', words('broken'), chances(['done', 0.98]), 'done'],
    ['only the examples see an end', words('unclear'), chances(['stop', 0.9]), 'unclear'],
    ['both see an end', words('stop'), chances(['stop', 0.75]), 'stop'],
    ['an end beside a danger', words('stop'), chances(['stop', 0.4], ['broken', 0.5]), 'stop'],
    ['an end that hardly is one', words('stop'), chances(['stop', 0.6], ['done', 0.3]), 'unclear'],
    ['no word is known', words('unclear'), chances(['slow', 0.8]), 'unclear'],
    ['danger is seen by the examples', words('done'), chances(['unwell', 0.8]), 'unwell'],
    ['unclear is likeliest', words('yes'), chances(['unclear', 0.8]), 'unclear'],
  ])('%s', (title, byWords, likely, kind) => {
    const text = title === 'no word is known' ? 'zorblax frotz' : 'water'
    expect(read(text, byWords, likely).kind).toBe(kind)
  })

  it('is never sure of what a person is to read', () => {
    expect(read('water', words('slow'), chances(['slow', 0.45])).sure).toBeLessThan(0.6)
    expect(read('water', words('broken'), chances(['done', 0.8])).sure).toBeLessThan(0.6)
  })

  it('takes the figure from the text, and is unclear where there is none', () => {
    const likely = chances(['flow-figure', 0.9])
    expect(read('it took 12 minutes', words('slow'), likely)).toMatchObject({
      kind: 'flow-figure',
      minutes: 12,
    })
    expect(read('it took long', words('slow'), likely).kind).toBe('unclear')
  })

  it('takes a bare figure as the choice that was asked', () => {
    const likely = chances(['choice', 0.9])
    expect(read('2', words('flow-figure'), likely)).toMatchObject({ kind: 'choice', choice: 2 })
    expect(read('7', words('flow-figure'), likely).kind).toBe('unclear')
  })

  it('keeps a danger sign that is in the text', () => {
    const likely = chances(['unwell', 0.9])
    expect(read('the baby has convulsions', words('ask'), likely)).toMatchObject({
      kind: 'unwell',
      dangerSign: true,
    })
    expect(read('my son has a fever', words('ask'), likely)).not.toHaveProperty('dangerSign')
  })

  it('tells that the water is slow as well', () => {
    expect(read('slow and it leaks', words('slow'), chances(['broken', 0.9]))).toMatchObject({
      kind: 'broken',
      alsoSlow: true,
    })
  })
})
