import { beforeEach, describe, expect, test } from 'vitest'
import { phones } from '@/db/schema/household'
import { fittings } from '@/db/schema/kit'
import { prompts, texts } from '@/db/schema/text'
import { tickets } from '@/db/schema/ticket'
import type { Actor } from '@/lib/domain/role'
import { followSilence } from '@/lib/services/follow-silence'
import { planPrompts } from '@/lib/services/plan-prompts'
import { readAs } from '@/lib/services/read-as'
import { sendDueTexts } from '@/lib/services/send-text'
import { testDeps, type TestDeps } from '../factories/deps'
import { actorOf, houseIn, say, world, type World } from '../factories/world'

const number = '+12025550101'
const DAY = 86_400_000

let deps: TestDeps
let place: World
let agent: Actor

const house = (handedOverOn = '2026-03-02') => houseIn(deps, place, { number, handedOverOn })

const ticketNow = async () => (await deps.store.db.select().from(tickets))[0]

beforeEach(async () => {
  deps = await testDeps({ at: '2026-03-02T07:00:00Z' })
  place = await world(deps)
  agent = await actorOf(deps, 'agent', { name: 'Ana Belmonte' })
})

describe('a step that nobody answers', () => {
  test('waits three days, then for a person, and no step goes by itself any more', async () => {
    await house()
    await say(deps, number, 'sale poca agua')
    await sendDueTexts(deps)
    deps.clock.advance(3 * DAY - 60_000)
    await followSilence(deps)
    expect(await ticketNow()).toMatchObject({ stage: 'waiting', automatic: true })
    deps.clock.advance(120_000)
    await followSilence(deps)
    expect(await ticketNow()).toMatchObject({
      stage: 'walking',
      automatic: false,
      waitingFor: null,
    })
    const { version } = (await ticketNow())!
    deps.clock.advance(9 * DAY)
    await followSilence(deps)
    expect((await ticketNow())?.version).toBe(version)
  })
})

describe('a change that was asked for', () => {
  test('is asked for anew when they answered something else, until it is done', async () => {
    await house('2026-02-02')
    await planPrompts(deps)
    await sendDueTexts(deps)
    const kinds = async () =>
      (await deps.store.db.select().from(prompts)).map(({ kind, state }) => `${kind} ${state}`)
    for (let days = 0; days < 14 && !(await kinds()).includes('change asked'); days++) {
      deps.clock.advance(DAY)
      await planPrompts(deps)
      await sendDueTexts(deps)
    }
    expect(await kinds()).toContain('change asked')
    await say(deps, number, '4 minutos')
    expect(await kinds()).toContain('change dropped')
    for (let days = 0; days < 14 && !(await kinds()).includes('change asked'); days++) {
      deps.clock.advance(DAY)
      await planPrompts(deps)
      await sendDueTexts(deps)
    }
    await say(deps, number, 'listo')
    expect(await kinds()).toContain('change answered')
    const removed = (await deps.store.db.select().from(fittings)).filter(
      ({ removedOn }) => removedOn !== null,
    )
    expect(removed).toHaveLength(1)
  })
})

describe('an opt-out that a person reads', () => {
  test('is honoured at once', async () => {
    await house()
    await say(deps, number, 'zorblax frotz ya saben')
    const [text] = (await deps.store.db.select().from(texts)).filter(
      ({ direction }) => direction === 'in',
    )
    await readAs(deps, agent, { textId: text?.id ?? '', kind: 'stop' })
    expect((await deps.store.db.select().from(phones))[0]).toMatchObject({ consent: 'withdrawn' })
  })
})
