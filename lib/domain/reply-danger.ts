import { findBreach } from './reply-breach'
import type { Danger } from './reply-danger-kind'
import { findIllness } from './reply-illness'
import { findOddWater } from './reply-odd-water'
import { isSupposed, type Sense } from './reply-sense'

/** Illness first, then a filter that must not be used, then water that must not be drunk. */
export function findDanger(sense: Sense): Danger | null {
  const found = [findIllness(sense), findBreach(sense), findOddWater(sense)]
  const dangers = found.filter((danger) => danger !== null)
  // A word that had to be guessed does not outrank one that stands as it is written.
  const best = Math.max(0, ...dangers.map((danger) => danger.sure))
  const danger = dangers.find((each) => each.sure > best - 0.15)
  if (danger === undefined) return null
  // In a longer text a danger that rests on a guess alone may be any strange word: a person reads it.
  const isGuess = danger.sure > 0.66 && danger.sure < 0.75
  if (isGuess && sense.words > 5) return { ...danger, sure: 0.55 }
  // "What if it cracks?": a person answers it.
  return isSupposed(sense) ? { ...danger, sure: 0.5 } : danger
}
