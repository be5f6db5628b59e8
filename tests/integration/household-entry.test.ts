import { eq, sql } from 'drizzle-orm'
import { beforeEach, describe, expect, it } from 'vitest'
import { findKitFacts, findLastReading, listOpenFittings } from '@/db/queries/kit-facts'
import { consents } from '@/db/schema/consent'
import { householdPhones, households, phones } from '@/db/schema/household'
import { kits } from '@/db/schema/kit'
import { audit } from '@/db/schema/staff'
import { NotAllowedError } from '@/lib/domain/role'
import { enterHousehold } from '@/lib/services/enter-household'
import { testDeps, type TestDeps } from '../factories/deps'
import {
  entered,
  householdInput,
  programme,
  signedIn,
  type Programme,
} from '../factories/programme'

let deps: TestDeps
let place: Programme

beforeEach(async () => {
  deps = await testDeps({ at: '2026-03-02T15:00:00Z' })
  place = await programme(deps)
})

async function rowsOf(table: typeof households | typeof phones | typeof kits) {
  const [row] = await deps.store.db.select({ n: sql<number>`count(*)::int` }).from(table)
  return row?.n
}

describe('a household entered by the form', () => {
  it('has its kit with every stage fitted and due by its own months', async () => {
    const { kitId } = await entered(deps, place)
    const fittings = await listOpenFittings(deps.store.db, kitId)
    expect(
      fittings.map(({ fitting }) => [fitting.position, fitting.fittedOn, fitting.dueOn]),
    ).toEqual([
      [1, '2026-03-01', '2026-04-01'],
      [2, '2026-03-01', '2026-06-01'],
      [3, '2026-03-01', '2027-03-01'],
    ])
  })

  it('is to wash sooner in a wet month than in a dry one', async () => {
    const wet = await entered(deps, place)
    const dry = await entered(deps, place, {
      kit: { modelId: place.modelId, handedOverOn: '2025-11-01' },
    })
    const washOn = async (kitId: string) =>
      (await findKitFacts(deps.store.db, kitId))?.kit.nextWashOn
    // Cloudy water: 14 days, and 0.7 of them in a wet month.
    expect(await washOn(wet.kitId)).toBe('2026-03-10')
    expect(await washOn(dry.kitId)).toBe('2025-11-15')
  })

  it('is asked for a flow reading 60 days on', async () => {
    const { kitId } = await entered(deps, place)
    const facts = await findKitFacts(deps.store.db, kitId)
    expect(facts?.kit.nextFlowCheckOn).toBe('2026-04-30')
  })

  it('keeps its first reading as read and at 20 °C', async () => {
    const { kitId } = await entered(deps, place)
    const reading = await findLastReading(deps.store.db, kitId)
    expect(reading).toMatchObject({ seconds: 240, celsius: 20, celsiusFrom: 'told', headRatio: 1 })
    expect(reading?.litresPerHour).toBeCloseTo(15)
    expect(reading?.normalised).toBeCloseTo(15)
    // Noon of the hand-over day in an area four hours behind UTC.
    expect(reading?.at).toBe(Date.parse('2026-03-01T16:00:00Z'))
  })

  it('takes the area’s month for the water’s warmth when nobody measured it', async () => {
    const { kitId } = await entered(deps, place, { reading: { minutes: 4, celsius: null } })
    const reading = await findLastReading(deps.store.db, kitId)
    expect(reading).toMatchObject({ celsius: 21, celsiusFrom: 'area month' })
    expect(reading?.normalised).toBeLessThan(15)
  })

  it('numbers kits one after the other', async () => {
    const first = await entered(deps, place)
    const second = await entered(deps, place)
    expect(second.kitNumber).toBe(first.kitNumber + 1)
  })

  it('is written into the audit, without the phone number', async () => {
    const { householdId } = await entered(deps, place)
    const [row] = await deps.store.db.select().from(audit).where(eq(audit.subjectId, householdId))
    expect(row).toMatchObject({ act: 'enter household', staffId: place.coordinator.staffId })
    expect(JSON.stringify(row?.detail)).not.toContain('5550142')
  })
})

