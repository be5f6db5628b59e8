/** What a ticket is about. */
export type Trouble = 'slow' | 'no flow' | 'unwell' | 'danger sign' | 'unsafe' | 'unread' | 'silent'

/** Worst first. */
const byWeight: readonly Trouble[] = [
  'danger sign',
  'unwell',
  'unsafe',
  'no flow',
  'slow',
  'unread',
  'silent',
]

/** True if the first trouble weighs more than the second. */
export function isWorse(trouble: Trouble, than: Trouble): boolean {
  return byWeight.indexOf(trouble) < byWeight.indexOf(than)
}

/** Troubles that get fixed answers and a person, never a walk that goes by itself. */
export function isDanger(trouble: Trouble): boolean {
  return trouble === 'danger sign' || trouble === 'unwell' || trouble === 'unsafe'
}
