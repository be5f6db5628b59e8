import type { Asked } from './reply-sense'

/**
 * What a wording may speak of. `stage` is the stage's position 1, 2 or 3, to be chosen by
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

function row<M extends string>(moment: M, group: MomentGroup, name: string, traits: Traits = {}) {
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

const stageDue: Traits = { offers: ['stage', 'part', 'depot', 'dueOn'], needs: ['stage'] }

const rows = [
  row('welcome', 'Settling in', 'Welcome', { firstContact: true, asked: 'none' }),
  row('first-flush', 'Settling in', 'First flush', { asked: 'flow' }),
  row('wash-due', 'Care', 'Wash due', { offers: ['dueOn'], asked: 'wash' }),
  row('wash-nudge', 'Care', 'Wash nudge', { offers: ['dueOn'], asked: 'wash' }),
  row('change-due', 'Care', 'Change due', { ...stageDue, asked: 'change' }),
  row('change-nudge', 'Care', 'Change nudge', { ...stageDue, asked: 'change' }),
  row('flow-check', 'Care', 'Flow check', { asked: 'flow' }),
  row('ask-flow', 'Care', 'Ask flow', { asked: 'flow' }),
  row('step-wash-fibre', 'Steps', 'Wash the fibre stage', { asked: 'step' }),
  row('step-rinse-cloth', 'Steps', 'Rinse the cloth', { asked: 'step' }),
  row('step-flush-carbon', 'Steps', 'Flush the carbon', { asked: 'step' }),
  row('step-bleed-air', 'Steps', 'Let the air out', { asked: 'step' }),
  row('step-straighten-hose', 'Steps', 'Straighten the hose', { asked: 'step' }),
  row('step-fill-container', 'Steps', 'Fill the container', { asked: 'step' }),
  row('step-refit-cap', 'Steps', 'Refit the caps', { asked: 'step' }),
  row('step-look-hose', 'Steps', 'Look at the hose', { asked: 'step' }),
  row('step-check-cracks', 'Steps', 'Look for cracks', { safety: true, asked: 'step' }),
  row('got-it', 'Trouble', 'Got it', { offers: ['minutes'] }),
  row('flowing', 'Trouble', 'Flowing again', { offers: ['minutes', 'dueOn'] }),
  row('ask-again', 'Trouble', 'Ask the flow again', { offers: ['minutes'], asked: 'flow' }),
  row('part-owed', 'Trouble', 'Part owed', {
    offers: ['stage', 'part', 'depot'],
    needs: ['stage'],
  }),
  row('part-ready', 'Trouble', 'Part ready', {
    offers: ['stage', 'part', 'depot', 'dueOn'],
    needs: ['stage', 'depot'],
  }),
  row('visit-booked', 'Trouble', 'Visit booked', {
    offers: ['visitor', 'visitOn'],
    needs: ['visitOn'],
  }),
  row('stop-using', 'Trouble', 'Stop using', { safety: true }),
  // `minutes` here is how long to boil, from the table that the programme chose.
  row('drink-advice', 'Trouble', 'Drink advice', { safety: true, offers: ['litres', 'minutes'] }),
  row('unwell', 'Trouble', 'Unwell', { safety: true }),
  row('unwell-now', 'Trouble', 'Unwell: go now', { safety: true }),
  row('thanks', 'Manners', 'Thanks', { offers: ['dueOn'] }),
  row('unclear', 'Manners', 'Not understood'),
  row('stop-or-stopped', 'Manners', 'Stop, or stopped?'),
  row('stopped', 'Manners', 'Texts stopped'),
  row('started', 'Manners', 'Texts started', { firstContact: true }),
  row('help', 'Manners', 'Help', { firstContact: true }),
  row('wrong-number', 'Manners', 'Wrong number'),
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
