import { createHmac } from 'node:crypto'
import type { Handle, Transaction } from '@/db/client'
import {
  deleteSuppression,
  hasOtherKey,
  hasSuppression,
  insertSuppressions,
  listWithdrawnNumbers,
} from '@/db/queries/suppression'
import type { Deps } from '@/lib/deps'

/** So many are kept by one statement, which the database takes only so many values with. */
const NUMBERS_AT_ONCE = 1000

type Keyed = Pick<Deps, 'suppressionKey'>

const keyed = ({ suppressionKey }: Keyed, what: string) =>
  createHmac('sha256', suppressionKey).update(what).digest('hex')

const hashOf = (deps: Keyed, e164: string) => keyed(deps, `number:${e164}`)
const markOf = (deps: Keyed) => keyed(deps, 'mark').slice(0, 12)

/** Keeps that this number wants no texts, in a form that no list of numbers can be read from. */
export async function suppressNumber(
  tx: Transaction,
  deps: Pick<Deps, 'suppressionKey' | 'clock'>,
  e164: string,
): Promise<void> {
  const at = deps.clock.now()
  await insertSuppressions(tx, [{ hash: hashOf(deps, e164), keyMark: markOf(deps), at }])
}

/** The number itself asked for texts again. */
export async function liftSuppression(tx: Transaction, deps: Keyed, e164: string): Promise<void> {
  await deleteSuppression(tx, hashOf(deps, e164))
}

/** True if this number ever asked for no texts and has not asked for them since. */
export function isSuppressed(db: Handle, deps: Keyed, e164: string): Promise<boolean> {
  return hasSuppression(db, hashOf(deps, e164))
}

/**
 * Keeps the numbers of phones that opted out before suppressions were kept. Throws where the numbers were kept with
 * another key: no number would be recognised, and people who said no would be texted again.
 */
export async function keepSuppressions(tx: Transaction, deps: Deps): Promise<void> {
  if (await hasOtherKey(tx, markOf(deps))) {
    throw new Error(
      'SUPPRESSION_KEY is not the key that opted-out numbers were kept with (NEXTAUTH_SECRET, where none was set): set it to that one.',
    )
  }
  const kept = { keyMark: markOf(deps), at: deps.clock.now() }
  for (let after: string | undefined = ''; after !== undefined;) {
    const numbers = await listWithdrawnNumbers(tx, { after, limit: NUMBERS_AT_ONCE })
    await insertSuppressions(
      tx,
      numbers.map((e164) => ({ hash: hashOf(deps, e164), ...kept })),
    )
    after = numbers.at(-1)
  }
}
