/** A line of the stock ledger: what came into a depot (above 0) or went out of it (under 0). */
export type StockMove = { quantity: number; at: number }

/** What stands in a depot, from its ledger. Lines are added, never changed. */
export function onHand(moves: readonly Pick<StockMove, 'quantity'>[]): number {
  return moves.reduce((sum, { quantity }) => sum + quantity, 0)
}

/**
 * What may still be promised: on hand less the promises not yet handed over. Under 0 when more is
 * owed than there is.
 */
export function available({ onHand: standing, promised }: { onHand: number; promised: number }) {
  return standing - promised
}

/** The line that makes the ledger agree with a count; null when it agrees already. */
export function countCorrection(
  moves: readonly Pick<StockMove, 'quantity'>[],
  counted: number,
): number | null {
  const difference = counted - onHand(moves)
  return difference === 0 ? null : difference
}

/**
 * How often and how long a depot had none of a part between two instants. Lines before `from` only
 * set what stood there at first; a depot that never had the part counts as out of it.
 */
export function stockOuts(
  moves: readonly StockMove[],
  { from, to }: { from: number; to: number },
): { times: number; milliseconds: number } {
  const inOrder = moves.filter(({ at }) => at < to).sort((one, other) => one.at - other.at)
  let standing = onHand(inOrder.filter(({ at }) => at <= from))
  let outSince = standing <= 0 ? from : null
  let times = outSince === null ? 0 : 1
  let milliseconds = 0
  for (const { quantity, at } of inOrder.filter((move) => move.at > from)) {
    standing += quantity
    if (standing <= 0 && outSince === null) {
      outSince = at
      times += 1
    } else if (standing > 0 && outSince !== null) {
      milliseconds += at - outSince
      outSince = null
    }
  }
  return { times, milliseconds: milliseconds + (outSince === null ? 0 : to - outSince) }
}
