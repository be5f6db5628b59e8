import type { Recovery } from './flow'
import type { Trouble } from './trouble'
import { stepOf, type Step, type StepAnswer, type StepId } from './walk-catalogue'
import { soundSteps } from './walk-check'
import type { OddsOrigin } from './walk-history'
import { afterAnswer, afterOutcome, normalise, withEvidence } from './walk-odds'
import { bestByCost, figureRule, safetyRule, settledRule, washRule, type Next } from './walk-rules'
import {
  coldEvidence,
  cueEvidence,
  defaultPriors,
  shareEvidence,
  type Cue,
  type Odds,
} from './walk-suspects'
import { outcomeOf, recoveryBeforeCures, trialsOf, type Tried } from './walk-trials'

export { stepOf, steps, type Step, type StepAnswer, type StepId } from './walk-catalogue'
export { likelihoodWord } from './walk-odds'
export type { Next } from './walk-rules'
export {
  cueEvidence,
  defaultPriors,
  suspectIds,
  suspectNames,
  suspectStage,
  type Cue,
  type Odds,
  type SuspectId,
} from './walk-suspects'
export type { Tried } from './walk-trials'

/** The troubleshooting of a ticket so far. Times are epoch milliseconds. */
export type Walk = {
  trouble: Trouble
  /** Odds before any answer. */
  start: Odds
  /** Odds now. */
  odds: Odds
  tried: readonly Tried[]
  /** Every flow figure in order. */
  readings: readonly Recovery[]
  celsius: number | null
  /** Where the odds at the start were counted; without it they are the catalogue's. */
  origin?: OddsOrigin
}

/**
 * A walk with nothing tried. `priors` are the odds counted for the kit's area and season, `origin`
 * where; without them the catalogue's own are taken; any trouble but no flow is walked like slow water. `cues` are what was told or known before the first step.
 */
export function startWalk({
  trouble,
  priors,
  origin,
  cues = [],
  celsius = null,
}: {
  trouble: Trouble
  priors?: Odds
  origin?: OddsOrigin
  cues?: readonly Cue[]
  celsius?: number | null
}): Walk {
  const own = trouble === 'no flow' ? defaultPriors['no flow'] : defaultPriors.slow
  const told = cues.reduce((odds, cue) => withEvidence(odds, cueEvidence[cue]), priors ?? own)
  const start = celsius === null ? normalise(told) : withEvidence(told, coldEvidence(celsius))
  const walk = { trouble, start, odds: start, tried: [], readings: [], celsius }
  return priors && origin ? { ...walk, origin } : walk
}

/** No water at all is a figure without error, whatever it is set against. */
const nothingComes: Recovery = {
  kind: 'not',
  share: 0,
  lowShare: 0,
  highShare: 0,
  against: 'first reading',
}

/** The walk after an answer. An answer to a step that is not in the catalogue changes nothing. */
export function answerStep(
  walk: Walk,
  {
    stepId,
    answer,
    recovery,
    at,
  }: { stepId: StepId; answer: StepAnswer; recovery?: Recovery; at: number },
): Walk {
  const step = stepOf(stepId)
  if (!step) return walk
  const figure = recovery ?? (step.asks === 'flow' && answer === 'no' ? nothingComes : undefined)
  const entry: Tried = figure ? { stepId, answer, at, recovery: figure } : { stepId, answer, at }
  const tried = [...walk.tried, entry]
  return {
    ...walk,
    tried,
    odds: oddsAfter(walk.start, tried),
    readings: figure ? [...walk.readings, figure] : walk.readings,
  }
}

/**
 * The odds from the start through all that is known now. Folded anew each time, because a later
 * figure can change what an earlier cure is taken to have done.
 */
function oddsAfter(start: Odds, tried: readonly Tried[]): Odds {
  const first = recoveryBeforeCures(tried)
  let odds = first ? withEvidence(start, shareEvidence(first.share)) : start
  for (const { stepId, answer } of tried) {
    const choice = stepOf(stepId)?.answers.find((one) => one.answer === answer)
    if (choice?.chance) odds = afterAnswer(odds, choice)
  }
  for (const trial of trialsOf(tried)) {
    const outcome = outcomeOf(trial)
    if (outcome) odds = afterOutcome(odds, trial.step, outcome)
  }
  return odds
}

/**
 * The next best step of a walk, or its end. In order: what is settled already, safety questions,
 * a missing figure, the second wash, then the best expected cost. `from` is the catalogue.
 */
export function nextStep(walk: Walk, from: readonly Step[] = soundSteps): Next {
  const position = { odds: walk.odds, tried: walk.tried, from }
  return (
    settledRule(position) ??
    safetyRule(position) ??
    figureRule(position) ??
    washRule(position) ??
    bestByCost(position)
  )
}
