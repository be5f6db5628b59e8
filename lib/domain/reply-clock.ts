import type { Sense } from './reply-sense'
import type { Token } from './reply-tokens'

/** A time of the day, in minutes, and the tokens it takes. */
type Clock = { at: number; from: number; to: number }

/** "7h05", "৬টা ১০", "6 o'clock". */
const hourWords = new Set('h hr hrs heure heures ta tay tar oclock টা টায় টার'.split(' '))

/** Minutes from one time of the day to another: "started 6.10 finished 6.22". Null without two. */
export function minutesBetweenClocks(sense: Sense): number | null {
  const clocks = clocksOf(sense.tokens)
  const [start, end] = clocks
  if (start === undefined || end === undefined || clocks.length > 2) return null
  const between = sense.tokens.slice(start.to, end.from)
  // "4:30 to 4:50" may be a range of minutes and seconds; a clock in that place shows a later hour.
  const isRange = between.length <= 1
  if (isRange && start.at < 5 * 60) return null
  const minutes = end.at > start.at ? end.at - start.at : end.at + 12 * 60 - start.at
  return minutes > 0 && minutes <= 6 * 60 ? minutes : null
}

function clocksOf(tokens: readonly Token[]): Clock[] {
  const clocks: Clock[] = []
  for (let at = 0; at < tokens.length; at += 1) {
    const clock = clockAt(tokens, at)
    if (clock === null) continue
    clocks.push(clock)
    at = clock.to - 1
  }
  return clocks
}

function clockAt(tokens: readonly Token[], at: number): Clock | null {
  const token = tokens[at]
  if (token?.kind !== 'number') return null
  const [, hours, minutes] = /^(\d{1,2})[.:](\d{2})$/.exec(token.text) ?? []
  if (hours !== undefined && minutes !== undefined) {
    const isTime = Number(hours) < 24 && Number(minutes) < 60
    return isTime ? { at: Number(hours) * 60 + Number(minutes), from: at, to: at + 1 } : null
  }
  const word = tokens[at + 1]
  if (word?.kind !== 'word' || !hourWords.has(word.text) || token.value > 24) return null
  const rest = tokens[at + 2]
  const isRest = rest?.kind === 'number' && Number.isInteger(rest.value) && rest.value < 60
  return isRest
    ? { at: token.value * 60 + rest.value, from: at, to: at + 3 }
    : { at: token.value * 60, from: at, to: at + 2 }
}
