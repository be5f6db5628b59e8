import type { Moment } from './moments'
import type { Asked } from './reply-sense'
import type { Evidence } from './walk-suspects'

/** Kebab-case name of a step. */
export type StepId = string

export type StepAnswer =
  | 'done'
  | 'not done'
  | 'cured'
  | 'partly'
  | 'not cured'
  | 'yes'
  | 'no'
  | 'choice-1'
  | 'choice-2'
  | 'choice-3'
  | 'no answer'

export type End = { end: 'restored' | 'visit' | 'stop using' } | { end: 'part'; stage: 1 | 2 | 3 }

export type Answer = {
  answer: StepAnswer
  /** What stands on the agent's button. */
  label: string
  /** For questions: P(answer | suspect); `otherwise` for the suspects not named. */
  chance?: Evidence
  otherwise?: number
  /** An answer that settles the walk. */
  ends?: End
}

export type Step = {
  id: StepId
  name: string
  kind: 'cure' | 'question' | 'safety'
  /** Time it takes the household, without timing a litre and answering. */
  minutes: number
  moment: Moment
  asks: Asked
  /** How often one walk may ask it. */
  tries: number
  /** P(cured | suspect) of one try. */
  cures?: Evidence
  stage?: 1 | 2 | 3
  answers: readonly Answer[]
}

/** Time to fill a litre from a slow filter and text the minutes. Common practice, no source. */
export const timingMinutes = 12

/** Time to read a question and answer it. Common practice, no source. */
export const answeringMinutes = 2

/** What a visit costs in the same coin: mostly waiting for it. Common practice, no source. */
export const visitMinutes = 240

/** All that a step costs the household. */
export function costMinutes(step: Pick<Step, 'kind' | 'minutes'>): number {
  return step.minutes + (step.kind === 'cure' ? timingMinutes : answeringMinutes)
}

const afterCure: readonly Answer[] = [
  { answer: 'done', label: 'Done, minutes …' },
  { answer: 'cured', label: 'It runs well' },
  { answer: 'not cured', label: 'Done, still slow' },
  { answer: 'not done', label: 'Cannot do it' },
]

function cure(
  step: Pick<Step, 'id' | 'name' | 'minutes' | 'moment' | 'cures'> & Partial<Step>,
): Step {
  return { kind: 'cure', asks: 'step', tries: 1, answers: afterCure, ...step }
}

function askFlow(step: Pick<Step, 'id' | 'name' | 'moment' | 'tries'>): Step {
  return {
    ...step,
    kind: 'question',
    minutes: timingMinutes,
    asks: 'flow',
    answers: [
      { answer: 'done', label: 'Minutes …' },
      { answer: 'no', label: 'Nothing comes' },
      { answer: 'not done', label: 'Cannot measure' },
    ],
  }
}

/** The steps for a three-stage gravity kit. Minutes and chances: common practice, no source. */
export const steps: readonly Step[] = [
  askFlow({ id: 'ask-flow', name: 'Ask how long a litre takes', moment: 'ask-flow', tries: 8 }),
  askFlow({ id: 'ask-again', name: 'Ask for the figure again', moment: 'ask-again', tries: 3 }),
  {
    id: 'check-cracks',
    name: 'Look for cracks and leaks',
    kind: 'safety',
    minutes: 3,
    moment: 'step-check-cracks',
    asks: 'step',
    tries: 1,
    stage: 3,
    answers: [
      {
        answer: 'choice-1',
        label: '1 · Crack or leak',
        chance: { 'cracked-fibre': 0.6 },
        otherwise: 0.02,
        ends: { end: 'stop using' },
      },
      {
        answer: 'choice-2',
        label: '2 · It fell or froze',
        chance: { 'cracked-fibre': 0.3 },
        otherwise: 0.03,
        ends: { end: 'stop using' },
      },
      {
        answer: 'choice-3',
        label: '3 · None of these',
        chance: { 'cracked-fibre': 0.1 },
        otherwise: 0.95,
      },
      { answer: 'not done', label: 'Cannot tell' },
    ],
  },
  {
    id: 'look-hose',
    name: 'Look along the hose',
    kind: 'question',
    minutes: 2,
    moment: 'step-look-hose',
    asks: 'step',
    tries: 1,
    answers: [
      {
        answer: 'choice-1',
        label: '1 · Bent or pressed',
        chance: { 'kinked-hose': 0.9 },
        otherwise: 0.05,
      },
      {
        answer: 'choice-2',
        label: '2 · Bubbles in it',
        chance: { 'air-lock': 0.7, 'kinked-hose': 0.05 },
        otherwise: 0.1,
      },
      {
        answer: 'choice-3',
        label: '3 · Neither',
        chance: { 'air-lock': 0.25, 'kinked-hose': 0.05 },
        otherwise: 0.85,
      },
      { answer: 'not done', label: 'Cannot tell' },
    ],
  },
  cure({
    id: 'wash-fibre',
    name: 'Wash the fibre stage',
    minutes: 10,
    moment: 'step-wash-fibre',
    stage: 3,
    tries: 3,
    cures: { 'fouled-fibre': 0.65, 'air-lock': 0.3 },
  }),
  cure({
    id: 'rinse-cloth',
    name: 'Rinse or change the cloth in the top cap',
    minutes: 4,
    moment: 'step-rinse-cloth',
    stage: 1,
    cures: { 'full-cloth': 0.85 },
    answers: [
      ...afterCure,
      { answer: 'choice-1', label: 'The cloth is torn', ends: { end: 'part', stage: 1 } },
    ],
  }),
  cure({
    id: 'flush-carbon',
    name: 'Flush the carbon stage',
    minutes: 6,
    moment: 'step-flush-carbon',
    stage: 2,
    cures: { 'packed-carbon': 0.5 },
  }),
  cure({
    id: 'bleed-air',
    name: 'Let the air out of the line',
    minutes: 3,
    moment: 'step-bleed-air',
    cures: { 'air-lock': 0.8 },
  }),
  cure({
    id: 'straighten-hose',
    name: 'Straighten the hose',
    minutes: 2,
    moment: 'step-straighten-hose',
    cures: { 'kinked-hose': 0.95 },
  }),
  cure({
    id: 'fill-container',
    name: 'Fill the container to the top',
    minutes: 3,
    moment: 'step-fill-container',
    cures: { 'low-container': 0.95 },
  }),
  cure({
    id: 'refit-cap',
    name: 'Take the caps off and fit them again',
    minutes: 4,
    moment: 'step-refit-cap',
    cures: { 'misfitted-cap': 0.85 },
  }),
]

/** The step of that name; undefined for a name that is none. */
export function stepOf(id: StepId): Step | undefined {
  return steps.find((step) => step.id === id)
}
