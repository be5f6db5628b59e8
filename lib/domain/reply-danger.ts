import type { Mark } from './reply-marks'
import {
  areBeside,
  denied,
  gapBetween,
  isNamed,
  isSaid,
  said,
  sureOf,
  type Sense,
} from './reply-sense'

export type Danger = {
  kind: 'unwell' | 'broken' | 'odd-water'
  sure: number
  dangerSign?: boolean
}

/** Illness first, then a filter that must not be used, then water that must not be drunk. */
export function findDanger(sense: Sense): Danger | null {
  const found = [findIllness(sense), findBreach(sense), findOddWater(sense)]
  const dangers = found.filter((danger) => danger !== null)
  // A word that had to be guessed does not outrank one that stands as it is written.
  const best = Math.max(0, ...dangers.map((danger) => danger.sure))
  const danger = dangers.find((each) => each.sure > best - 0.15)
  if (danger === undefined) return null
  // "What if it cracks?" reports nothing; a person answers it.
  const isSupposed = isSaid(sense, 'if') && (sense.text.includes('?') || isSaid(sense, 'ask'))
  return isSupposed ? { ...danger, sure: 0.5 } : danger
}

function findIllness(sense: Sense): Danger | null {
  const signs = dangerSigns(sense)
  if (signs.length > 0) return { kind: 'unwell', sure: sureOf(0.9, signs), dangerSign: true }
  const ills = [...said(sense, 'ill', 'vomit', 'blood'), ...painMarks(sense), ...poorlyMarks(sense)]
  return ills.length > 0 ? { kind: 'unwell', sure: sureOf(0.9, ills) } : null
}

/** WHO IMCI (2014) general danger signs, and blood in the stool. */
function dangerSigns(sense: Sense): Mark[] {
  const patients = [
    ...said(sense, 'child', 'ill', 'vomit', 'sleepy', 'belly'),
    ...said(sense, 'person', 'pronoun'),
  ]
  const ill = said(sense, 'ill', 'vomit', 'stool', 'belly')
  const refusing = denied(sense, 'drink').filter(
    (mark) =>
      areBeside(sense, [mark], patients, 8) && !isNamed(sense, 'oddSmell', 'smell', 'taste', 'odd'),
  )
  const sleepy = said(sense, 'sleepy').filter((mark) =>
    areBeside(sense, [mark], [...patients, ...refusing], 8),
  )
  const bleeding = said(sense, 'blood').filter((mark) => areBeside(sense, [mark], ill, 8))
  const vomiting = said(sense, 'vomit').filter((mark) =>
    areBeside(sense, [mark], said(sense, 'all'), 3),
  )
  return [...said(sense, 'sign'), ...refusing, ...sleepy, ...bleeding, ...vomiting]
}

function painMarks(sense: Sense): Mark[] {
  return said(sense, 'pain').filter((mark) =>
    areBeside(sense, [mark], said(sense, 'belly', 'child'), 5),
  )
}

/** "Mi hijo está mal": something bad is said of a person, not of the water. */
function poorlyMarks(sense: Sense): Mark[] {
  const people = said(sense, 'child', 'person')
  const bad = [...said(sense, 'bad', 'frail'), ...denied(sense, 'good')]
  const things = said(sense, 'water', 'filter', 'piece', 'flow', 'smell', 'taste')
  return bad.filter((mark) =>
    people.some((person) => {
      const gap = gapBetween(sense, person, mark)
      const thingBetween = things.some((thing) => gapBetween(sense, thing, mark) <= gap)
      return gap <= 3 && !thingBetween
    }),
  )
}

function findBreach(sense: Sense): Danger | null {
  const edges = said(sense, 'edge')
  const oozing = said(sense, 'flow', 'drip').filter((mark) => areBeside(sense, [mark], edges, 4))
  const falls = said(sense, 'fall').filter((mark) => !isFallOfFlow(sense, mark))
  const marks = [
    ...said(sense, 'broken', 'leak', 'frozen', 'tooFast'),
    ...oozing,
    ...falls,
    ...rushes(sense),
  ]
  if (marks.length === 0) return null
  return { kind: 'broken', sure: isSaid(sense, 'mended') ? 0.55 : sureOf(0.9, marks) }
}

/** "The flow dropped" is slow; "the filter dropped" may have broken its fibres. */
export function isFallOfFlow(sense: Sense, fall: Mark): boolean {
  const subject = sense.marks
    .filter((mark) => mark.to <= fall.from && gapBetween(sense, mark, fall) <= 3)
    .filter((mark) =>
      ['water', 'flow', 'filter', 'piece', 'child', 'person', 'container'].includes(mark.concept),
    )
    .at(-1)
  return subject?.concept === 'water' || subject?.concept === 'flow'
}

/** "Very fast" suggests a breach, unless it is said with relief. */
function rushes(sense: Sense): Mark[] {
  if (isSaid(sense, 'good', 'better', 'thanks')) return []
  return said(sense, 'fast').filter((mark) =>
    said(sense, 'very').some((very) => very.to === mark.from || mark.to === very.from),
  )
}

function findOddWater(sense: Sense): Danger | null {
  const water = said(sense, 'water', 'flow', 'drink')
  const strong = said(sense, 'oddSmell', 'fuel')
  const smells = said(sense, 'smell', 'taste').filter(
    (mark) => !areBeside(sense, [mark], said(sense, 'good'), 3),
  )
  const things = said(sense, 'cloth', 'filter', 'piece', 'container', 'source')
  const coloured = said(sense, 'odd').filter(
    (mark) => things.length === 0 || areBeside(sense, [mark], water, 4),
  )
  const dirty = said(sense, 'dirty').filter((mark) => areBeside(sense, [mark], water, 3))
  const bad = said(sense, 'bad').filter(
    (mark) => areBeside(sense, [mark], said(sense, 'water'), 3) && !isNamed(sense, 'flow'),
  )
  // "No sale clara": the denial is of the clearness, not of the flow.
  const unclear = said(sense, 'clean').filter((mark) =>
    denied(sense, 'flow').some(
      (flow) => flow.to <= mark.from && gapBetween(sense, flow, mark) <= 2,
    ),
  )
  const notGood = [...denied(sense, 'clean'), ...unclear]
  const marks = [...strong, ...smells, ...coloured, ...bad, ...dirty, ...notGood]
  return marks.length > 0 ? { kind: 'odd-water', sure: sureOf(0.88, marks) } : null
}
