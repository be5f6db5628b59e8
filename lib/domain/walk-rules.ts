import { isSpent, partlyLine, type Recovery } from './flow'
import { costMinutes, visitMinutes, type Step, type StepId } from './walk-catalogue'
import { likelihoodWord } from './walk-odds'
import { bestChoice } from './walk-search'
import { suspectIds, suspectNames, suspectStage, type Odds, type SuspectId } from './walk-suspects'
import {
  lastRecovery,
  outcomeOf,
  settledEnd,
  timesTried,
  trialsOf,
  unansweredInARow,
  type Trial,
  type Tried,
} from './walk-trials'

/** What to do next in a walk, with one line for staff that says why. */
export type Next =
  | { kind: 'step'; step: Step; why: string }
  | {
      kind: 'end'
      end: 'restored' | 'part' | 'visit' | 'stop using'
      why: string
      stage?: 1 | 2 | 3
    }

/** Where a walk stands: all that a rule may look at. */
export type Position = { odds: Odds; tried: readonly Tried[]; from: readonly Step[] }

/** A rule settles what is next, or leaves it to the rules after it. */
type Rule = (position: Position) => Next | null

/** A crack that is at least this likely is asked about before anything else. Common practice. */
const safetyOdds = 0.1

const percent = (share: number) => `${Math.round(share * 100)} %`
const shareOf = ({ share, against }: Recovery) =>
  `${percent(share)} of the ${against === 'nominal' ? "model's nominal flow" : 'first reading'}`

/** What an answer or a figure has settled already. */
export const settledRule: Rule = ({ tried }) => {
  const told = settledEnd(tried)
  if (told) return { kind: 'end', ...told.end, why: `They answered: ${told.label}.` }
  const figure = lastRecovery(tried)
  if (figure?.kind === 'too-fast') {
    const why = `${shareOf(figure)} is too fast: water may pass a breach.`
    return { kind: 'end', end: 'stop using', why }
  }
  const last = trialsOf(tried).at(-1)
  if (last ? outcomeOf(last) === 'cured' : figure?.kind === 'restored') {
    const known = last ? last.recovery : figure
    const why = known ? `${shareOf(known)}: restored.` : 'They say it runs well again.'
    return { kind: 'end', end: 'restored', why }
  }
  if (unansweredInARow(tried) >= 2) {
    return { kind: 'end', end: 'visit', why: 'Two steps in a row went unanswered.' }
  }
  return null
}

/** Safety questions come first and are never traded against minutes. */
export const safetyRule: Rule = ({ odds, tried, from }) => {
  const step = from.find(({ id, kind }) => kind === 'safety' && timesTried(tried, id) === 0)
  if (!step || odds['cracked-fibre'] < safetyOdds) return null
  const why = `Safety first: a crack is ${oddsWords(odds['cracked-fibre'])}.`
  return { kind: 'step', step, why }
}

/** Nothing can be compared without a timed litre: one before the first cure, one after each. */
export const figureRule: Rule = ({ tried, from }) => {
  const last = trialsOf(tried).at(-1)
  if (last) {
    if (isToldEnough(last) || last.asks >= 2) return null
    const why = `A timed litre tells whether it helped: ${last.step.name.toLowerCase()}.`
    return stepNext('ask-flow', { tried, from, why })
  }
  const isGivenUp = timesTried(tried, 'ask-flow') >= 2 || isRefused(tried, 'ask-flow')
  if (isGivenUp || lastRecovery(tried)) return null
  const why = 'Nobody has timed a litre yet; without a figure nothing can be compared.'
  return stepNext('ask-flow', { tried, from, why })
}

/** Words will do, but for a wash that failed: whether the stage is spent is told by figures. */
function isToldEnough(trial: Trial): boolean {
  if (trial.recovery) return true
  const isWash = trial.step.id === 'wash-fibre'
  return isWash && trial.asks === 0 ? trial.said === 'cured' : outcomeOf(trial) !== null
}

/**
 * One wash that fails proves little; a second in a row tells dirt from a spent stage. Two that
 * fail, bars wholly below the line: the stage is spent whatever its age. If a bar straddles the
 * line the flow is asked for once more, then washed a third time. Common practice, no source.
 */
