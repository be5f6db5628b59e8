import type { Transaction } from '@/db/client'
import { findHousehold } from '@/db/queries/kit-facts'
import { updateText, type TextRow } from '@/db/queries/text'
import { findWordingInUse } from '@/db/queries/wording'
import { renderWording, segmentsOf } from '@/lib/domain/wording'
import { settingsNow } from './settings-now'

/**
 * Words a text that waited anew when another edition has come into use meanwhile, so that what a
 * coordinator approved is what goes out. An agent's own words are never touched.
 */
export async function rewordText(tx: Transaction, text: TextRow): Promise<TextRow> {
  if (!text.moment || !text.wordingId || !text.householdId || text.staffId) return text
  const wording = await findWordingInUse(tx, text.moment, text.language)
  if (!wording || wording.id === text.wordingId) return text
  const household = await findHousehold(tx, text.householdId)
  const { programme } = await settingsNow(tx)
  const values = { programme: programme.name, house: household?.name ?? '', ...text.values }
  const rendered = renderWording(wording.body, values, wording.language)
  if (!rendered.ok) return text
  const change = {
    body: rendered.text,
    wordingId: wording.id,
    segments: segmentsOf(rendered.text).segments,
  }
  await updateText(tx, text.id, change)
  return { ...text, ...change }
}
