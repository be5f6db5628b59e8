import type { Danger } from './reply-danger-kind'
import type { Mark } from './reply-marks'
import { areBeside, denied, gapBetween, isNamed, said, sureOf, type Sense } from './reply-sense'
import type { Concept } from './reply-words/concept'

/** Illness in the house, and whether it shows a general danger sign. */
export function findIllness(sense: Sense): Danger | null {
  const signs = dangerSigns(sense)
  if (signs.length > 0) return { kind: 'unwell', sure: sureOf(0.9, signs), dangerSign: true }
  const ills = [
    ...said(sense, 'ill', 'vomit', 'blood').filter((mark) => !isOfAnimal(sense, mark)),
    ...beside(sense, ['pain'], ['belly', 'child'], 5),
    ...beside(sense, ['belly'], ['problem', 'bad', 'long'], 4),
    ...beside(sense, ['stool'], ['water', 'long'], 4),
    ...often(sense),
    ...beside(sense, ['body'], ['odd', 'pain', 'bad', 'frail', 'dirty'], 3),
    ...(isNamed(sense, 'wrongNumber', 'business') ? [] : said(sense, 'care')).filter(
      (mark) => !isLikened(sense, mark),
    ),
    ...poorlyMarks(sense),
  ]
  if (ills.length > 0) return { kind: 'unwell', sure: sureOf(0.9, ills) }
  const bellies = beside(sense, ['belly'], ['child', 'person'], 4)
  return bellies.length > 0 ? { kind: 'unwell', sure: sureOf(0.65, bellies) } : null
}

/** "Has been running to the toilet since last night". */
function often(sense: Sense): Mark[] {
  if (!isNamed(sense, 'child', 'person', 'pronoun')) return []
  return beside(sense, ['stool'], ['flow', 'ago', 'very', 'all', 'past', 'again', 'stopWord'], 4)
}

/** "Our goat is sick". */
function isOfAnimal(sense: Sense, mark: Mark): boolean {
  const animals = said(sense, 'animal').map((animal) => gapBetween(sense, animal, mark))
  const people = said(sense, 'child', 'person', 'stool', 'belly')
  const nearest = Math.min(...people.map((person) => gapBetween(sense, person, mark)))
  return animals.some((gap) => gap <= 4 && gap < nearest)
}

/** "It drips like a hospital drip". */
function isLikened(sense: Sense, mark: Mark): boolean {
  return [1, 2].some((back) => likeWords.has(sense.tokens[mark.from - back]?.text ?? ''))
}

const likeWords = new Set(['like', 'como', 'comme'])

function beside(sense: Sense, ones: Concept[], others: Concept[], reach: number): Mark[] {
  return said(sense, ...ones).filter((mark) =>
    areBeside(sense, [mark], said(sense, ...others), reach),
  )
}

/** WHO IMCI (2014) general danger signs, and blood in the stool. */
function dangerSigns(sense: Sense): Mark[] {
  const people: Concept[] = ['child', 'person', 'pronoun']
  const isOfWater = isNamed(sense, 'oddSmell', 'smell', 'taste', 'odd')
  const patients = said(sense, ...people, 'ill', 'vomit', 'sleepy', 'belly', 'breast')
  const refusing = denied(sense, 'drink').filter((mark) => areBeside(sense, [mark], patients, 8))
  const sleepy = said(sense, 'sleepy').filter((mark) =>
    areBeside(sense, [mark], [...patients.filter((other) => other !== mark), ...refusing], 8),
  )
  // "He is soft and all bent" is the filter by the fire.
  const bodies: Concept[] = isNamed(sense, 'broken') ? ['child', 'person'] : people
  const limp = beside(sense, ['limp'], bodies, 10)
  return [
    // "The seal is dead".
    ...said(sense, 'sign').filter(
      (mark) => !said(sense, 'piece').some((piece) => piece.to === mark.from),
    ),
    ...(isOfWater ? [] : refusing),
    ...sleepy,
    ...unfed(sense),
    ...unroused(sense),
    ...limp,
    ...beside(sense, ['frail', 'sleepy'], ['drink'], 4),
    ...beside(sense, ['blood'], ['ill', 'vomit', 'stool', 'belly'], 8),
    ...beside(sense, ['vomit'], ['all'], 3),
  ]
}

const denials: Concept[] = ['not', 'notAround', 'notPlus', 'notBack', 'ceased', 'lack']

/** "Won't take the breast". */
function unfed(sense: Sense): Mark[] {
  const refused: Concept[] = isNamed(sense, 'child') ? [...denials, 'notNext'] : denials
  return beside(sense, ['breast'], refused, 4)
}

/** "Cannot wake him": not of a phone that nobody answers. */
function unroused(sense: Sense): Mark[] {
  const things = said(sense, 'texts', 'phone', 'water', 'filter')
  // "Ne se réveille pas bien": badly counts as not.
  const badly = beside(sense, ['wake'], ['bad'], 0)
  return [...denied(sense, 'wake'), ...badly].filter((mark) => !areBeside(sense, [mark], things, 8))
}

/** "Mi hijo está mal": something bad is said of a person, not of the water. */
function poorlyMarks(sense: Sense): Mark[] {
  const people = said(sense, 'child', 'person')
  const bad = [...said(sense, 'bad', 'frail'), ...denied(sense, 'good')]
  const things = said(sense, 'water', 'filter', 'piece', 'flow', 'smell', 'taste', 'phone')
  return bad.filter((mark) =>
    people.some((person) => {
      const gap = gapBetween(sense, person, mark)
      const thingBetween = things.some((thing) => gapBetween(sense, thing, mark) <= gap)
      return gap <= 4 && !thingBetween
    }),
  )
}
