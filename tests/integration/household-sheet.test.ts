import { eq } from 'drizzle-orm'
import { beforeEach, describe, expect, it } from 'vitest'
import { insertReading, insertWash, listOpenFittings } from '@/db/queries/kit-facts'
import { updatePhone } from '@/db/queries/phone'
import { upsertPrompt } from '@/db/queries/prompt'
import { insertText } from '@/db/queries/text'
import { phones } from '@/db/schema/household'
import { kits } from '@/db/schema/kit'
import { householdSheetSchema } from '@/lib/schemas/household'
import { changeHousehold, reinstatePhone } from '@/lib/services/change-household'
import { householdSheet } from '@/lib/services/household-sheet'
import { householdTexts } from '@/lib/services/list-slips'
import { testDeps, type TestDeps } from '../factories/deps'
import { entered, householdInput, programme, type Programme } from '../factories/programme'

let deps: TestDeps
let place: Programme
let home: Awaited<ReturnType<typeof entered>>

beforeEach(async () => {
  deps = await testDeps({ at: '2026-03-02T15:00:00Z' })
  place = await programme(deps)
  home = await entered(deps, place)
})

async function sheet() {
  const found = await householdSheet(deps, place.coordinator, home.householdId)
  return householdSheetSchema.parse(found)
}

async function readFlow(minutes: number, at: string) {
  const fittings = await listOpenFittings(deps.store.db, home.kitId)
  const flow = 60 / minutes
  await insertReading(deps.store.db, {
    kitId: home.kitId,
    fibreFittingId: fittings[2]?.fitting.id ?? '',
    litres: 1,
    seconds: minutes * 60,
    celsius: 20,
    celsiusFrom: 'told',
    litresPerHour: flow,
    normalised: flow,
    errorShare: 0.11,
    known: 'said',
    at: Date.parse(at),
  })
}

function change(over: Partial<Parameters<typeof changeHousehold>[2]> = {}) {
  const {
    phones: entry,
    kit: _kit,
    reading: _reading,
    areaId: _area,
    ...who
  } = householdInput(place)
  const [phone] = entry
  if (!phone) throw new Error('The family has a phone.')
  const input = { ...who, phone, householdId: home.householdId, ...over }
  return changeHousehold(deps, place.coordinator, input)
}

describe('the sheet of a household', () => {
  it('says who lives there, what they need and how to reach them', async () => {
    const { people, litresPerDay, phones: reached, area } = await sheet()
    expect([people, area.name]).toEqual([6, 'Loma Clara'])
    expect(litresPerDay).toBeCloseTo(31.8)
    expect(reached[0]).toMatchObject({
      number: '+1 505 555 0142',
      answeredBy: 'the mother',
      silentBecause: null,
    })
    expect(reached[0]?.history[0]?.words).toBe(
      'Said yes: on paper, by Rosa Orellana; written down by The coordinator',
    )
  })

  it('hangs the kit’s life on one line: what was, and what is planned, in order', async () => {
    await insertWash(deps.store.db, {
      kitId: home.kitId,
      washedOn: '2026-03-02',
      known: 'said',
      at: deps.clock.now(),
    })
    const [kit] = (await sheet()).kits
    expect(kit?.past.map(({ day, title }) => [day, title])).toEqual([
      ['1 Mar', 'Handed over'],
      ['2 Mar', 'Washed'],
    ])
    expect(kit?.planned.map(({ title }) => title)).toEqual([
      'Wash',
      'Change of cloth',
      'Flow reading',
      'Change of carbon',
      'Change of fibre',
    ])
  })

  it('forecasts from three readings on, and names the first one', async () => {
    expect((await sheet()).kits[0]?.flow.forecast.kind).toBe('too few')
    await readFlow(5, '2026-03-15T12:00:00Z')
    await readFlow(6, '2026-03-29T12:00:00Z')
    const flow = (await sheet()).kits[0]?.flow
    expect(flow?.points.map(({ note }) => note)).toEqual(['first reading', undefined, undefined])
    // At 21 and 20 °C (IAPWS SR6-08).
    expect(flow?.needLitresPerHour).toBeCloseTo((31.8 / 8) * (977.51 / 1001.57), 3)
    expect(flow?.forecast.kind).toBe('falls')
  })

  it('plans nothing for a kit that is retired', async () => {
    await deps.store.db.update(kits).set({ state: 'retired' }).where(eq(kits.id, home.kitId))
    expect((await sheet()).kits[0]?.planned).toEqual([])
  })

  it('is not found under another name', async () => {
    const found = await householdSheet(deps, place.coordinator, 'nobody')
    expect(found).toEqual({ ok: false, reason: 'not found' })
  })
})

