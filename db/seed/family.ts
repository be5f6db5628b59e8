import type { Language } from '@/lib/domain/language'
import type { Random } from './random'
import { voices } from './voices'

/** An invented family and its filter, which fouls with every litre and clears with a wash. */
export type Family = {
  number: string
  language: Language
  /** Whether they answer: most do, some late, some never. */
  answers: number
  /** Minutes a litre takes now, and took when the filter was new. */
  minutes: number
  cleanMinutes: number
  /** Share by which a litre takes longer each day. */
  fouling: number
  /** Washing no longer helps from this day of the history on; never for most. */
  spentFrom: number
}

export type Reply = { number: string; body: string; at: number }

const HOUR = 3_600_000

export function newFamily(
  random: Random,
  { number, language, days }: { number: string; language: Language; days: number },
): Family {
  const cleanMinutes = 3 + random.next() * 0.5
  return {
    number,
    language,
    answers: random.chance(0.1) ? 0.1 : random.chance(0.2) ? 0.6 : 0.95,
    minutes: cleanMinutes,
    cleanMinutes,
    fouling: 0.01 + random.next() * 0.045,
    spentFrom: random.chance(0.08) ? random.whole(Math.floor(days / 2), days) : Infinity,
  }
}

/** One more day of use. */
export function useFilter(family: Family): void {
  family.minutes = Math.min(25, family.minutes * (1 + family.fouling))
}

function wash(family: Family, day: number): void {
  if (day < family.spentFrom) family.minutes = family.cleanMinutes * 1.05
  else family.minutes = Math.max(11, family.minutes)
}

/** A new fibre stage: as good as on hand-over day. */
export function renew(family: Family): void {
  family.minutes = family.cleanMinutes
  family.spentFrom = Infinity
}

function figure(random: Random, family: Family): string {
  return random.pick(voices[family.language].minutes(Math.max(2, Math.round(family.minutes))))
}

type Asked = { moment: string; day: number }

function words(random: Random, family: Family, { moment, day }: Asked): string | null {
  const voice = voices[family.language]
  if (moment === 'wash-due' || moment === 'wash-nudge') {
    if (family.minutes > family.cleanMinutes * 2.2) return random.pick(voice.slow)
    wash(family, day)
    return random.pick(voice.done)
  }
  if (moment === 'change-due' || moment === 'change-nudge') return random.pick(voice.done)
  if (moment === 'step-wash-fibre') wash(family, day)
  if (
    moment === 'ask-flow' ||
    moment === 'ask-again' ||
    moment === 'flow-check' ||
    moment.startsWith('step-')
  ) {
    return figure(random, family)
  }
  return null
}

/** What the family texts back to a moment, and when; null for silence. */
export function replyTo(
  random: Random,
  family: Family,
  { moment, at, day }: { moment: string; at: number; day: number },
): Reply | null {
  if (!random.chance(family.answers)) return null
  const body = words(random, family, { moment, day })
  if (body === null) return null
  const isWalking = moment.startsWith('step-') || moment.startsWith('ask-')
  const delay = isWalking ? 0.3 + random.next() * 3 : 0.5 + random.next() * 9
  return { number: family.number, body, at: at + delay * HOUR }
}
