import { costMinutes, type Step } from './walk-catalogue'
import { answerChance } from './walk-odds'
import { suspectIds, type Odds } from './walk-suspects'

/*
 * Decision-theoretic troubleshooting (Heckerman, Breese, Rommelse 1995): one fault, each cure with
 * a chance p and a cost c. Trying cures in the order of falling p/c makes the expected cost least;
 * a question is worth asking if its cost and the expected cost after each answer, weighed by how
 * likely the answer is, are less than the expected cost of going on without it.
 */

/** P(this try cures), given the odds. */
export function cureChance(odds: Odds, step: Pick<Step, 'cures'>): number {
  return suspectIds.reduce((sum, id) => sum + odds[id] * (step.cures?.[id] ?? 0), 0)
}

/** The cure with the best chance for its cost; undefined if there is none with any chance. */
export function bestCure(odds: Odds, cures: readonly Step[]): Step | undefined {
  let best: Step | undefined
  let bestRate = 0
  for (const step of cures) {
    const rate = cureChance(odds, step) / costMinutes(step)
    if (rate > bestRate) [best, bestRate] = [step, rate]
  }
  return best
}

/** What is left of each suspect after a try that did not cure: weights, not summing to 1. */
function left(weights: Odds, step: Pick<Step, 'cures'>): Odds {
  const rest = { ...weights }
  for (const id of suspectIds) rest[id] *= 1 - (step.cures?.[id] ?? 0)
  return rest
}

function total(weights: Odds): number {
  return suspectIds.reduce((sum, id) => sum + weights[id], 0)
}

/**
 * Expected household minutes from here to a cure by trying cures in the best order, each once, and
 * giving up (a visit, at `giveUpMinutes`) when no cure is worth its cost. `weights` may sum to less
 * than 1; the answer is then weighed the same.
 */
export function expectedMinutes(
  weights: Odds,
  cures: readonly Step[],
  giveUpMinutes: number,
): number {
  let rest = weights
  let open = cures
  let minutes = 0
  for (;;) {
    const step = bestCure(rest, open)
    if (!step || !isWorthwhile(rest, step, giveUpMinutes)) {
      return minutes + total(rest) * giveUpMinutes
    }
    minutes += total(rest) * costMinutes(step)
    rest = left(rest, step)
    open = open.filter((other) => other !== step)
  }
}

function isWorthwhile(weights: Odds, step: Step, giveUpMinutes: number): boolean {
  return cureChance(weights, step) * giveUpMinutes > costMinutes(step) * total(weights)
}

/** The same, if a question is asked first; `weights` as above. */
function minutesWithQuestion(
  weights: Odds,
  question: Step,
  { cures, giveUpMinutes }: { cures: readonly Step[]; giveUpMinutes: number },
): number {
  const answers = question.answers.filter(({ chance }) => chance !== undefined)
  return answers.reduce(
    (sum, answer) => {
      const told = { ...weights }
      for (const id of suspectIds) told[id] *= answerChance(answer, id)
      const after = answer.ends
        ? total(told) * giveUpMinutes
        : expectedMinutes(told, cures, giveUpMinutes)
      return sum + after
    },
    total(weights) * costMinutes(question),
  )
}

export type Choice =
  | { kind: 'cure'; step: Step; chance: number }
  | { kind: 'question'; step: Step; savedMinutes: number }
  | { kind: 'give up' }

/**
 * The best next choice among cures and questions by expected household minutes to a cure. A
 * question must beat the best cure with the same question kept for when that cure has failed.
 */
export function bestChoice(odds: Odds, open: readonly Step[], giveUpMinutes: number): Choice {
  const cures = open.filter(({ kind }) => kind === 'cure')
  const cure = bestCure(odds, cures)
  const isCureFirst = cure !== undefined && isWorthwhile(odds, cure, giveUpMinutes)
  let best: { step: Step; savedMinutes: number } | undefined
  for (const question of open) {
    if (question.kind !== 'question' || !question.answers.some(({ chance }) => chance)) continue
    const asking = minutesWithQuestion(odds, question, { cures, giveUpMinutes })
    const waiting = isCureFirst
      ? minutesCureFirst(odds, cure, { question, cures, giveUpMinutes })
      : total(odds) * giveUpMinutes
    const savedMinutes = waiting - asking
    if (savedMinutes > (best?.savedMinutes ?? 0)) best = { step: question, savedMinutes }
  }
  if (best) return { kind: 'question', ...best }
  return isCureFirst
    ? { kind: 'cure', step: cure, chance: cureChance(odds, cure) }
    : { kind: 'give up' }
}

function minutesCureFirst(
  odds: Odds,
  cure: Step,
  {
    question,
    cures,
    giveUpMinutes,
  }: { question: Step; cures: readonly Step[]; giveUpMinutes: number },
): number {
  const rest = left(odds, cure)
  const others = cures.filter((step) => step !== cure)
  return (
    costMinutes(cure) +
    Math.min(
      expectedMinutes(rest, others, giveUpMinutes),
      minutesWithQuestion(rest, question, { cures: others, giveUpMinutes }),
    )
  )
}
