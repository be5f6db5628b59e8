import type { Danger } from './reply-danger-kind'
import type { Mark } from './reply-marks'
import { areBeside, denied, gapBetween, isSaid, said, sureOf, type Sense } from './reply-sense'
import type { Concept } from './reply-words/concept'

/** A filter that must not be used: broken, leaking, fallen, frozen, or running too fast. */
export function findBreach(sense: Sense): Danger | null {
  const edges = said(sense, 'edge')
  const outlets = said(sense, 'outlet')
  const sealed = said(sense, 'piece').filter(
    (mark) => !outlets.some((outlet) => outlet.from === mark.from),
  )
  // "We passed the night outside".
  const isOfPeople =
    isSaid(sense, 'person', 'child') && !isSaid(sense, 'water', 'filter', 'piece', 'container')
  const oozing = [
    ...said(sense, 'flow', 'drip').filter(
      (mark) =>
        areBeside(sense, [mark], edges, 4) &&
        !isOfPeople &&
        !areBeside(sense, [mark], said(sense, 'good', 'better'), 2),
    ),
    ...said(sense, 'drip').filter((mark) => areBeside(sense, [mark], sealed, 3)),
  ]
  const falls = said(sense, 'fall').filter((mark) => !isFallOfFlow(sense, mark))
  // "Smells of puddle", "tastes like a wet dog".
  const savours = said(sense, 'oddSmell', 'smell', 'taste')
  const isSavour = (mark: Mark): boolean =>
    savours.some((savour) => savour.to <= mark.from && gapBetween(sense, savour, mark) <= 1)
  const marks = [
    ...said(sense, 'broken', 'leak').filter((mark) => !isElsewhere(sense, mark)),
    ...said(sense, 'frozen'),
    // "Dripping like a tap".
    ...said(sense, 'tooFast').filter((mark) => !areBeside(sense, [mark], said(sense, 'drip'), 1)),
    // "The upper one overflows, the lower one is empty": it does not run.
    ...(isSaid(sense, 'none') ? [] : said(sense, 'overflow')),
    ...oozing,
    ...said(sense, 'ooze').filter((mark) => isOfBody(sense, mark)),
    ...falls.filter((mark) => !isElsewhere(sense, mark)),
    ...rushes(sense),
    ...chewed(sense),
  ].filter((mark) => !isSavour(mark))
  if (marks.length === 0) return null
  // "Very fast, thank you" may be joy over a washed filter; a mended leak may be none. A person asks.
  const isRushOnly = marks.every((mark) => mark.concept === 'fast') && isSaid(sense, 'thanks')
  // A torn cloth or a spoiled syringe that they ask a new one for is no breach, yet near enough for a person to look.
  const tools = said(sense, 'tool')
  const pieces = said(sense, 'piece', 'filter').filter(
    (mark) => !tools.some((tool) => tool.from === mark.from),
  )
  // "The whole yard has fallen": of what nobody here knows.
  const isStrangeFall =
    marks.every((mark) => mark.concept === 'fall') &&
    sense.unknownWords > 0 &&
    !isSaid(sense, ...own, 'pronoun', 'child', 'person')
  const isCloth = isSaid(sense, 'cloth', 'tool') && isSaid(sense, 'need') && pieces.length === 0
  return {
    kind: 'broken',
    sure:
      isRushOnly || isCloth || isStrangeFall || isSaid(sense, 'mended') ? 0.55 : sureOf(0.9, marks),
  }
}

/** "The tap oozes" leaks; of the water after a wash, oozing is slow. */
export function isOfBody(sense: Sense, ooze: Mark): boolean {
  const isAfterCare = ['wash', 'change'].includes(sense.asked) || isSaid(sense, 'done', 'slow')
  const body = said(sense, 'piece', 'edge', 'container', 'filter')
  return areBeside(sense, [ooze], body, 4) || !(isAfterCare || isSaid(sense, 'water'))
}

/** "The puppy got to the tube": whatever it did to it. */
function chewed(sense: Sense): Mark[] {
  if (isSaid(sense, 'ask', 'where', 'ill')) return []
  return said(sense, 'animal').filter((mark) => areBeside(sense, [mark], said(sense, 'piece'), 4))
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

const own: Concept[] = ['filter', 'piece', 'container', 'cloth', 'tool']
const foreign: Concept[] = ['elsewhere', 'source', 'phone']

/** "The tubewell is broken", "my phone fell": said of another thing than the filter. */
function isElsewhere(sense: Sense, mark: Mark): boolean {
  const things = said(sense, ...own, ...foreign)
    .filter((thing) => thing.from !== mark.from && gapBetween(sense, thing, mark) <= 3)
    .sort((one, other) => nearness(sense, one, mark) - nearness(sense, other, mark))
  const [nearest] = things
  const names = things.filter((thing) => thing.from === nearest?.from).map((one) => one.concept)
  return names.some((name) => foreign.includes(name)) && !names.includes('container')
}

/** "Was always 5 minutes, today 10 seconds". */
function isFarFromBefore({ figures }: Sense): boolean {
  const all = [
    ...figures.spans.map((span) => span.minutes),
    ...figures.bare.map((one) => one.value),
  ]
  return Math.max(...all) >= Math.min(...all) * 8
}

/** What stands before a verb is rather its subject than what follows. */
function nearness(sense: Sense, thing: Mark, mark: Mark): number {
  return gapBetween(sense, thing, mark) + (thing.from < mark.from ? 0 : 1.5)
}

/** "Very fast" or "suddenly fast" suggests a breach, unless it is said with relief. */
function rushes(sense: Sense): Mark[] {
  const isRelief =
    isSaid(sense, 'good', 'better') || (isSaid(sense, 'done') && isSaid(sense, 'thanks'))
  if (isRelief) return []
  const isInNoTime = sense.figures.spans.some((span) => span.minutes > 0 && span.minutes <= 1)
  const isTooSoon = sense.figures.spans.some((span) => span.minutes > 0 && span.minutes <= 0.5)
  return [
    // "15 seconds, that cannot be right".
    ...(isTooSoon ? [...denied(sense, 'good', 'yes'), ...said(sense, 'bad')] : []),
    ...(isTooSoon && isFarFromBefore(sense) ? said(sense, 'now', 'past') : []),
    ...said(sense, 'fast').filter((mark) =>
      said(sense, 'very', 'sudden').some((word) => gapBetween(sense, word, mark) === 0),
    ),
    ...(isInNoTime || isSaid(sense, 'fast') ? said(sense, 'sudden') : []),
  ]
}
