import type { Recovery, RecoveryKind } from './flow'
import { hoursInWords } from './harm-words'
import { monthNames } from './month-names'
import type { Enough } from './need'

const recoveryWords: Record<RecoveryKind, string> = {
  restored: 'restored',
  partly: 'partly back',
  not: 'not restored',
  'too-fast': 'too fast: it may pass a breach',
  'ask-again': 'ask again',
}

export type Verdict = {
  litres: number
  seconds: number
  /** L/h at 20 °C and full head. */
  normalised: number
  errorShare: number
  celsius: number
  celsiusFrom: 'told' | 'area month'
  /** Month of the reading, 1 to 12. */
  month: number
  /** L/h at 20 °C that it is held against. */
  reference: number
  recovery: Recovery
  need: Enough
}

const percent = (share: number) => Math.round(share * 100)

/** `12 min a litre`; another bottle is named. */
export function bottleWords({ litres, seconds }: Pick<Verdict, 'litres' | 'seconds'>): string {
  const minutes = Number((seconds / 60).toFixed(1))
  return litres === 1 ? `${minutes} min a litre` : `${minutes} min for ${litres} L`
}

function needWords({ kind, hours }: Enough): string {
  if (kind === 'enough') return `Enough to drink in ${hoursInWords(hours)}.`
  if (hours > 24) return 'Less than the family needs in a day.'
  const tooLong = kind === 'short' ? ': too long' : ''
  return `The day's water takes ${hoursInWords(hours)}${tooLong}.`
}

/** What the last reading comes to: the flow with its error, what it is held against, the water it was. */
export function verdictWords(verdict: Verdict): string[] {
  const { normalised, errorShare, reference, recovery, celsius } = verdict
  const against = recovery.against === 'first reading' ? 'first reading' : "model's nominal flow"
  const month = monthNames[verdict.month - 1] ?? ''
  return [
    `${normalised.toFixed(1)} L/h at 20 °C ± ${(normalised * errorShare).toFixed(1)}; ${against} ${reference.toFixed(1)}`,
    `${percent(recovery.share)} % of the ${against} (${percent(recovery.lowShare)} to ${percent(recovery.highShare)} %): ${recoveryWords[recovery.kind]}.`,
    verdict.celsiusFrom === 'told'
      ? `Water at ${celsius} °C, as told.`
      : `Water taken at ${celsius} °C, usual here in ${month}.`,
    needWords(verdict.need),
  ]
}
