import type { Answer, Step } from './walk-catalogue'
import { suspectIds, type Evidence, type Odds, type SuspectId } from './walk-suspects'

/** Any weights as probabilities that sum to 1. Weights that are all 0 say nothing: even odds. */
export function normalise(weights: Odds): Odds {
  const total = suspectIds.reduce((sum, id) => sum + weights[id], 0)
  return mapOdds((id) => (total > 0 ? weights[id] / total : 1 / suspectIds.length))
}

function mapOdds(weightOf: (id: SuspectId) => number): Odds {
  return Object.fromEntries(suspectIds.map((id) => [id, weightOf(id)])) as Odds
}

/** Bayes on odds: each suspect's odds times its likelihood ratio, made to sum to 1 again. */
export function withEvidence(odds: Odds, evidence: Evidence): Odds {
  return normalise(mapOdds((id) => odds[id] * (evidence[id] ?? 1)))
}

/** Result of a cure, as measured or said. */
export type Outcome = 'cured' | 'partly' | 'not cured'

/** Of the tries that do not cure their own suspect, how many help a little. Common practice. */
const partlyShare = 1 / 3
/** A try aimed elsewhere that still helps a little: time passes, things are moved. */
const partlyByChance = 0.1
const curedByChance = 0.02

/** P(outcome | suspect) of one try of a cure. */
export function outcomeChance(step: Pick<Step, 'cures'>, outcome: Outcome, id: SuspectId): number {
  const cures = step.cures?.[id]
  const cured = cures ?? curedByChance
  const partly = cures === undefined ? partlyByChance : (1 - cures) * partlyShare
  if (outcome === 'cured') return cured
  return outcome === 'partly' ? partly : 1 - cured - partly
}

/** The odds after a cure was tried with this outcome. */
export function afterOutcome(odds: Odds, step: Pick<Step, 'cures'>, outcome: Outcome): Odds {
  return normalise(mapOdds((id) => odds[id] * outcomeChance(step, outcome, id)))
}

/** P(answer | suspect) of a question's answer. */
export function answerChance(answer: Pick<Answer, 'chance' | 'otherwise'>, id: SuspectId): number {
  return answer.chance?.[id] ?? answer.otherwise ?? 1
}

/** The odds after a question was answered. */
export function afterAnswer(odds: Odds, answer: Pick<Answer, 'chance' | 'otherwise'>): Odds {
  return normalise(mapOdds((id) => odds[id] * answerChance(answer, id)))
}

/** Odds as a word for staff; the number stands beside it on focus. */
export function likelihoodWord(chance: number): 'likely' | 'possible' | 'unlikely' {
  if (chance >= 0.4) return 'likely'
  return chance >= 0.15 ? 'possible' : 'unlikely'
}

/**
 * How often each suspect was the cause of closed tickets. Causes that are no suspect, such as a kit
 * that was withdrawn, tell nothing of what makes water slow and are left out.
 */
export function countCauses(closed: readonly { cause: string; tickets: number }[]): Evidence {
  const counts: Evidence = {}
  for (const id of suspectIds) {
    const ofCause = closed.filter(({ cause }) => cause === id)
    counts[id] = ofCause.reduce((sum, { tickets }) => sum + tickets, 0)
  }
  return counts
}

/**
 * Prior odds from the causes of closed tickets of one area and season. The prior counts as `weight`
 * tickets (Dirichlet smoothing), so that few tickets move it little and no cause ever gets odds of 0.
 */
export function oddsFromHistory(counts: Evidence, prior: Odds, weight: number): Odds {
  if (!(weight > 0)) throw new RangeError('the prior must weigh something')
  const start = normalise(prior)
  return normalise(mapOdds((id) => Math.max(0, counts[id] ?? 0) + weight * start[id]))
}
