import { may, type Act, type Role } from '@/lib/domain/role'
import type { Word } from './head-words'

const words: readonly (Word & { act: Act })[] = [
  { name: 'Shift', href: '/shift', also: ['/tickets'], act: 'see the shift' },
  { name: 'Households', href: '/households', also: ['/areas'], act: 'see households' },
  { name: 'Wording', href: '/wording', act: 'see wording' },
  { name: 'Reply words', href: '/reply-words', act: 'set reply words' },
  { name: 'Rounds', href: '/rounds', act: 'see rounds' },
  { name: 'Parts', href: '/depots', act: 'keep stock' },
  { name: 'Settings', href: '/settings', act: 'change settings' },
]

const visits: Word = { name: 'Visits', href: '/visits' }
const practice: Word = { name: 'Practice', href: '/practice' }

function workOf(role: Role): Word[] {
  if (role === 'visitor') return [visits]
  return words.filter(({ act }) => may(role, act)).map(({ act: _act, ...word }) => word)
}

/** The words of the head that a role may open, in order; the last only where the clock can be moved. */
export function wordsFor(role: Role, practising = false): Word[] {
  return practising ? [...workOf(role), practice] : workOf(role)
}

/** Where a role begins its day. */
export function homeOf(role: Role): string {
  return role === 'visitor' ? '/visits' : '/shift'
}
