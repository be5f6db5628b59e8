import { momentInfo } from './moments'
import { steps, visitMinutes, type Answer, type Step } from './walk-catalogue'
import { answerChance } from './walk-odds'
import { bestChoice } from './walk-search'
import {
  dealtWithBy,
  defaultPriors,
  suspectIds,
  type Evidence,
  type Odds,
  type SuspectId,
} from './walk-suspects'

export type Catalogue = {
  steps: readonly Step[]
  priors: Readonly<Record<string, Odds>>
}

const namedByRules = ['ask-flow', 'ask-again', 'wash-fibre']

/**
 * What is wrong with a catalogue of steps, one line each; none for a sound one. A sound catalogue
 * has no loop (each step may be asked a finite number of times), no step that no odds could make the
 * next one, no answer that leads nowhere, and deals with every suspect.
 */
export function catalogueProblems({ steps: catalogue, priors }: Catalogue): string[] {
  return [
    ...catalogue.flatMap((step) => stepProblems(step, catalogue)),
    ...Object.entries(priors).flatMap(([trouble, odds]) => priorProblems(trouble, odds)),
    ...suspectIds
      .filter((id) => dealtWithBy[id] === 'cure' && !catalogue.some((step) => step.cures?.[id]))
      .map((id) => `${id}: no step cures it`),
    ...(catalogue.some(({ kind }) => kind === 'safety') ? [] : ['no safety question']),
    ...namedByRules
      .filter((name) => !catalogue.some(({ id }) => id === name))
      .map((name) => `${name}: missing, and the rules of the walk name it`),
  ]
}

/** Steps that have no wording among the moments worded, such as those of the first language. */
export function unwordedSteps(
  worded: ReadonlySet<string>,
  from: readonly Step[] = steps,
): string[] {
  return from.filter(({ moment }) => !worded.has(moment)).map(({ id }) => id)
}

function stepProblems(step: Step, catalogue: readonly Step[]): string[] {
  const problems: string[] = []
  const { id, minutes, tries, answers, cures = {} } = step
  if (!/^[a-z]+(-[a-z]+)*$/.test(id)) problems.push('name is not kebab-case')
  if (catalogue.filter((other) => other.id === id).length > 1) problems.push('name is not its own')
  if (!(minutes > 0)) problems.push('costs no time')
  if (!Number.isInteger(tries) || tries < 1) problems.push('could be asked without end')
  if (!momentInfo(step.moment)) problems.push(`no such moment: ${step.moment}`)
  if (answers.length === 0) problems.push('has no answers')
  if (new Set(answers.map(({ answer }) => answer)).size < answers.length) {
    problems.push('has two answers of one kind')
  }
  if (Object.values(cures).some((chance) => !(chance > 0 && chance <= 1))) {
    problems.push('cures with a chance that is none')
  }
  if (answers.some(({ chance }) => chance) && !sumsToOne(answers)) {
    problems.push('chances of its answers do not sum to 1')
  }
  if (!isReachable(step, catalogue)) problems.push('can never be the next step')
  return problems.map((problem) => `${id}: ${problem}`)
}

function sumsToOne(answers: readonly Answer[]): boolean {
  const telling = answers.filter(({ chance }) => chance)
  return suspectIds.every((id) => {
    const sum = telling.reduce((total, answer) => total + answerChance(answer, id), 0)
    return Math.abs(sum - 1) < 1e-9
  })
}

/**
 * Rules of the trade put the flow and safety questions; a cure must be best when its suspect is all
 * but sure, a question when the suspects that its answers tell apart are all that is left.
 */
function isReachable(step: Step, catalogue: readonly Step[]): boolean {
  if (step.asks === 'flow' || step.kind === 'safety') return true
  const aims = Object.keys(step.kind === 'cure' ? (step.cures ?? {}) : toldApart(step))
  if (aims.length === 0) return false
  const positions = step.kind === 'cure' ? aims.map((id) => suspicion([id])) : [suspicion(aims)]
  return positions.some((odds) => {
    const choice = bestChoice(odds, catalogue, visitMinutes)
    return choice.kind !== 'give up' && choice.step.id === step.id
  })
}

function toldApart({ answers }: Step): Evidence {
  return Object.assign({}, ...answers.map(({ chance }) => chance ?? {}))
}

/** Odds that rest on these suspects alone, evenly. */
function suspicion(ids: readonly string[]): Odds {
  const share = (id: SuspectId) => (ids.includes(id) ? 1 / ids.length : 0)
  return Object.fromEntries(suspectIds.map((id) => [id, share(id)])) as Odds
}

function priorProblems(trouble: string, odds: Odds): string[] {
  const problems: string[] = []
  if (suspectIds.some((id) => !(odds[id] > 0))) problems.push('a suspect has no odds')
  const sum = suspectIds.reduce((total, id) => total + odds[id], 0)
  if (Math.abs(sum - 1) > 1e-9) problems.push('odds do not sum to 1')
  return problems.map((problem) => `${trouble}: ${problem}`)
}

/** Throws on a catalogue that is not sound, so that the desk does not start with one. */
export function checkedCatalogue(catalogue: Catalogue): readonly Step[] {
  const problems = catalogueProblems(catalogue)
  if (problems.length > 0)
    throw new Error(`The catalogue of steps is not sound: ${problems.join('; ')}`)
  return catalogue.steps
}

/** The catalogue in use, checked when it is loaded. */
export const soundSteps = checkedCatalogue({ steps, priors: defaultPriors })