describe('the texts with a household', () => {
  async function text(n: number) {
    await insertText(deps.store.db, {
      direction: 'out',
      purpose: `test:${n}`,
      phoneId: home.phoneId,
      householdId: home.householdId,
      e164: '+15055550142',
      language: 'es',
      body: `texto ${n}`,
      state: n === 60 ? 'failed' : 'delivered',
      stateWhy: n === 60 ? 'the number is not in use' : '',
      sendAfter: deps.clock.now(),
      createdAt: deps.clock.now(),
    })
  }

  it('come 50 at a time, oldest first, the last page first', async () => {
    for (let n = 1; n <= 60; n += 1) await text(n)
    const { slips } = await sheet()
    expect(slips.slips.map(({ body }) => body).slice(0, 1)).toEqual(['texto 11'])
    expect(slips.slips.at(-1)).toMatchObject({
      receipt: 'broken',
      receiptWords: 'failed: the number is not in use',
      day: '2 Mar 2026',
      time: '11:00',
    })
    const earlier = await householdTexts(deps, place.coordinator, {
      householdId: home.householdId,
      before: slips.before,
    })
    if ('ok' in earlier) throw new Error(earlier.reason)
    expect(earlier.slips.map(({ body }) => body)).toEqual(
      Array.from({ length: 10 }, (_, index) => `texto ${index + 1}`),
    )
    expect(earlier.before).toBeNull()
  })
})

describe('a change of a household', () => {
  it('of its water moves the next wash, counted from the last', async () => {
    await change({ sourceClass: 'very cloudy' })
    // 7 days, 0.7 of them in a wet month, but never under 5.
    const [kit] = (await sheet()).kits
    expect(kit?.planned[0]).toMatchObject({ title: 'Wash', day: '6 Mar' })
  })

  it('to another phone leaves the old one without this house', async () => {
    await change({ phone: { number: '+15055550199', answeredBy: 'a neighbour' } })
    const { phones: reached } = await sheet()
    expect(reached.map(({ e164, first }) => [e164, first])).toEqual([['+15055550199', true]])
    expect(reached[0]?.consent).toBe('given')
  })

  it('to another phone takes back the prompts that wait for the old one, not the advice', async () => {
    const text = (purpose: string, anyHour: boolean) =>
      insertText(deps.store.db, {
        direction: 'out',
        purpose,
        phoneId: home.phoneId,
        householdId: home.householdId,
        e164: '+15055550142',
        language: 'es',
        body: purpose,
        state: 'queued',
        anyHour,
        sendAfter: deps.clock.now(),
        createdAt: deps.clock.now(),
      })
    const prompt = await text('prompt:wash', false)
    await upsertPrompt(deps.store.db, {
      kitId: home.kitId,
      kind: 'wash',
      dueOn: '2026-03-02',
      textId: prompt!.id,
      createdAt: deps.clock.now(),
    })
    await text('advice', true)
    await change({ phone: { number: '+15055550199', answeredBy: '' } })
    const { slips, kits: shown } = await sheet()
    expect(slips.slips.map(({ body, receiptWords }) => [body, receiptWords])).toEqual([
      ['prompt:wash', 'not sent: the household has another phone'],
      ['advice', 'goes: 2 Mar 2026, 11:00'],
    ])
    expect(shown[0]?.past.at(-1)).toMatchObject({ title: 'Asked to wash', bead: 'broken' })
  })

  it('to another phone without a new yes sends nothing there', async () => {
    const result = await change({
      phone: { number: '+15055550199', answeredBy: '' },
      consent: null,
    })
    expect(result).toMatchObject({ ok: true })
    expect((await sheet()).phones[0]?.silentBecause).toBe('no consent yet')
  })

  it('with the same phone is no second yes', async () => {
    await change({ people: 7 })
    const { people, phones: reached } = await sheet()
    expect([people, reached[0]?.history.length]).toEqual([7, 1])
  })
})

describe('a suspended phone', () => {
  beforeEach(() =>
    updatePhone(deps.store.db, home.phoneId, { state: 'suspended', stateWhy: 'wrong number' }),
  )

  it('is shown with why', async () => {
    expect((await sheet()).phones[0]?.silentBecause).toBe('suspended: wrong number')
  })

  it('is texted again once somebody has talked to the family', async () => {
    const how = 'talked to Rosa at home'
    const result = await reinstatePhone(deps, place.coordinator, { phoneId: home.phoneId, how })
    expect(result.ok).toBe(true)
    const [phone] = (await sheet()).phones
    expect(phone?.silentBecause).toBeNull()
    expect(phone?.history.at(-1)?.words).toContain('reinstated: talked to Rosa at home')
    const again = await reinstatePhone(deps, place.coordinator, { phoneId: home.phoneId, how })
    expect(again).toEqual({ ok: false, reason: 'This phone is not suspended.' })
  })

  it('that opted out stays silent even when reinstated', async () => {
    const { db } = deps.store
    await db.update(phones).set({ consent: 'withdrawn' }).where(eq(phones.id, home.phoneId))
    await reinstatePhone(deps, place.coordinator, { phoneId: home.phoneId, how: 'talked' })
    expect((await sheet()).phones[0]?.silentBecause).toBe('opted out')
  })
})
