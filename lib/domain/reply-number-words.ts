import type { Language } from './language'
import { exactKeys, languagePacks, listed, respelt } from './reply-lexicon'
import type { Token } from './reply-tokens'
import type { LanguagePack, NumberUnit } from './reply-words/concept'

/** One number word, unit or span of time, `size` tokens long. */
export type NumberPiece =
  | { kind: 'value'; value: number; weak: boolean; size: number }
  | { kind: 'unit'; unit: NumberUnit; size: number }
  | { kind: 'span'; minutes: number; size: number }
  | { kind: 'half'; part: number; size: number }
  | { kind: 'shift'; by: number; size: number }
  | { kind: 'rest'; size: number }

type Row = { words: string[]; respelled: string[]; value: number }
type Table = Map<string, Row[]>
type Tables = Record<'spans' | 'halves' | 'shifts' | 'numbers' | 'weakNumbers', Table> & {
  units: { unit: NumberUnit; word: string }[]
}

function tableOf(text: string, language: Language): Table {
  const table: Table = new Map()
  for (const entry of listed(text)) {
    const words = entry.split(' ')
    const value = Number(words.pop())
    const respelled = words.map((word) => respelt(word, language))
    const first = respelled[0] ?? ''
    table.set(first, [...(table.get(first) ?? []), { words, respelled, value }])
  }
  return table
}

function tablesOf(language: Language): Tables {
  const pack: LanguagePack = languagePacks[language]
  const units = (['minute', 'hour', 'second', 'other'] as const).flatMap((unit) =>
    listed(pack.units[unit]).map((word) => ({ unit, word })),
  )
  return {
    spans: tableOf(pack.spans, language),
    halves: tableOf(pack.halves, language),
    shifts: tableOf(pack.shifts ?? '', language),
    numbers: tableOf(pack.numbers, language),
    weakNumbers: tableOf(pack.weakNumbers, language),
    units,
  }
}

const built = new Map<Language, Tables>()

function tablesFor(language: Language): Tables {
  const known = built.get(language)
  if (known) return known
  const tables = tablesOf(language)
  built.set(language, tables)
  return tables
}

/**
 * The number, unit or span that begins at a token, in the first language that has it. English counts
 * where the household's own language does not know the word, the others where English does not
 * either: "no" is nine to a Bengali and a refusal to everyone else.
 */
export function numberPieceAt(
  tokens: readonly Token[],
  at: number,
  order: readonly Language[],
): NumberPiece {
  const token = tokens[at]
  if (token === undefined || token.kind === 'break') return { kind: 'rest', size: 1 }
  if (token.kind === 'number') {
    if (Number.isNaN(token.value)) return { kind: 'rest', size: 1 }
    return { kind: 'value', value: token.value, weak: false, size: 1 }
  }
  for (const language of askedIn(token.text, order)) {
    const piece = pieceIn(language, tokens, at)
    if (piece) return piece
  }
  return { kind: 'rest', size: 1 }
}

function askedIn(word: string, order: readonly Language[]): readonly Language[] {
  for (const nearest of [1, 2]) {
    const near = order.slice(0, nearest)
    if (near.some((language) => exactKeys(word, language).length > 0)) return near
  }
  return order
}

function pieceIn(language: Language, tokens: readonly Token[], at: number): NumberPiece | null {
  const tables = tablesFor(language)
  const look = (table: Table) => longest(table, tokens, { at, language })
  const span = look(tables.spans)
  if (span) return { kind: 'span', minutes: span.value, size: span.words.length }
  const half = look(tables.halves)
  if (half) return { kind: 'half', part: half.value, size: half.words.length }
  const shift = look(tables.shifts)
  if (shift) return { kind: 'shift', by: shift.value, size: shift.words.length }
  const value = look(tables.numbers)
  if (value) return { kind: 'value', value: value.value, weak: false, size: value.words.length }
  const weak = look(tables.weakNumbers)
  if (weak) return { kind: 'value', value: weak.value, weak: true, size: weak.words.length }
  const unit = unitOf(tables, tokens[at], language)
  return unit && { kind: 'unit', unit, size: 1 }
}

function longest(
  table: Table,
  tokens: readonly Token[],
  { at, language }: { at: number; language: Language },
): Row | null {
  const token = tokens[at]
  if (token?.kind !== 'word') return null
  let found: Row | null = null
  for (const row of table.get(respelt(token.text, language)) ?? []) {
    if (found && row.words.length <= found.words.length) continue
    if (row.words.every((_, offset) => fits(row, offset, { tokens, at, language }))) found = row
  }
  return found
}

function fits(
  row: Row,
  offset: number,
  { tokens, at, language }: { tokens: readonly Token[]; at: number; language: Language },
): boolean {
  const token = tokens[at + offset]
  if (token?.kind !== 'word') return false
  const word = row.words[offset] ?? ''
  // Three letters are never respelled, but for Bengali, whose spelling in Latin letters is free.
  if (token.text === word) return true
  if (word.length <= 3 && language !== 'bn') return false
  // "Dhui" (I wash) is a word of its own, not a way of writing "dui" (two).
  if (exactKeys(token.text, language).length > 0) return false
  return respelt(token.text, language) === row.respelled[offset]
}

function unitOf(tables: Tables, token: Token | undefined, language: Language): NumberUnit | null {
  if (token?.kind !== 'word') return null
  const exact = tables.units.find(({ word }) =>
    word.endsWith('*') ? token.text.startsWith(word.slice(0, -1)) : token.text === word,
  )
  if (exact) return exact.unit
  if (token.text.length <= 3) return null
  const written = respelt(token.text, language)
  return (
    tables.units.find(({ word }) => word.length > 3 && respelt(word, language) === written)?.unit ??
    null
  )
}
