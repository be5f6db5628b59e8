import type { Mark } from './reply-marks'
import { isFallOfFlow, isOfBody } from './reply-breach'
import {
  areBeside,
  denied,
  gapBetween,
  isDenied,
  isNamed,
  isSaid,
  said,
  sureOf,
  type Sense,
} from './reply-sense'

/** Sureness that no water comes at all. */
export function noFlowSureness(sense: Sense): number {
  const water = said(sense, 'water', 'flow', 'fill', 'container')
  const dry = denied(sense, 'water', 'flow', 'fill').filter((mark) => !isQualified(sense, mark))
  const idle = denied(sense, 'fall').filter((mark) =>
    areBeside(sense, [mark], said(sense, 'outlet'), 5),
  )
  // Bengali "khali" is "empty" and "only": "only drops".
  const none = said(sense, 'none').filter(
    (mark) =>
      (!isSaid(sense, 'drip') &&
        areBeside(sense, [mark], [...water, ...said(sense, 'outlet', 'edge')], 4)) ||
      areBeside(sense, [mark], said(sense, 'fill'), 8),
  )
  // French water "falls": "rien qui tombe".
  const falling = said(sense, 'fall').filter((mark) =>
    areBeside(sense, [mark], said(sense, 'none'), 2),
  )
  const lacking = said(sense, 'lack').filter((mark) =>
    areBeside(sense, [mark], said(sense, 'water'), 3),
  )
  // "The water does not move": the words that are a danger sign of a child.
  const still = said(sense, 'limp').filter(
    (mark) =>
      areBeside(sense, [mark], water, 5) &&
      !said(sense, 'slow').some((slow) => slow.from === mark.from),
  )
  // "0 water".
  const isZero = sense.tokens.some((token) => token.kind === 'number' && token.value === 0)
  if (isZero && water.length > 0 && sense.words <= 4) return 0.8
  const strong = [
    ...dry,
    ...none,
    ...falling,
    ...idle,
    ...lacking,
    ...still,
    ...said(sense, 'dry'),
    // "Still blocked, only drops".
    ...(isSaid(sense, 'drip', 'slow') ? [] : said(sense, 'blocked')),
  ].filter((mark) => !isAlmost(sense, mark) && !isOfTool(sense, mark))
  if (isSoundAnswer(sense)) return 0
  if (strong.length > 0) return sureOf(0.85, strong)
  if (hasBareNothing(sense)) return 0.75
  if (!isSaid(sense, 'none') || isNamed(sense, 'done', 'wash', 'change', 'notYet', 'ask')) return 0
  if (isSaid(sense, 'no') && !isSaid(sense, 'water', 'flow')) return 0
  // "Nothing broken".
  if (isDenied(sense, 'broken', 'leak', 'fall', 'frozen', 'odd', 'ill')) return 0
  const isAnswer = sense.asked === 'flow' || sense.asked === 'step'
  if (isAnswer) return sense.words <= 4 ? 0.7 : 0
  return sense.words >= 2 && sense.words <= 4 && sense.unknownWords <= 1 ? 0.62 : 0
}

/** "The syringe is stuck, send one": it is the syringe that lets nothing through. */
function isOfTool(sense: Sense, mark: Mark): boolean {
  return isSaid(sense, 'need') && areBeside(sense, [mark], said(sense, 'tool'), 3)
}

/** "Not cracked, not leaking, nothing" answers what a step asks. */
function isSoundAnswer(sense: Sense): boolean {
  const sound = denied(sense, 'broken', 'leak', 'fall', 'frozen')
  return sense.asked === 'step' && sound.length > 0 && !isSaid(sense, 'but', 'water', 'flow')
}

/** "Almost no water": little, not none. */
function isAlmost(sense: Sense, mark: Mark): boolean {
  return said(sense, 'almost').some((almost) => gapBetween(sense, almost, mark) <= 2)
}

/** "Opened the tap as you said. Nothing": a sentence by itself after what was done. */
function hasBareNothing(sense: Sense): boolean {
  const isEdge = (at: number): boolean =>
    (sense.tokens[at]?.kind ?? 'break') === 'break' ||
    said(sense, 'and').some((mark) => mark.from === at)
  return (
    ['wash', 'change', 'step'].includes(sense.asked) &&
    said(sense, 'none').some((none) => none.from > 2 && isEdge(none.from - 1) && isEdge(none.to))
  )
}

/** "Not flowing well" is slow: the denial is of the manner, not of the flow. */
function isQualified(sense: Sense, flow: Mark): boolean {
  if (flow.concept === 'water') {
    return said(sense, 'very', 'little').some(
      (mark) => mark.to <= flow.from && flow.from - mark.to <= 1,
    )
  }
  return said(sense, 'good', 'fast', 'better', 'little', 'very', 'same', 'long', 'slow').some(
    // Bengali puts the manner before the verb.
    (mark) =>
      gapBetween(sense, flow, mark) <= 3 &&
      (flow.language === 'bn' ? mark.to <= flow.from : mark.from >= flow.to),
  )
}

