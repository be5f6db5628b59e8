import { desc, eq } from 'drizzle-orm'
import { beforeEach, describe, expect, test } from 'vitest'
import { phones } from '@/db/schema/household'
import { kits } from '@/db/schema/kit'
import { partPromises } from '@/db/schema/promise'
import { prompts, texts } from '@/db/schema/text'
import { ticketEvents, tickets } from '@/db/schema/ticket'
import { followSilence } from '@/lib/services/follow-silence'
import { planPrompts } from '@/lib/services/plan-prompts'
import { receiveText, storeInbound } from '@/lib/services/receive-text'
import { sendDueTexts } from '@/lib/services/send-text'
import { testDeps, type TestDeps } from '../factories/deps'
import { houseIn, say, world, type World } from '../factories/world'

const DAY = 86_400_000
const PHONE = '+12025550101'

let deps: TestDeps
let place: World

beforeEach(async () => {
  // 10:00 in Nairobi, inside the window.
  deps = await testDeps({ at: '2026-03-02T07:00:00Z' })
  place = await world(deps)
  await houseIn(deps, place, { handedOverOn: '2026-03-02' })
})

async function run() {
  await planPrompts(deps)
  await sendDueTexts(deps)
}

const openTicket = async () => {
  const [row] = await deps.store.db.select().from(tickets).orderBy(desc(tickets.openedAt))
  return row
}

const bodies = () => deps.carrier.sent.map(({ body }) => body)

async function askToWash() {
  await run()
  deps.clock.advance(14 * DAY)
  await run()
}

describe('planning', () => {
  test('welcomes a household once, and asks it to wash when that is due, each in its language', async () => {
    await run()
    await run()
    expect(deps.carrier.sent).toHaveLength(1)
    deps.clock.advance(14 * DAY)
    await run()
    await run()
    expect(deps.carrier.sent).toHaveLength(2)
    const [last] = await deps.store.db.select().from(texts).orderBy(desc(texts.n))
    expect(last).toMatchObject({ moment: 'wash-due', language: 'es', state: 'sent' })
  })

  test('sends nothing outside the window and sends it when the window opens', async () => {
    await run()
    deps.clock.advance(14 * DAY + 12 * 3_600_000)
    await run()
    expect(deps.carrier.sent).toHaveLength(1)
    deps.clock.advance(11 * 3_600_000)
    await run()
    expect(deps.carrier.sent).toHaveLength(2)
  })

  test('nudges silence twice and then puts it into the shift', async () => {
    await askToWash()
    for (let day = 0; day < 20; day++) {
      deps.clock.advance(DAY)
      await followSilence(deps)
      await run()
    }
    const nudges = await deps.store.db.select().from(texts).where(eq(texts.moment, 'wash-nudge'))
    expect(nudges).toHaveLength(2)
    expect(await openTicket()).toMatchObject({ trouble: 'silent', endedAt: null })
    const rows = await deps.store.db.select().from(prompts).where(eq(prompts.kind, 'wash'))
    expect(rows[0]).toMatchObject({ state: 'silent' })
  })
})

