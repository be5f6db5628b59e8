import { describe, expect, it } from 'vitest'
import { chancesFrom, learn, type Example } from '@/lib/domain/reply-learning'
import { isOfRules } from '@/lib/domain/reply-traits'

const example = (kind: Example['kind'], traits: string[], isKnown = false): Example => ({
  kind,
  traits: ['any', ...traits],
  isKnown,
})

const taught = [
  ...['a', 'b', 'c'].map((one) => example('slow', ['word slow', `word ${one}`])),
  ...['a', 'b', 'c'].map((one) => example('done', ['word done', `word ${one}`])),
  ...['a', 'b', 'c'].map((one) => example('unwell', ['word ill', `word ${one}`])),
]

function likeliest(examples: readonly Example[], traits: readonly string[]) {
  const learned = learn(examples)
  const places = traits.map((trait) => learned.traits.indexOf(trait)).filter((at) => at >= 0)
  const chances = chancesFrom(places, learned)
  const most = Math.max(...chances)
  return { kind: learned.kinds[chances.indexOf(most)], chance: most, chances, learned }
}

describe('learning from examples', () => {
  it.each([
    ['word slow', 'slow'],
    ['word done', 'done'],
    ['word ill', 'unwell'],
  ])('a text with %s is most likely %s', (trait, kind) => {
    const read = likeliest(taught, ['any', trait, 'word a'])
    expect(read.kind).toBe(kind)
    expect(read.chance).toBeGreaterThan(0.7)
  })

  it('gives chances that sum to 1, and doubts a text of no known trait', () => {
    const { chances, chance } = likeliest(taught, ['word never heard'])
    expect(chances.reduce((sum, one) => sum + one, 0)).toBeCloseTo(1, 9)
    expect(chance).toBeLessThan(0.5)
  })

  it('gives the same weights for the same examples', () => {
    expect([...learn(taught).weights]).toEqual([...learn(taught).weights])
  })

  it('counts no trait of a single text', () => {
    const { traits } = learn([...taught, example('slow', ['word once'])])
    expect(traits).not.toContain('word once')
    expect(traits).toContain('word a')
  })

  it('does not count what the rules made of texts that the rules were written by', () => {
    const rule = 'rule reads slow'
    expect(isOfRules(rule)).toBe(true)
    const known = taught.map((one) => ({ ...one, isKnown: true, traits: [...one.traits, rule] }))
    expect(learn(known).traits).not.toContain(rule)
    const fresh = known.map((one) => ({ ...one, isKnown: false }))
    expect(learn(fresh).traits).toContain(rule)
  })
})
