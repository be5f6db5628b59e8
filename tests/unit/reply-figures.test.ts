import { describe, expect, it } from 'vitest'
import type { Language } from '@/lib/domain/language'
import { readFigures } from '@/lib/domain/reply-figures'
import { tokenise } from '@/lib/domain/reply-tokens'

function minutesOf(text: string, language: Language = 'en'): number[] {
  return readFigures(tokenise(text), language).spans.map((span) => span.minutes)
}

describe('a span of time', () => {
  it.each<[string, Language, number]>([
    ['7 minutes', 'en', 7],
    ['7min', 'en', 7],
    ['half an hour', 'en', 30],
    ['an hour and a half', 'en', 90],
    ['an hour and 10 minutes', 'en', 70],
    ['1h30', 'en', 90],
    ['4 min 30 s', 'en', 4.5],
    ['4mn30', 'fr', 4.5],
    ['4\'30"', 'en', 4.5],
    ['45"', 'en', 0.75],
    ['2½ minutes', 'en', 2.5],
    ['1/2 hour', 'en', 30],
    ['90 seconds', 'en', 1.5],
    ['twenty five minutes', 'en', 25],
    ['two and a half minutes', 'en', 2.5],
    ['2,5 minutos', 'es', 2.5],
    ['treinta y cinco minutos', 'es', 35],
    ['media hora', 'es', 30],
    ['hora y media', 'es', 90],
    ['tres cuartos de hora', 'es', 45],
    ['4 minutos y medio', 'es', 4.5],
    ['une demi-heure', 'fr', 30],
    ["trois quarts d'heure", 'fr', 45],
    ['quatre-vingt-dix secondes', 'fr', 1.5],
    ['dix-sept minutes', 'fr', 17],
    ['une heure et demie', 'fr', 90],
    ['১২ মিনিট', 'bn', 12],
    ['আধা ঘণ্টা', 'bn', 30],
    ['দেড় ঘন্টা', 'bn', 90],
    ['সাড়ে চার মিনিট', 'bn', 4.5],
    ['পৌনে এক ঘণ্টা', 'bn', 45],
    ['সোয়া এক ঘণ্টা', 'bn', 75],
    ['adha ghonta', 'bn', 30],
    ['share char minit', 'bn', 4.5],
    ['bish minit', 'bn', 20],
  ])('"%s" (%s) is %d minutes', (text, language, minutes) => {
    expect(minutesOf(text, language)).toEqual([expect.closeTo(minutes, 6)])
  })

  it('is not made of people, litres, strokes or a rate', () => {
    for (const text of ['5 people', '2 litres', '10 strokes', '3 times', 'one cup an hour']) {
      const figures = readFigures(tokenise(text), 'en')
      expect(figures.spans).toEqual([])
      expect(figures.bare).toEqual([])
    }
    expect(readFigures(tokenise('one cup an hour'), 'en').hasRate).toBe(true)
    expect(readFigures(tokenise('una taza por hora'), 'es').hasRate).toBe(true)
  })
})

describe('a number without a unit', () => {
  const bareOf = (text: string, language: Language = 'en') =>
    readFigures(tokenise(text), language).bare.map((bare) => bare.value)

  it('is read in any digits', () => {
    for (const text of ['12', '१२', '১২', '١٢', '１２', '۱۲']) expect(bareOf(text)).toEqual([12])
    expect(bareOf('4:30')).toEqual([4.5])
    expect(bareOf('2,5')).toEqual([2.5])
  })

  it('is an article within a sentence and a figure alone', () => {
    expect(bareOf('one')).toEqual([1])
    expect(bareOf('one of us')).toEqual([])
    expect(bareOf('the new one')).toEqual([])
  })

  it('is no refusal of another language', () => {
    expect(bareOf('no')).toEqual([])
    expect(bareOf('no', 'bn')).toEqual([])
  })

  it('of several points is none', () => {
    expect(bareOf('1.2.3')).toEqual([])
  })
})
