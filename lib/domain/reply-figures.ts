import type { Language } from './language'
import { exactKeys, languagePacks } from './reply-lexicon'
import { languageOrder } from './reply-marks'
import { foldBengali, foldRoman, squeeze } from './reply-spelling'
import type { Token } from './reply-tokens'
import type { LanguagePack, NumberUnit } from './reply-words/concept'

/** Numbers of a text: spans of time in minutes, and numbers that nobody gave a unit. */
export type Figures = {
  spans: { minutes: number; from: number; to: number }[]
  bare: { value: number; from: number; to: number }[]
}

type Piece =
  | { kind: 'value'; value: number; weak: boolean; size: number }
  | { kind: 'unit'; unit: NumberUnit; size: number }
  | { kind: 'span'; minutes: number; size: number }
  | { kind: 'half'; part: number; size: number }
  | { kind: 'shift'; by: number; size: number }
  | { kind: 'rest'; size: number }

const minutesPer: Record<Exclude<NumberUnit, 'other'>, number> = {
  hour: 60,
  minute: 1,
  second: 1 / 60,
}

/** Every time span and bare number, whichever language it is said in. */
export function readFigures(tokens: readonly Token[], own: Language): Figures {
  const figures: Figures = { spans: [], bare: [] }
  let at = 0
  while (at < tokens.length) at = readFigureAt(tokens, at, { own, figures })
  return figures
}

type Reader = { own: Language; figures: Figures }

function readFigureAt(tokens: readonly Token[], from: number, { own, figures }: Reader): number {
  const first = pieceAt(tokens, from, own)
  if (first.kind === 'span') {
    const half = pieceAt(tokens, from + first.size, own)
    const to = from + first.size
    figures.spans.push({ minutes: first.minutes, from, to })
    return half.kind === 'half' ? to + half.size : to
  }
  const amount = readAmount(tokens, from, own)
  if (amount === null) return from + first.size
  const unit = pieceAt(tokens, amount.to, own)
  if (unit.kind === 'unit' && unit.unit === 'other') return amount.to + unit.size
  if (unit.kind === 'unit') return readSpan(tokens, { ...amount, from }, { own, figures })
  if (!amount.weak) figures.bare.push({ value: amount.value, from, to: amount.to })
  return amount.to
}

type Amount = { value: number; weak: boolean; to: number }

/** "twenty five", "two and a half", "সাড়ে চার". */
function readAmount(tokens: readonly Token[], from: number, own: Language): Amount | null {
  const first = pieceAt(tokens, from, own)
  if (first.kind === 'shift') {
    const shifted = readAmount(tokens, from + first.size, own)
    return shifted && { ...shifted, value: shifted.value + first.by }
  }
  if (first.kind !== 'value') return null
  let { value, weak } = first
  let to = from + first.size
  const spoken = tokens[from]?.kind === 'word'
  for (;;) {
    const next = pieceAt(tokens, to, own)
    const skip = next.kind === 'rest' && isAnd(tokens[to]) ? 1 : 0
    const after = skip ? pieceAt(tokens, to + skip, own) : next
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
  { own, figures }: Reader,
): number {
  const unit = pieceAt(tokens, amount.to, own)
  if (unit.kind !== 'unit' || unit.unit === 'other') return amount.to
  let minutes = amount.value * minutesPer[unit.unit]
  let to = amount.to + unit.size
  const skip = isAnd(tokens[to]) ? 1 : 0
  const half = pieceAt(tokens, to + skip, own)
  if (half.kind === 'half') {
    minutes += half.part * minutesPer[unit.unit]
    to += skip + half.size
  } else if (unit.unit !== 'second') {
    const rest = readAmount(tokens, to + skip, own)
    const restUnit = rest && pieceAt(tokens, rest.to, own)
    const smaller = unit.unit === 'hour' ? 'minute' : 'second'
    if (rest && restUnit?.kind === 'unit' && restUnit.unit === smaller) {
      minutes += rest.value * minutesPer[smaller]
      to = rest.to + restUnit.size
    } else if (rest && rest.value < 60 && restUnit?.kind !== 'unit' && skip === 0 && !rest.weak) {
      minutes += rest.value * minutesPer[smaller]
      to = rest.to
    }
  }
  figures.spans.push({ minutes, from: amount.from, to })
  return to
}

/** The number, unit or span that begins at a token, in the first language that has it. */
function pieceAt(tokens: readonly Token[], at: number, own: Language): Piece {
  const token = tokens[at]
  if (token === undefined || token.kind === 'break') return { kind: 'rest', size: 1 }
  if (token.kind === 'number') {
    return Number.isNaN(token.value)
      ? { kind: 'rest', size: 1 }
      : { kind: 'value', value: token.value, weak: false, size: 1 }
  }
  const isHome = exactKeys(token.text, own).length > 0 || exactKeys(token.text, 'en').length > 0
  for (const language of languageOrder(own)) {
    // "no" is nine to a Bengali and a refusal to everyone else.
    if (isHome && language !== own && language !== 'en') continue
    const piece = pieceIn(languagePacks[language], tokens, at)
    if (piece) return piece
  }
  return { kind: 'rest', size: 1 }
}

function pieceIn(pack: LanguagePack, tokens: readonly Token[], at: number): Piece | null {
  const span = longest(pack.spans, tokens, at, pack)
  if (span) return { kind: 'span', minutes: span.value, size: span.size }
  const half = longest(pack.halves, tokens, at, pack)
  if (half) return { kind: 'half', part: half.value, size: half.size }
  const shift = longest(pack.shifts ?? {}, tokens, at, pack)
  if (shift) return { kind: 'shift', by: shift.value, size: shift.size }
  const value = longest(pack.numbers, tokens, at, pack)
  if (value) return { kind: 'value', value: value.value, weak: false, size: value.size }
  const weak = longest(pack.weakNumbers, tokens, at, pack)
  if (weak) return { kind: 'value', value: weak.value, weak: true, size: weak.size }
  const unit = unitOf(pack, tokens[at])
  return unit && { kind: 'unit', unit, size: 1 }
}

function sameWord(written: string, known: string, pack: LanguagePack): boolean {
  if (written === known) return true
  if (known.length < 4 && pack.spelling === 'latin') return false
  if (pack.spelling === 'latin') return squeeze(written) === squeeze(known)
  return /[a-z]/.test(known)
    ? foldRoman(written) === foldRoman(known)
    : foldBengali(written) === foldBengali(known)
}

function longest(
  table: Readonly<Record<string, number>>,
  tokens: readonly Token[],
  at: number,
  pack: LanguagePack,
): { value: number; size: number } | null {
  let found: { value: number; size: number } | null = null
  for (const [entry, value] of Object.entries(table)) {
    const words = entry.split(' ')
    if (found && words.length <= found.size) continue
    const fits = words.every((word, offset) => {
      const token = tokens[at + offset]
      return token?.kind === 'word' && sameWord(token.text, word, pack)
    })
    if (fits) found = { value, size: words.length }
  }
  return found
}

function unitOf(pack: LanguagePack, token: Token | undefined): NumberUnit | null {
  if (token?.kind !== 'word') return null
  for (const unit of ['minute', 'hour', 'second', 'other'] as const) {
    const words = pack.units[unit].split(',').map((word) => word.trim())
    const fits = words.some((word) =>
      word.endsWith('*')
        ? token.text.startsWith(word.slice(0, -1))
        : sameWord(token.text, word, pack),
    )
    if (fits) return unit
  }
  return null
}