/** Sureness that water comes too slowly. */
export function slowSureness(sense: Sense): number {
  if (isOver(sense)) return 0
  const water = said(sense, 'water', 'flow', 'drip')
  const little = said(sense, 'little').filter((mark) => areBeside(sense, [mark], water, 3))
  // "Coule bien mais peu".
  const butLittle = said(sense, 'little').filter((mark) =>
    said(sense, 'but').some((but) => but.to <= mark.from && gapBetween(sense, but, mark) <= 2),
  )
  const weakly = denied(sense, 'water', 'flow', 'fill').filter((mark) => isQualified(sense, mark))
  const scarcely = [
    ...denied(sense, 'water', 'flow', 'fill'),
    ...said(sense, 'dry', 'none'),
  ].filter((mark) => isAlmost(sense, mark))
  // "Explain slowly".
  const slow = said(sense, 'slow').filter(
    (mark) => !areBeside(sense, [mark], said(sense, 'explain'), 1) || water.length > 0,
  )
  // "A little better": not yet well.
  const hardlyBetter = said(sense, 'better').filter((mark) =>
    said(sense, 'little').some((few) => gapBetween(sense, few, mark) === 0),
  )
  // "Like nothing is inside; it used to drip".
  const bygone = said(sense, 'past').filter((mark) => sense.words > 8 && mark.from > 2)
  const drips = said(sense, 'drip').filter(
    (mark) =>
      !bygone.some((past) => past.to <= mark.from && gapBetween(sense, past, mark) <= 1) &&
      !isStopped(sense, mark),
  )
  const badly = [...said(sense, 'bad'), ...denied(sense, 'good')].filter((mark) =>
    areBeside(sense, [mark], said(sense, 'flow', 'current'), 3),
  )
  const falls = said(sense, 'fall').filter((mark) => isFallOfFlow(sense, mark))
  const marks = [
    ...slow,
    ...scarcely,
    ...hardlyBetter,
    ...drips,
    ...said(sense, 'long'),
    ...said(sense, 'ooze').filter((mark) => !isOfBody(sense, mark)),
    ...unfilled(sense),
    ...spent(sense),
    ...denied(sense, 'fast', 'tooFast', 'better'),
    ...little,
    ...butLittle,
    ...weakly,
    ...badly,
    ...falls,
  ]
  if (marks.length > 0) return sureOf(0.85, marks)
  // "One cup an hour" complains, whatever the cup.
  if (sense.figures.hasRate) return 0.65
  const isStep = sense.asked === 'step'
  const isAfterCare = isSaid(sense, 'still', 'but', 'done', 'wash')
  if (isSaid(sense, 'same') && (isStep || isAfterCare)) return 0.7
  return isStep && isSaid(sense, 'little') && sense.words <= 3 ? 0.65 : 0
}

/** "Tightened it and the drip stopped". */
function isStopped(sense: Sense, drip: Mark): boolean {
  const isMended = sense.asked === 'step' && isSaid(sense, 'done')
  return isMended && areBeside(sense, [drip], said(sense, 'ceased', 'itStopped'), 2)
}

/** "It has lost its strength", "by the time I have a cup". */
function spent(sense: Sense): Mark[] {
  const losses = sense.marks.filter((mark) =>
    ['not', 'notNext', 'notAround', 'notPlus', 'notBack', 'lack', 'lost', 'little'].includes(
      mark.concept,
    ),
  )
  const weak = said(sense, 'strength').filter((mark) => areBeside(sense, [mark], losses, 3))
  const vessels = said(sense, 'cup', 'container', 'fill')
  return [...weak, ...(vessels.length > 0 ? said(sense, 'meanwhile') : [])]
}

/** "The bottle is not even half full", "still half". */
function unfilled(sense: Sense): Mark[] {
  const denials = sense.marks.filter((mark) =>
    ['not', 'notNext', 'notAround', 'notPlus', 'notBack', 'still'].includes(mark.concept),
  )
  const vessels = said(sense, 'container', 'cup', 'fill')
  return said(sense, 'full').filter(
    (mark) => areBeside(sense, [mark], denials, 3) && areBeside(sense, [mark], vessels, 5),
  )
}

/** "It was slow but now it runs well". */
export function isOver(sense: Sense): boolean {
  const slow = said(sense, 'slow', 'drip', 'long', 'little')
  const better = said(sense, 'better', 'good', 'fast')
  if (isNamed(sense, 'still')) return false
  return (
    isSaid(sense, 'past') &&
    slow.length > 0 &&
    better.some((mark) => mark.from > (slow[0]?.to ?? 0))
  )
}
