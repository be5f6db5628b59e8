import { and, eq } from 'drizzle-orm'
import { beforeEach, describe, expect, test } from 'vitest'
import { consents, suppressions } from '@/db/schema/consent'
import { householdPhones, phones } from '@/db/schema/household'
import { texts } from '@/db/schema/text'
import { planPrompts } from '@/lib/services/plan-prompts'
import { prepareDesk } from '@/lib/services/prepare-desk'
import { sendDueTexts } from '@/lib/services/send-text'
import { testDeps, type TestDeps } from '../factories/deps'
import { houseIn, say, world, type World } from '../factories/world'

const number = '+12025550101'

let deps: TestDeps
let place: World

const house = () => houseIn(deps, place, { number, handedOverOn: '2026-03-02' })

/** As an erasure leaves it: no row holds the number any more. */
async function forgetPhone() {
  const { db } = deps.store
  await db.update(texts).set({ phoneId: null })
  await db.delete(consents)
  await db.delete(householdPhones)
  await db.delete(phones).where(eq(phones.e164, number))
}

const phoneNow = async () => {
  const [row] = await deps.store.db.select().from(phones).where(eq(phones.e164, number))
  return row
}

beforeEach(async () => {
  deps = await testDeps({ at: '2026-03-02T07:00:00Z' })
  place = await world(deps)
})

describe('a number that asked for no texts', () => {
  test('is kept where no list of numbers can be read from it', async () => {
    await house()
    await say(deps, number, 'please dont text me any more')
    const [kept, ...others] = await deps.store.db.select().from(suppressions)
    expect(others).toEqual([])
    expect(kept?.hash).toMatch(/^[0-9a-f]{64}$/)
    expect(JSON.stringify(kept)).not.toContain(number.slice(-7))
  })

  test('stays opted out when an old list enters it again after its row is gone', async () => {
    await house()
    await say(deps, number, 'STOP')
    await forgetPhone()
    const again = await house()
    expect(again.notes.join(' ')).toContain('only the word START')
    expect(await phoneNow()).toMatchObject({ consent: 'withdrawn' })
    await houseIn(deps, place, {
      name: 'Harrow',
      number: '+12025550102',
      handedOverOn: '2026-03-02',
    })
    expect(await planPrompts(deps)).toEqual({ planned: 1 })
  })

  test.each([
    [0, 'STOP'],
    [1, 'gracias'],
  ])('is sent %i texts though its row says yes, after: %s', async (sent, words) => {
    await house()
    await say(deps, number, 'no sale agua')
    await say(deps, number, words)
    await deps.store.db.update(phones).set({ consent: 'given' })
    await deps.store.db
      .update(texts)
      .set({ state: 'queued' })
      .where(and(eq(texts.state, 'dropped'), eq(texts.direction, 'out')))
    await sendDueTexts(deps)
    expect(deps.carrier.sent.filter(({ to }) => to === number).length).toBe(sent)
  })

  test('comes back by its own START, and only so', async () => {
    await house()
    await say(deps, number, 'STOP')
    await say(deps, number, 'YES')
    expect(await phoneNow()).toMatchObject({ consent: 'withdrawn' })
    await say(deps, number, 'START')
    expect(await phoneNow()).toMatchObject({ consent: 'given' })
    expect(await deps.store.db.select().from(suppressions)).toEqual([])
  })

  test('is kept though it belongs to nobody we know', async () => {
    await say(deps, number, 'stop')
    await house()
    expect(await phoneNow()).toMatchObject({ consent: 'withdrawn' })
  })
})

describe('a phone that no longer answers for anybody', () => {
  beforeEach(async () => {
    await house()
    await say(deps, number, 'STOP')
    await deps.store.db.delete(householdPhones)
  })

  test('comes back by its own START, also after the next start of the desk', async () => {
    await say(deps, number, 'START')
    await prepareDesk(deps)
    expect(await phoneNow()).toMatchObject({ consent: 'given' })
    expect(await deps.store.db.select().from(suppressions)).toEqual([])
  })

  test('has its STOP on its own row too', async () => {
    await say(deps, number, 'START')
    await say(deps, number, 'stop')
    expect(await phoneNow()).toMatchObject({ consent: 'withdrawn' })
  })
})

describe('the key of the hashes', () => {
  test('is refused at the start when it is another one than the numbers were kept with', async () => {
    await house()
    await say(deps, number, 'STOP')
    const changed = { ...deps, suppressionKey: 'another key' }
    await expect(prepareDesk(changed)).rejects.toThrow('SUPPRESSION_KEY is not the key')
    await prepareDesk(deps)
  })

  test('keeps phones that opted out before there were hashes, more than one statement takes', async () => {
    const many = Array.from({ length: 22_000 }, (_, index) => ({
      e164: `+1202${String(5_550_000 + index)}`,
      consent: 'withdrawn' as const,
      createdAt: 0,
    }))
    for (let from = 0; from < many.length; from += 2000)
      await deps.store.db.insert(phones).values(many.slice(from, from + 2000))
    await prepareDesk(deps)
    expect(await deps.store.db.$count(suppressions)).toBe(many.length)
  })

  test('also keeps the phones that opted out before there were hashes', async () => {
    await house()
    await say(deps, number, 'STOP')
    await deps.store.db.delete(suppressions)
    await prepareDesk(deps)
    expect(await deps.store.db.select().from(suppressions)).toHaveLength(1)
  })
})
