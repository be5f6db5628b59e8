import type { Transaction } from '@/db/client'
import { insertConsent, updatePhone } from '@/db/queries/phone'
import type { TextRow } from '@/db/queries/text'
import type { Deps } from '@/lib/deps'
import { liftSuppression, suppressNumber } from './suppress-number'

/**
 * A number says by text that it wants texts or wants none, whoever it belongs to. The phone's row and the
 * suppression change together: where they differ, nothing is sent.
 */
export async function changeConsent(
  tx: Transaction,
  deps: Deps,
  { text, consent }: { text: TextRow; consent: 'given' | 'withdrawn' },
): Promise<void> {
  const { id: textId, phoneId, e164 } = text
  const isYes = consent === 'given'
  if (phoneId) {
    await insertConsent(tx, { phoneId, consent, how: 'by text', textId, at: deps.clock.now() })
    // A phone whose owner opts in again is reachable again, as far as we know.
    if (isYes) await updatePhone(tx, phoneId, { carrierBlocked: false })
  }
  if (isYes) await liftSuppression(tx, deps, e164)
  else await suppressNumber(tx, deps, e164)
}
