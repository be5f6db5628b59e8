import type { Recovery } from './flow'
import { stepOf, type End, type Step, type StepAnswer, type StepId } from './walk-catalogue'
import type { Outcome } from './walk-odds'

/** One step of a walk and what came of it. */
export type Tried = { stepId: StepId; answer: StepAnswer; at: number; recovery?: Recovery }

/** A cure that was carried out, with the flow after it as far as it is known. */
export type Trial = {
  step: Step
  said: StepAnswer
  recovery: Recovery | null
  /** How often the flow was asked for since. */
  asks: number
  wasAskedAgain: boolean
}

const notCarriedOut: readonly StepAnswer[] = ['not done', 'no', 'no answer']

/** True for an answer that means the cure was done, whatever it did. */
function isCarriedOut(step: Step, answer: StepAnswer): boolean {
  const isEnd = step.answers.some((choice) => choice.answer === answer && choice.ends)
  return step.kind === 'cure' && !notCarriedOut.includes(answer) && !isEnd
}

/** True for an answer by which the fibre stage was washed. */
export function isWashAnswer(stepId: StepId, answer: StepAnswer): boolean {
  const step = stepOf(stepId)
  return step?.id === 'wash-fibre' && isCarriedOut(step, answer)
}

/**
 * The cures of a walk in order. A flow figure belongs to the last cure before it, also when it
 * comes later or is asked for again: it is the best knowledge of what that cure did.
 */
export function trialsOf(tried: readonly Tried[]): Trial[] {
  const trials: Trial[] = []
  for (const { stepId, answer, recovery } of tried) {
    const step = stepOf(stepId)
    const last = trials.at(-1)
    if (step?.kind === 'cure') {
      if (!isCarriedOut(step, answer)) continue
      trials.push({ step, said: answer, recovery: recovery ?? null, asks: 0, wasAskedAgain: false })
    } else if (step?.asks === 'flow' && last) {
      last.asks += 1
      last.wasAskedAgain ||= stepId === 'ask-again'
      last.recovery = recovery ?? last.recovery
      // Who cannot measure and does not say that it runs well is not taken as cured.
      if (answer === 'not done' && last.said === 'done') last.said = 'not cured'
    }
  }
  return trials
}

/** What a cure did, or null while nobody knows. A figure weighs more than words. */
export function outcomeOf({ recovery, said }: Pick<Trial, 'recovery' | 'said'>): Outcome | null {
  if (recovery) {
    if (recovery.kind === 'restored') return 'cured'
    return recovery.kind === 'partly' ? 'partly' : 'not cured'
  }
  return said === 'cured' || said === 'partly' || said === 'not cured' ? said : null
}

/** The newest flow figure of a walk. */
export function lastRecovery(tried: readonly Tried[]): Recovery | null {
  return tried.findLast(({ recovery }) => recovery)?.recovery ?? null
}

/** The first flow figure, if it came before any cure. */
export function recoveryBeforeCures(tried: readonly Tried[]): Recovery | null {
  const first = tried.findIndex(({ stepId }) => stepOf(stepId)?.kind === 'cure')
  return lastRecovery(first < 0 ? tried : tried.slice(0, first))
}

/** How often a step was put to the household. */
export function timesTried(tried: readonly Tried[], stepId: StepId): number {
  return tried.filter((entry) => entry.stepId === stepId).length
}

/** The end that an answer settled by itself, such as a crack that was seen. */
export function settledEnd(tried: readonly Tried[]): { end: End; label: string } | null {
  for (const { stepId, answer } of tried) {
    const settled = stepOf(stepId)?.answers.find(
      (choice) => choice.answer === answer && choice.ends,
    )
    if (settled?.ends) return { end: settled.ends, label: settled.label }
  }
  return null
}

/** Questions in a row, up to now, that nobody answered. */
export function unansweredInARow(tried: readonly Tried[]): number {
  const lastAnswered = tried.findLastIndex(({ answer }) => answer !== 'no answer')
  return tried.length - 1 - lastAnswered
}

/** Washes in a row, up to now, that are known not to have brought the flow back. */
export function failedWashesInARow(tried: readonly Tried[]): number {
  const washes = trialsOf(tried).filter(({ step }) => step.id === 'wash-fibre')
  const lastGood = washes.findLastIndex((wash) => outcomeOf(wash) !== 'not cured')
  return washes.length - 1 - lastGood
}
