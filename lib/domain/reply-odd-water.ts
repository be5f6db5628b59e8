import type { Danger } from './reply-danger-kind'
import type { Mark } from './reply-marks'
import {
  areBeside,
  areParted,
  denied,
  gapBetween,
  isNamed,
  isSaid,
  said,
  sureOf,
  type Sense,
} from './reply-sense'

/** Water that must not be drunk: colour, smell, taste, fuel, things in it. */
export function findOddWater(sense: Sense): Danger | null {
  const water = said(sense, 'water', 'flow', 'fill', 'drink', 'cup')
  // "The ring has rotted, send one": the ring is worn, the water is not spoken of.
  const isOfPart = (mark: Mark): boolean =>
    isSaid(sense, 'need') && water.length === 0 && areBeside(sense, [mark], said(sense, 'piece'), 3)
  const strong = said(sense, 'oddSmell', 'fuel').filter((mark) => !isOfPart(mark))
  const goods = said(sense, 'good')
  const smells = said(sense, 'smell', 'taste').filter(
    (mark) =>
      !goods.some((good) => gapBetween(sense, mark, good) <= 3 && !areParted(sense, mark, good)),
  )
  const things = said(sense, 'cloth', 'filter', 'piece', 'container', 'source', 'elsewhere')
  const isAsking = isSaid(sense, 'ask') && sense.asked !== 'none'
  const coloured = said(sense, 'odd').filter(
    (mark) =>
      areBeside(sense, [mark], water, 4) || (!isAsking && !areBeside(sense, [mark], things, 8)),
  )
  const dirty = said(sense, 'dirty').filter((mark) => areBeside(sense, [mark], water, 3))
  const bad = said(sense, 'bad').filter(
    (mark) =>
      areBeside(sense, [mark], said(sense, 'water'), 3) &&
      !areBeside(sense, [mark], said(sense, 'current'), 4) &&
      !isNamed(sense, 'flow'),
  )
  // "No sale clara": the denial is of the clearness, not of the flow.
  const unclear = said(sense, 'clean').filter((mark) =>
    denied(sense, 'flow').some(
      (flow) => flow.to <= mark.from && gapBetween(sense, flow, mark) <= 2,
    ),
  )
  // "No clean water to wash it with" is why it is not done yet.
  const isLackOnly = isSaid(sense, 'notYet')
  const notGood = [...(isLackOnly ? [] : denied(sense, 'clean')), ...unclear]
  const marks = [
    ...strong,
    ...said(sense, 'creature'),
    ...smells,
    ...coloured,
    ...bad,
    ...dirty,
    ...notGood,
  ]
  return marks.length > 0 ? { kind: 'odd-water', sure: sureOf(0.88, marks) } : null
}
