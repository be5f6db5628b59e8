import type { Transaction } from '@/db/client'
import { findDepot, insertDepot, listInHand, listParts } from '@/db/queries/depot'
import { insertStockMove, lockShelf } from '@/db/queries/promise'
import { insertAudit } from '@/db/queries/staff'
import type { Deps } from '@/lib/deps'
import { allow, type Actor } from '@/lib/domain/role'
import type { DepotInput, StockInput } from '@/lib/schemas/depot'

type Kept = { ok: true; depotId: string } | { ok: false; reason: string }

const NO_PART = 'There is no such part.'

function written(stock: DepotInput['stock']): { partId: string; quantity: number }[] {
  return stock.flatMap(({ partId, quantity }) => (quantity === null ? [] : [{ partId, quantity }]))
}

async function knowsParts(tx: Transaction, stock: DepotInput['stock']): Promise<boolean> {
  const known = new Set((await listParts(tx)).map(({ id }) => id))
  return stock.every(({ partId }) => known.has(partId))
}

/** Keeps a new depot and what lies in it, as moves of the ledger. */
export async function enterDepot(deps: Deps, actor: Actor, input: DepotInput): Promise<Kept> {
  allow(actor, 'keep stock')
  const at = deps.clock.now()
  const { staffId } = actor
  return deps.store.transaction(async (tx) => {
    if (!(await knowsParts(tx, input.stock))) return { ok: false, reason: NO_PART }
    const made = await insertDepot(tx, { name: input.name, place: input.place, createdAt: at })
    if (!made) return { ok: false, reason: 'Another depot has this name.' }
    for (const { partId, quantity } of written(input.stock)) {
      if (quantity === 0) continue
      await insertStockMove(tx, {
        depotId: made.id,
        partId,
        quantity,
        why: 'received',
        staffId,
        at,
      })
    }
    const subject = { subject: 'depot', subjectId: made.id }
    await insertAudit(tx, { staffId, act: 'enter depot', ...subject, detail: { ...input }, at })
    return { ok: true, depotId: made.id }
  })
}

/**
 * Writes down what came in, or what was found on the shelf. A count becomes the difference to the ledger, under a
 * lock, so that a part handed over meanwhile is not counted twice.
 */
export async function countStock(
  deps: Deps,
  actor: Actor,
  { depotId, why, stock }: StockInput & { depotId: string },
): Promise<Kept> {
  allow(actor, 'keep stock')
  const at = deps.clock.now()
  const { staffId } = actor
  return deps.store.transaction(async (tx) => {
    if (!(await findDepot(tx, depotId))) return { ok: false, reason: 'not found' }
    if (!(await knowsParts(tx, stock))) return { ok: false, reason: NO_PART }
    // In one order, so that two counts at once never wait for each other.
    const inOrder = written(stock).toSorted((a, b) => (a.partId < b.partId ? -1 : 1))
    for (const { partId } of inOrder) await lockShelf(tx, partId)
    const ledger = await listInHand(tx)
    for (const { partId, quantity } of inOrder) {
      const known = ledger.find((row) => row.depotId === depotId && row.partId === partId)
      const moved = why === 'counted' ? quantity - (known?.inHand ?? 0) : quantity
      if (moved === 0) continue
      await insertStockMove(tx, { depotId, partId, quantity: moved, why, staffId, at })
    }
    const subject = { subject: 'depot', subjectId: depotId }
    await insertAudit(tx, { staffId, act: `stock ${why}`, ...subject, detail: { stock }, at })
    return { ok: true, depotId }
  })
}