describe('a phone', () => {
  it('has the family’s yes with how and by whom', async () => {
    const { phoneId } = await entered(deps, place)
    const [yes] = await deps.store.db.select().from(consents)
    expect(yes).toMatchObject({ phoneId, consent: 'given', how: 'on paper, by Rosa Orellana' })
    const [phone] = await deps.store.db.select().from(phones)
    expect(phone?.consent).toBe('given')
  })

  it('stays without consent where none was given, and that is said', async () => {
    const { notes } = await entered(deps, place, { consent: null })
    const [phone] = await deps.store.db.select().from(phones)
    expect(phone?.consent).toBe('none')
    expect(notes.join(' ')).toContain('nothing is sent until it is given')
  })

  it('that another house has is shared, once, and that is said', async () => {
    await entered(deps, place)
    const second = await entered(deps, place, { name: 'Quispe house' })
    expect(await rowsOf(phones)).toBe(1)
    expect(second.notes.join(' ')).toContain('also answers for Orellana house')
    const links = await deps.store.db.select().from(householdPhones)
    expect(links.map(({ first }) => first)).toEqual([true, true])
  })

  it('that opted out is not talked into a yes at the door', async () => {
    const { phoneId } = await entered(deps, place)
    await deps.store.db.update(phones).set({ consent: 'withdrawn' }).where(eq(phones.id, phoneId))
    const second = await entered(deps, place, { name: 'Quispe house' })
    const [phone] = await deps.store.db.select().from(phones)
    expect(phone?.consent).toBe('withdrawn')
    expect(second.notes.join(' ')).toContain('has opted out')
  })

  it('that looks unused is taken, with a word to read it once more', async () => {
    const { notes } = await entered(deps, place, {
      phones: [{ number: '+12005550142', answeredBy: '' }],
    })
    expect(notes.join(' ')).toContain('does not look like a number in use')
  })

  it('may be one of several: prompts go to the first', async () => {
    const { householdId, phoneId } = await entered(deps, place, {
      phones: [
        { number: '+15055550142', answeredBy: 'the mother' },
        { number: '+15055550143', answeredBy: 'a son' },
      ],
    })
    const links = await deps.store.db
      .select()
      .from(householdPhones)
      .where(eq(householdPhones.householdId, householdId))
    expect(links.filter(({ first }) => first).map((link) => link.phoneId)).toEqual([phoneId])
  })
})

describe('an entry that is refused', () => {
  it.each([
    ['an area that is not there', { areaId: 'nowhere' }, 'There is no such area.'],
    [
      'a kit handed over tomorrow',
      { kit: { modelId: '', handedOverOn: '2026-03-03' } },
      'The day of the hand-over lies ahead.',
    ],
  ])('for %s leaves nothing behind', async (_what, change, reason) => {
    const whole = householdInput(place, change)
    const kit = { ...whole.kit, modelId: place.modelId }
    const result = await enterHousehold(deps, place.coordinator, { ...whole, kit })
    expect(result).toEqual({ ok: false, reason })
    expect([await rowsOf(households), await rowsOf(phones), await rowsOf(kits)]).toEqual([0, 0, 0])
  })

  it('for a fault half way leaves nothing behind either', async () => {
    const broken = householdInput(place, { reading: { minutes: -4, celsius: 20 } })
    await expect(enterHousehold(deps, place.coordinator, broken)).rejects.toThrow()
    expect([await rowsOf(households), await rowsOf(phones), await rowsOf(kits)]).toEqual([0, 0, 0])
  })

  it('for a visitor never begins', async () => {
    const visitor = await signedIn(deps, 'visitor')
    const entry = enterHousehold(deps, visitor, householdInput(place))
    await expect(entry).rejects.toBeInstanceOf(NotAllowedError)
  })
})