export const washRule: Rule = ({ tried, from }) => {
  const trials = trialsOf(tried)
  const washes = trials.filter(({ step }) => step.id === 'wash-fibre')
  const last = trials.at(-1)
  if (last?.step.id !== 'wash-fibre' || outcomeOf(last) !== 'not cured') return null
  const figures = washes.flatMap(({ recovery }) => (recovery ? [recovery] : []))
  const verdict = isSpent(figures)
  if (verdict === 'spent') return { kind: 'end', end: 'part', stage: 3, why: spentWords(figures) }
  if (verdict === 'ask again' && !last.wasAskedAgain) {
    const why = `The error of the figure straddles ${lineWords(figures)}: ask again.`
    return stepNext('ask-again', { tried, from, why })
  }
  const isSecondDue = washes.length === 1 || verdict === 'ask again'
  const why = 'One wash that fails proves little; a second in a row tells dirt from a spent stage.'
  return isSecondDue ? stepNext('wash-fibre', { tried, from, why }) : null
}

function spentWords(figures: readonly Recovery[]): string {
  const [before, after] = figures.slice(-2).map(({ share }) => percent(share))
  return `Two washes in a row left ${before}, then ${after} of the flow, both wholly under ${lineWords(figures)}: spent, whatever its age.`
}

/** The line that the last figure was held against. */
function lineWords(figures: readonly Recovery[]): string {
  const last = figures.at(-1)
  return last ? percent(partlyLine(last)) : ''
}

function stepNext(
  id: StepId,
  { tried, from, why }: Pick<Position, 'tried' | 'from'> & { why: string },
): Next | null {
  const step = from.find((one) => one.id === id)
  return step && timesTried(tried, id) < step.tries ? { kind: 'step', step, why } : null
}

/** The best expected cost to a cure among what is left, or the end that the odds point to. */
export function bestByCost({ odds, tried, from }: Position): Next {
  const open = from.filter(
    (step) => timesTried(tried, step.id) < step.tries && !isRefused(tried, step.id),
  )
  const choice = bestChoice(odds, open, visitMinutes)
  if (choice.kind === 'give up') return endByOdds(odds, tried)
  const { step } = choice
  if (choice.kind === 'question') {
    const minutes = Math.max(1, Math.round(choice.savedMinutes))
    const why = `Asking saves about ${minutes} ${minutes === 1 ? 'minute' : 'minutes'} of tries.`
    return { kind: 'step', step, why }
  }
  const target = aimOf(odds, step)
  const why = `Best chance for the least trouble: ${suspectNames[target].toLowerCase()} is ${oddsWords(odds[target])}, about ${costMinutes(step)} minutes.`
  return { kind: 'step', step, why }
}

/** The suspect a cure is most likely to meet. */
function aimOf(odds: Odds, { cures = {} }: Step): SuspectId {
  const weight = (id: SuspectId) => odds[id] * (cures[id] ?? 0)
  return suspectIds.reduce((best, id) => (weight(id) > weight(best) ? id : best))
}

function isRefused(tried: readonly Tried[], id: StepId): boolean {
  return tried.some(({ stepId, answer }) => stepId === id && answer === 'not done')
}

/**
 * When no step is worth its trouble: a stage that its own cure did not bring back is changed
 * whatever its age; all else needs eyes and hands.
 */
function endByOdds(odds: Odds, tried: readonly Tried[]): Next {
  const worst = suspectIds.reduce((best, id) => (odds[id] > odds[best] ? id : best))
  const stage = suspectStage[worst]
  const wasTried = trialsOf(tried).some(({ step }) => step.stage === stage)
  const known = `${suspectNames[worst]}: ${oddsWords(odds[worst])}`
  if (stage !== 0 && wasTried && odds[worst] >= 0.5 && worst !== 'cracked-fibre') {
    const why = `${known}; its cure did not help, so the stage is changed.`
    return { kind: 'end', end: 'part', stage, why }
  }
  const why = `No step by text is worth its trouble. ${known}; it needs eyes and hands.`
  return { kind: 'end', end: 'visit', why }
}

/** "likely, 5 in 10". */
function oddsWords(chance: number): string {
  return `${likelihoodWord(chance)}, ${Math.round(chance * 10)} in 10`
}
