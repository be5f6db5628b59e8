import type { Language } from './language'
import { languageOrder } from './reply-marks'
import { numberPieceAt as pieceAt } from './reply-number-words'
import type { Token } from './reply-tokens'
import type { NumberUnit } from './reply-words/concept'

/** Numbers of a text: spans of time in minutes, and numbers that nobody gave a unit. */
export type Figures = {
  spans: { minutes: number; from: number; to: number }[]
  bare: { value: number; from: number; to: number }[]
  /** An amount by the hour was given: "one cup an hour". */
  hasRate: boolean
}

const minutesPer: Record<Exclude<NumberUnit, 'other'>, number> = {
  hour: 60,
  minute: 1,
  second: 1 / 60,
}

/** Every time span and bare number, whichever language it is said in. */
export function readFigures(tokens: readonly Token[], own: Language): Figures {
  const figures: Figures = { spans: [], bare: [], hasRate: false }
  const order = languageOrder(own)
  let at = 0
  while (at < tokens.length) at = readFigureAt(tokens, at, { order, figures })
  return figures
}

type Reader = { order: Language[]; figures: Figures }

function readFigureAt(tokens: readonly Token[], from: number, { order, figures }: Reader): number {
  const first = pieceAt(tokens, from, order)
  if (first.kind === 'span') {
    const span = { minutes: first.minutes, from, to: from + first.size }
    return pushSpan(tokens, withRest(tokens, span, order), { order, figures })
  }
  if (first.kind === 'shift') {
    // "সোয়া এক ঘণ্টা": a quarter more than one hour.
    const span = pieceAt(tokens, from + first.size, order)
    if (span.kind === 'span') {
      const minutes = span.minutes * (1 + first.by)
      return pushSpan(
        tokens,
        { minutes, from, to: from + first.size + span.size },
        { order, figures },
      )
    }
  }
  const amount = readAmount(tokens, from, order) ?? impliedOne(tokens, from, order)
  if (amount === null) return from + first.size
  const unit = pieceAt(tokens, amount.to, order)
  if (unit.kind === 'unit' && unit.unit === 'other')
    return afterRate(tokens, amount.to + unit.size, { order, figures })
  if (unit.kind === 'unit') return readSpan(tokens, { ...amount, from }, { order, figures })
  // "One" alone is a figure; within a sentence it is an article.
  const isAlone = tokens.length === 1 && amount.value >= 1
  if (!amount.weak || isAlone) figures.bare.push({ value: amount.value, from, to: amount.to })
  return amount.to
}

/** "A whole hour": what stands between a number and its unit without changing it. */
const wholeWords = new Set(
  'whole full good entire solid long entera entero larga toute bonne pleine puro pura পুরো পুরা'.split(
    ' ',
  ),
)

/** "Hour and a quarter", "whole hour": the one is left out. */
function impliedOne(tokens: readonly Token[], from: number, order: Language[]): Amount | null {
  const unit = pieceAt(tokens, from, order)
  if (unit.kind !== 'unit' || unit.unit !== 'hour') return null
  const isWhole = wholeWords.has(tokens[from - 1]?.text ?? '')
  const isMore = pieceAt(tokens, from + unit.size, order).kind === 'half'
  return isWhole || isMore ? { value: 1, weak: false, to: from } : null
}

/** "One cup an hour" is a rate, not the time of a bottle. */
function afterRate(tokens: readonly Token[], at: number, { order, figures }: Reader): number {
  const skip = perWords.has(tokens[at]?.text ?? '') ? 1 : 0
  const next = pieceAt(tokens, at + skip, order)
  const isHour =
    (next.kind === 'span' && next.minutes >= 60) || (next.kind === 'unit' && next.unit === 'hour')
  if (!isHour) return at
  figures.hasRate = true
  return at + skip + next.size
}

const perWords = new Set(['per', 'por', 'par', 'a', 'la', 'l', 'every', 'each', 'cada'])

/** Keeps a span, joined to the one just before it: "an hour and ten minutes". */
function pushSpan(
  tokens: readonly Token[],
  span: { minutes: number; from: number; to: number },
  { figures }: Reader,
): number {
  const last = figures.spans.at(-1)
  const gap = last ? tokens.slice(last.to, span.from) : []
  const isJoined = last && span.minutes < last.minutes && gap.length <= 1 && gap.every(isAnd)
  if (isJoined) {
    last.minutes += span.minutes
    last.to = span.to
  } else figures.spans.push(span)
  return span.to
}

