import type { Asked } from './reply-sense'

/**
 * What a wording may speak of. `stage` is the stage's position 1, 2 or 3, or several in order (12, 123), to be chosen by
 * (`{stage, select, 1 {…} 2 {…} 3 {…} other {…}}`), so that its name is in the household's language.
 * `dueOn` and `visitOn` are days as YYYY-MM-DD and are written out in the household's language.
 */
export type ValueName =
  | 'programme'
  | 'house'
  | 'stage'
  | 'part'
  | 'depot'
  | 'dueOn'
  | 'minutes'
  | 'visitor'
  | 'visitOn'
  | 'litres'

export type MomentGroup = 'Settling in' | 'Care' | 'Trouble' | 'Steps' | 'Manners'

type Traits = {
  /** A second person approves it before use. */
  safety?: boolean
  /** Must carry the programme's name and the way out. */
  firstContact?: boolean
  /** Values beside the names of programme and house. */
  offers?: readonly ValueName[]
  /** Values without which the text would not say what it is for. */
  needs?: readonly ValueName[]
  /** What an answer to it is taken to be about. */
  asked?: Asked
}

/** Makes the rows of one group. */
function rowsOf(group: MomentGroup) {
  return <M extends string>(moment: M, name: string, traits: Traits = {}) => {
    const values: readonly ValueName[] = ['programme', 'house', ...(traits.offers ?? [])]
    return {
      moment,
      name,
      group,
      safety: traits.safety ?? false,
      firstContact: traits.firstContact ?? false,
      values,
      needs: traits.needs ?? [],
      asked: traits.asked ?? 'none',
    }
  }
}

const settling = rowsOf('Settling in')
const care = rowsOf('Care')
const step = rowsOf('Steps')
const trouble = rowsOf('Trouble')
const manners = rowsOf('Manners')

const stageDue: Traits = { offers: ['stage', 'part', 'depot', 'dueOn'], needs: ['stage'] }

const rows = [
  settling('welcome', 'Welcome', { firstContact: true, asked: 'none' }),
  settling('first-flush', 'First flush', { asked: 'flow' }),
  care('wash-due', 'Wash due', { offers: ['dueOn'], asked: 'wash' }),
  care('wash-nudge', 'Wash nudge', { offers: ['dueOn'], asked: 'wash' }),
  care('change-due', 'Change due', { ...stageDue, asked: 'change' }),
  care('change-nudge', 'Change nudge', { ...stageDue, asked: 'change' }),
  care('flow-check', 'Flow check', { asked: 'flow' }),
  care('ask-flow', 'Ask flow', { asked: 'flow' }),
  step('step-wash-fibre', 'Wash the fibre stage', { asked: 'step' }),
  step('step-rinse-cloth', 'Rinse the cloth', { asked: 'step' }),
  step('step-flush-carbon', 'Flush the carbon', { asked: 'step' }),
  step('step-bleed-air', 'Let the air out', { asked: 'step' }),
  step('step-straighten-hose', 'Straighten the hose', { asked: 'step' }),
  step('step-fill-container', 'Fill the container', { asked: 'step' }),
  step('step-refit-cap', 'Refit the caps', { asked: 'step' }),
  step('step-look-hose', 'Look at the hose', { asked: 'step' }),
  step('step-check-cracks', 'Look for cracks', { safety: true, asked: 'step' }),
  trouble('got-it', 'Got it', { offers: ['minutes'] }),
  trouble('flowing', 'Flowing again', { offers: ['minutes', 'dueOn'] }),
  trouble('ask-again', 'Ask the flow again', { offers: ['minutes'], asked: 'flow' }),
  trouble('part-owed', 'Part owed', {
    offers: ['stage', 'part', 'depot'],
    needs: ['stage'],
  }),
  trouble('part-ready', 'Part ready', {
    offers: ['stage', 'part', 'depot', 'dueOn'],
    needs: ['stage', 'depot'],
  }),
  trouble('visit-booked', 'Visit booked', {
    offers: ['visitor', 'visitOn'],
    needs: ['visitOn'],
  }),
  trouble('stop-using', 'Stop using', { safety: true }),
  // `minutes` here is how long to boil, from the table that the programme chose.
  trouble('drink-advice', 'Drink advice', { safety: true, offers: ['litres', 'minutes'] }),
  trouble('unwell', 'Unwell', { safety: true }),
  trouble('unwell-now', 'Unwell: go now', { safety: true }),
  manners('thanks', 'Thanks', { offers: ['dueOn'] }),
  manners('unclear', 'Not understood'),
  manners('stop-or-stopped', 'Stop, or stopped?'),
  manners('stopped', 'Texts stopped'),
  manners('started', 'Texts started', { firstContact: true }),
  manners('help', 'Help', { firstContact: true }),
  manners('wrong-number', 'Wrong number'),
] as const

/** A point in a kit's life that a wording belongs to. */
export type Moment = (typeof rows)[number]['moment']

export type MomentInfo = {
  moment: Moment
  name: string
  group: MomentGroup
  safety: boolean
  firstContact: boolean
  values: readonly ValueName[]
  needs: readonly ValueName[]
  asked: Asked
}

/** Every moment, in the order in which the wording page lists it. */
export const moments: readonly MomentInfo[] = rows

/** What is known of a moment; undefined for a name that is none. */
export function momentInfo(moment: string): MomentInfo | undefined {
  return moments.find((info) => info.moment === moment)
}
