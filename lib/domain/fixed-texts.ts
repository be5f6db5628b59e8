import type { Moment } from './moments'

/** Texts that say what is known to be right at once; no walk goes before them. */
export const fixedTextNames = {
  unwell: 'what to do when someone is unwell',
  'unwell-now': 'go to the health worker now',
  'stop-using': 'stop using the filter',
  'drink-advice': 'boil advice',
} as const satisfies Partial<Record<Moment, string>>

export type FixedMoment = keyof typeof fixedTextNames

export const fixedMoments = Object.keys(fixedTextNames) as readonly FixedMoment[]

export function isFixedMoment(moment: string | null): moment is FixedMoment {
  return moment !== null && moment in fixedTextNames
}

type Gone = { moment: string | null; state: string }

/** Whether the household was really told to go to the health worker: a text that waits tells nobody. */
export function wasToldToGo(texts: readonly Gone[]): boolean {
  return texts.some(
    ({ moment, state }) => moment === 'unwell-now' && (state === 'sent' || state === 'delivered'),
  )
}

/** `boil advice sent 10:41`, `boil advice arrived 10:41`, `boil advice not sent`. */
export function fixedTextWords(moment: FixedMoment, state: string, clock: string): string {
  const name = fixedTextNames[moment]
  switch (state) {
    case 'delivered':
      return `${name} arrived ${clock}`
    case 'sent':
      return `${name} sent ${clock}`
    case 'queued':
    case 'sending':
      return `${name} on its way`
    case 'in doubt':
      return `${name}: not known whether it went`
    default:
      return `${name} not sent`
  }
}