type Amount = { value: number; weak: boolean; to: number }

/** "twenty five", "two and a half", "সাড়ে চার". */
function readAmount(tokens: readonly Token[], from: number, order: Language[]): Amount | null {
  const first = pieceAt(tokens, from, order)
  if (first.kind === 'shift') {
    const shifted = readAmount(tokens, from + first.size, order)
    return shifted && { ...shifted, value: shifted.value + first.by }
  }
  if (first.kind !== 'value') return null
  let { value, weak } = first
  let to = from + first.size
  const spoken = tokens[from]?.kind === 'word'
  for (;;) {
    const next = pieceAt(tokens, to, order)
    const skip = next.kind === 'rest' && isAnd(tokens[to]) ? 1 : 0
    const after = skip ? pieceAt(tokens, to + skip, order) : next
    if (after.kind === 'half') {
      return { value: value + after.part, weak: false, to: to + skip + after.size }
    }
    const joins = spoken && after.kind === 'value' && tokens[to + skip]?.kind === 'word'
    if (!joins || !canFollow(value, after.value)) return { value, weak, to }
    value += after.value
    weak = false
    to += skip + after.size
  }
}

function canFollow(tens: number, ones: number): boolean {
  if (tens === 100) return ones < 100
  return tens >= 20 && tens % 10 === 0 && ones < (tens === 60 || tens === 80 ? 20 : 10)
}

function isAnd(token: Token | undefined): boolean {
  return token?.kind === 'word' && ['and', 'y', 'et', 'con', 'e', 'n'].includes(token.text)
}

/** A number with its unit, and the smaller unit that may follow: "1h30", "4 min 30 s". */
function readSpan(
  tokens: readonly Token[],
  amount: { value: number; from: number; to: number },
  { order, figures }: Reader,
): number {
  const unit = pieceAt(tokens, amount.to, order)
  if (unit.kind !== 'unit' || unit.unit === 'other') return amount.to
  const minutes = amount.value * minutesPer[unit.unit]
  const span = { minutes, from: amount.from, to: amount.to + unit.size }
  const whole = unit.unit === 'second' ? span : afterUnit(tokens, span, { order, unit: unit.unit })
  return pushSpan(tokens, whole, { order, figures })
}

type Span = { minutes: number; from: number; to: number }

/** "Une heure et quart", "une minute trente": a span that is one whole unit may have more behind it. */
function withRest(tokens: readonly Token[], span: Span, order: Language[]): Span {
  if (span.minutes === 60) return afterUnit(tokens, span, { order, unit: 'hour' })
  return span.minutes === 1 ? afterUnit(tokens, span, { order, unit: 'minute' }) : span
}

/** What may follow a unit: a part of it, or the smaller unit, whose name is often left out. */
function afterUnit(
  tokens: readonly Token[],
  span: Span,
  { order, unit }: { order: Language[]; unit: 'hour' | 'minute' },
): Span {
  const isHalf = pieceAt(tokens, span.to, order).kind === 'half'
  const skip = !isHalf && isAnd(tokens[span.to]) ? 1 : 0
  const half = pieceAt(tokens, span.to + skip, order)
  if (half.kind === 'half') {
    const minutes = span.minutes + half.part * minutesPer[unit]
    return { ...span, minutes, to: span.to + skip + half.size }
  }
  const rest = readAmount(tokens, span.to + skip, order)
  if (!rest) return span
  const restUnit = pieceAt(tokens, rest.to, order)
  const smaller = unit === 'hour' ? 'minute' : 'second'
  const minutes = span.minutes + rest.value * minutesPer[smaller]
  if (restUnit.kind === 'unit' && restUnit.unit === smaller)
    return { ...span, minutes, to: rest.to + restUnit.size }
  const isBare = rest.value < 60 && !rest.weak && restUnit.kind !== 'unit'
  const isCounted = skip === 0 || tokens[span.to]?.text === 'con' || tokens[span.to]?.text === 'y'
  return isBare && isCounted ? { ...span, minutes, to: rest.to } : span
}