describe('answers', () => {
  test('done resets the wash clock', async () => {
    await askToWash()
    deps.clock.advance(DAY)
    await say(deps, PHONE, 'listo')
    const [kit] = await deps.store.db.select().from(kits)
    expect(kit).toMatchObject({ lastWashOn: '2026-03-17', nextWashOn: '2026-03-31' })
    expect(await openTicket()).toBeUndefined()
  })

  test('low flow opens a ticket and walks by itself: washed twice without gain is spent, and a part is promised', async () => {
    await askToWash()
    await say(deps, PHONE, 'sale poca agua')
    expect(await openTicket()).toMatchObject({ trouble: 'slow', waitingFor: 'ask-flow' })
    await run()
    await say(deps, PHONE, '12')
    expect(await openTicket()).toMatchObject({ waitingFor: 'wash-fibre' })
    await run()
    await say(deps, PHONE, '12')
    expect(await openTicket()).toMatchObject({ waitingFor: 'wash-fibre' })
    await run()
    await say(deps, PHONE, '11')
    expect(await openTicket()).toMatchObject({ stage: 'part owed', cause: 'spent-fibre' })
    const [promise] = await deps.store.db.select().from(partPromises)
    expect(promise).toMatchObject({ state: 'promised', position: 3, depotId: place.depotId })
    await run()
    expect(bodies().length).toBeGreaterThanOrEqual(5)
  })

  test('a wash that brings the flow back ends the ticket and resets the wash clock', async () => {
    await askToWash()
    await say(deps, PHONE, 'sale poca agua')
    await run()
    await say(deps, PHONE, '12')
    await run()
    await say(deps, PHONE, '4')
    const ticket = await openTicket()
    expect(ticket).toMatchObject({ stage: 'flowing', cause: 'fouled-fibre' })
    const [kit] = await deps.store.db.select().from(kits)
    expect(kit).toMatchObject({ lastWashOn: '2026-03-16' })
  })

  test('an ill child goes to the top with the fixed answer and no walk', async () => {
    await askToWash()
    await say(deps, PHONE, 'mi hijo tiene diarrea')
    expect(await openTicket()).toMatchObject({ trouble: 'unwell', automatic: false })
    const [last] = await deps.store.db.select().from(texts).where(eq(texts.moment, 'unwell'))
    expect(last).toMatchObject({ state: 'queued', anyHour: true })
  })

  test('a second ill house of the area within a week is told to the coordinator, a later one is not', async () => {
    await askToWash()
    const other = { name: 'Quispe', number: '+12025550102', handedOverOn: '2026-03-16' }
    await houseIn(deps, place, other)
    await run()
    await say(deps, PHONE, 'mi hijo tiene diarrea')
    const told = async () =>
      (await deps.jobs()).filter(({ name }) => name === 'tell-coordinator').length
    const before = await told()
    deps.clock.advance(6 * DAY)
    await say(deps, other.number, 'mi hijo tiene diarrea')
    expect(await told()).toBe(before + 1)
    deps.clock.advance(8 * DAY)
    await houseIn(deps, place, {
      name: 'Duarte',
      number: '+12025550103',
      handedOverOn: '2026-03-30',
    })
    await say(deps, '+12025550103', 'mi hijo tiene diarrea')
    expect(await told()).toBe(before + 1)
  })

  test('STOP ends prompts to the phone; the carrier confirms it, so that there is one confirmation', async () => {
    await askToWash()
    const before = deps.carrier.sent.length
    await say(deps, PHONE, 'STOP')
    deps.clock.advance(40 * DAY)
    await run()
    expect(deps.carrier.sent).toHaveLength(before)
    const [phone] = await deps.store.db.select().from(phones)
    expect(phone).toMatchObject({ consent: 'withdrawn' })
  })

  test('an opt-out in plain words is confirmed once by the desk, which then is silent', async () => {
    await askToWash()
    const before = deps.carrier.sent.length
    await say(deps, PHONE, 'ya no me escriban por favor')
    await run()
    deps.clock.advance(40 * DAY)
    await run()
    expect(deps.carrier.sent).toHaveLength(before + 1)
  })

  test('"it stopped dripping" is no opt-out', async () => {
    await askToWash()
    await say(deps, PHONE, 'it stopped dripping')
    const [phone] = await deps.store.db.select().from(phones)
    expect(phone).toMatchObject({ consent: 'given' })
    expect(await openTicket()).toMatchObject({ endedAt: null })
  })

  test('a wrong number is suspended after one apology', async () => {
    await askToWash()
    const before = deps.carrier.sent.length
    await say(deps, PHONE, 'numero equivocado')
    await run()
    deps.clock.advance(40 * DAY)
    await run()
    expect(deps.carrier.sent).toHaveLength(before + 1)
    const [phone] = await deps.store.db.select().from(phones)
    expect(phone).toMatchObject({ state: 'suspended' })
  })
})

describe('records', () => {
  test('a text that the carrier hands over twice is read once', async () => {
    await askToWash()
    const inbound = { sid: `SM${'b'.repeat(32)}`, from: PHONE, body: 'sale poca agua', raw: {} }
    const stored = await storeInbound(deps, inbound)
    expect(await storeInbound(deps, inbound)).toBeNull()
    if (!stored) throw new Error('The text was not stored.')
    await receiveText(deps, stored)
    await receiveText(deps, stored)
    expect(await deps.store.db.select().from(ticketEvents)).toHaveLength(1)
  })
})
