import type { Handle } from '@/db/client'
import {
  findHousehold,
  listConsents,
  listPhonesOfHouseholds,
  listSharers,
  type HouseholdInArea,
} from '@/db/queries/household'
import { listKitsOfHousehold } from '@/db/queries/kit'
import type { Deps } from '@/lib/deps'
import { dailyNeed } from '@/lib/domain/need'
import { allow, type Actor } from '@/lib/domain/role'
import { localDay } from '@/lib/domain/round'
import { silenceWords } from '@/lib/domain/silence-words'
import { dayWords, momentWords } from '@/lib/domain/stamp'
import type { HouseholdSheet, PhoneView } from '@/lib/schemas/household'
import { spacedNumber } from '@/lib/schemas/phone-number'
import { kitSheet } from './kit-sheet'
import { slipPage } from './list-slips'
import { areaCelsius } from './area-celsius'
import { settingsNow } from './settings-now'

type ConsentRow = Awaited<ReturnType<typeof listConsents>>[number]

function consentWords({ consent, staffName, body }: ConsentRow): string {
  const did = consent.consent === 'given' ? 'Said yes' : 'Opted out'
  const source = body === null ? '' : ` (“${body}”)`
  const kept = staffName === null ? '' : `; written down by ${staffName}`
  return `${did}: ${consent.how}${source}${kept}`
}

async function phoneViews(db: Handle, { household, area }: HouseholdInArea): Promise<PhoneView[]> {
  const linked = await listPhonesOfHouseholds(db, [household.id])
  const phoneIds = linked.map(({ phone }) => phone.id)
  const consents = await listConsents(db, phoneIds)
  const sharers = await listSharers(db, phoneIds, household.id)
  return linked.map(({ link, phone }) => ({
    id: phone.id,
    number: spacedNumber(phone.e164),
    e164: phone.e164,
    answeredBy: link.answeredBy,
    first: link.first,
    state: phone.state,
    stateWhy: phone.stateWhy,
    consent: phone.consent,
    silentBecause: silenceWords(phone),
    sharedWith: sharers
      .filter(({ phoneId }) => phoneId === phone.id)
      .map(({ id, name }) => ({ id, name })),
    history: consents
      .filter(({ consent }) => consent.phoneId === phone.id)
      .map((row) => ({
        n: row.consent.n,
        when: momentWords(row.consent.at, area.timeZone),
        words: consentWords(row),
      })),
  }))
}

/** All that is known of a household, for its sheet. */
export async function householdSheet(
  deps: Deps,
  actor: Actor,
  householdId: string,
): Promise<HouseholdSheet | { ok: false; reason: string }> {
  allow(actor, 'see households')
  const { db } = deps.store
  const found = await findHousehold(db, householdId)
  if (!found) return { ok: false, reason: 'not found' }
  const { household, area } = found
  const { id: areaId, name: areaName, timeZone } = area
  const now = deps.clock.now()
  const today = localDay(now, timeZone)
  const settings = await settingsNow(db)
  const litresPerDay = dailyNeed({ people: household.people, ...settings.need })
  const celsius = areaCelsius(area, now)
  const kits = []
  for (const { kit, model } of await listKitsOfHousehold(db, householdId)) {
    kits.push(
      await kitSheet(db, { kit, model, timeZone, now, today, litresPerDay, celsius, settings }),
    )
  }
  const { areaId: _areaId, createdAt, movedAt, ...who } = household
  return {
    ...who,
    area: { id: areaId, name: areaName, timeZone },
    litresPerDay,
    enteredOn: dayWords(localDay(createdAt, timeZone)),
    movedOn: movedAt === null ? null : dayWords(localDay(movedAt, timeZone)),
    today: dayWords(today),
    phones: await phoneViews(db, found),
    kits: kits.map(({ view }) => view),
    ticket: kits.find(({ ticket }) => ticket !== null)?.ticket ?? null,
    slips: await slipPage(db, { householdId, timeZone, before: null }),
  }
}
