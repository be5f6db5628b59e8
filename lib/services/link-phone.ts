import type { Transaction } from '@/db/client'
import { listSharers, upsertHouseholdPhone, upsertPhone } from '@/db/queries/household'
import { insertConsent } from '@/db/queries/phone'
import type { Deps } from '@/lib/deps'
import { looksUnused, spacedNumber } from '@/lib/schemas/phone-number'
import { isSuppressed } from './suppress-number'

type Link = {
  householdId: string
  /** E.164. */
  number: string
  answeredBy: string
  first: boolean
  consent: { how: string; by: string } | null
  staffId: string
  at: number
}

type Linked = { phoneId: string; notes: string[] }

type Phone = Awaited<ReturnType<typeof upsertPhone>>['phone']

/** What keeps a known phone from being texted; the carrier's block ends only with a START from the phone. */
function silenceNotes(phone: Phone): string[] {
  const number = spacedNumber(phone.e164)
  if (phone.state !== 'active') {
    return [`${number} is ${phone.state} (${phone.stateWhy}): nothing is sent to it.`]
  }
  if (phone.consent === 'withdrawn' || phone.carrierBlocked) {
    return [`${number} has opted out: only the word START from it brings texts back.`]
  }
  return []
}

/**
 * Makes a phone answer for a household. A number that is known already is shared, and said to be. A yes given at
 * the door is written down, but never over a no that came from the phone itself.
 */
export async function linkPhone(tx: Transaction, deps: Deps, link: Link): Promise<Linked> {
  const { householdId, number, answeredBy, first, consent, staffId, at } = link
  const { phone, isNew } = await upsertPhone(tx, { e164: number, createdAt: at })
  if (phone.consent !== 'withdrawn' && (await isSuppressed(tx, deps, number))) {
    const how = 'opted out before this entry'
    await insertConsent(tx, { phoneId: phone.id, consent: 'withdrawn', how, at })
    phone.consent = 'withdrawn'
  }
  await upsertHouseholdPhone(tx, { householdId, phoneId: phone.id, answeredBy, first })
  const notes = silenceNotes(phone)
  const sharers = await listSharers(tx, [phone.id], householdId)
  if (sharers.length > 0) {
    const names = sharers.map(({ name }) => name).join(', ')
    notes.push(`${spacedNumber(number)} also answers for ${names}: the phone is shared.`)
  }
  if (isNew && looksUnused(number)) {
    notes.push(`${spacedNumber(number)} does not look like a number in use: read it once more.`)
  }
  const mayConsent = phone.consent !== 'withdrawn' && !phone.carrierBlocked
  if (consent && mayConsent) {
    const how = `${consent.how}, by ${consent.by}`
    await insertConsent(tx, { phoneId: phone.id, consent: 'given', how, staffId, at })
  }
  if (!consent && phone.consent === 'none') {
    notes.push(`No consent for ${spacedNumber(number)} yet: nothing is sent until it is given.`)
  }
  return { phoneId: phone.id, notes }
}
