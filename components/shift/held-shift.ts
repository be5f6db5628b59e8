import type { Shift, ShiftBand, ShiftRow } from '@/lib/schemas/shift'

/** A row as shown: one that has ended meanwhile keeps its place until the eye leaves it. */
export type ShownRow = ShiftRow & { gone?: boolean }
export type ShownBand = Omit<ShiftBand, 'rows'> & { rows: ShownRow[] }

const rowsOf = (bands: readonly ShiftBand[]) => bands.flatMap(({ rows }) => rows)

/**
 * The newest state in the order of an older one: what somebody looks at neither moves nor vanishes.
 * `newcomers` are the rows that the older state did not have, worst first.
 */
export function holdShift(
  base: Pick<Shift, 'bands'>,
  fresh: Pick<Shift, 'bands'>,
): { bands: ShownBand[]; newcomers: ShiftRow[] } {
  const now = new Map(rowsOf(fresh.bands).map((row) => [row.ticketId, row]))
  const notes = new Map(fresh.bands.map(({ name, note }) => [name, note]))
  const known = new Set(rowsOf(base.bands).map(({ ticketId }) => ticketId))
  return {
    bands: base.bands.map((band) => ({
      ...band,
      note: notes.get(band.name) ?? band.note,
      rows: band.rows.map((row) => now.get(row.ticketId) ?? { ...row, gone: true }),
    })),
    newcomers: rowsOf(fresh.bands).filter(({ ticketId }) => !known.has(ticketId)),
  }
}

/** The rows that speak of what is looked for, in their bands; empty bands are left out. */
export function findInShift(bands: readonly ShownBand[], sought: string): ShownBand[] {
  const wanted = sought.trim().toLowerCase()
  if (wanted === '') return [...bands]
  const speaksOf = ({ house, area, sentence, words, about }: ShownRow) =>
    [house, area, sentence, words, about].some((text) => text?.toLowerCase().includes(wanted))
  return bands
    .map((band) => ({ ...band, rows: band.rows.filter(speaksOf) }))
    .filter(({ rows }) => rows.length > 0)
}
