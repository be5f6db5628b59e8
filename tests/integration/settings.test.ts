import { asc, eq } from 'drizzle-orm'
import { beforeEach, describe, expect, it } from 'vitest'
import { findKitFacts } from '@/db/queries/kit-facts'
import { settings as settingRows } from '@/db/schema/area'
import { flowReadings } from '@/db/schema/reading'
import { audit } from '@/db/schema/staff'
import { prompts } from '@/db/schema/text'
import { ticketEvents } from '@/db/schema/ticket'
import { NotAllowedError } from '@/lib/domain/role'
import {
  defaultSettings,
  withValue,
  type SettingPath,
  type SettingValue,
} from '@/lib/domain/settings'
import { fold } from '@/lib/domain/ticket'
import { settingsInputSchema } from '@/lib/schemas/settings'
import { changeSettings, seeSettings } from '@/lib/services/change-settings'
import { planPrompts } from '@/lib/services/plan-prompts'
import { sendDueTexts } from '@/lib/services/send-text'
import { testDeps, type TestDeps } from '../factories/deps'
import { answer, lastTicket, sheetOf } from '../factories/desk'
import { actorOf, houseIn, say, world, type World } from '../factories/world'

const DAY = 86_400_000
const PHONE = '+12025550101'

let deps: TestDeps
let place: World

beforeEach(async () => {
  deps = await testDeps({ at: '2026-03-02T07:00:00Z' })
  place = await world(deps)
})

/** Changes some settings as the coordinator's form does: all of them, with what was seen. */
async function set(...changes: [SettingPath, SettingValue][]) {
  const seen = await seeSettings(deps, place.coordinator)
  const settings = changes.reduce(
    (all, [path, value]) => withValue(all, path, value),
    seen.settings,
  )
  const input = settingsInputSchema.parse({ version: seen.version, settings })
  const kept = await changeSettings(deps, place.coordinator, input)
  if (!kept.ok) throw new Error(kept.reason)
  return kept
}

const audited = () =>
  deps.store.db.select().from(audit).where(eq(audit.subject, 'setting')).orderBy(asc(audit.n))

const house = () => houseIn(deps, place, { handedOverOn: '2026-03-02' })

async function facts(kitId: string) {
  const found = await findKitFacts(deps.store.db, kitId)
  if (!found) throw new Error('There is no kit.')
  return found
}

describe('a change of the settings', () => {
  it('is kept, and audited with the old value and the new one', async () => {
    expect(await set(['flow.restoredShare', 0.6], ['wash.days.clear', 20])).toMatchObject({
      changed: 2,
    })
    const { settings } = await seeSettings(deps, place.coordinator)
    expect([settings.flow.restoredShare, settings.wash.days.clear]).toEqual([0.6, 20])
    const rows = (await audited()).map(({ staffId, act, subjectId, detail }) => ({
      staffId,
      act,
      subjectId,
      detail,
    }))
    const { staffId } = place.coordinator
    expect(rows).toEqual([
      {
        staffId,
        act: 'change setting',
        subjectId: 'flow.restoredShare',
        detail: { from: 0.7, to: 0.6 },
      },
      {
        staffId,
        act: 'change setting',
        subjectId: 'wash.days.clear',
        detail: { from: 30, to: 20 },
      },
    ])
  })

  it('back to the default leaves no row behind', async () => {
    await set(['flow.restoredShare', 0.6])
    await set(['flow.restoredShare', 0.7])
    expect(await deps.store.db.select().from(settingRows)).toEqual([])
    expect((await audited()).at(-1)?.detail).toEqual({ from: 0.6, to: 0.7 })
  })

  it('of nothing audits nothing', async () => {
    expect(await set()).toEqual({ ok: true, version: 0, changed: 0 })
    expect(await audited()).toEqual([])
  })

  it('on an older state is refused, so that nobody undoes what a colleague has just set', async () => {
    const seen = await seeSettings(deps, place.coordinator)
    await set(['flow.restoredShare', 0.6])
    const late = await changeSettings(deps, place.coordinator, seen)
    expect(late).toEqual({
      ok: false,
      reason: 'Somebody has changed the settings since you opened this page.',
    })
    const { settings } = await seeSettings(deps, place.coordinator)
    expect(settings.flow.restoredShare).toBe(0.6)
  })

  it('is the coordinator’s alone', async () => {
    const input = { version: 0, settings: defaultSettings }
    for (const role of ['agent', 'visitor'] as const) {
      const actor = await actorOf(deps, role)
      await expect(changeSettings(deps, actor, input)).rejects.toThrow(NotAllowedError)
      await expect(seeSettings(deps, actor)).rejects.toThrow(NotAllowedError)
    }
  })
})

describe('what is set', () => {
  it('plans washes and flow checks from the next hand-over on', async () => {
    await set(['wash.days.cloudy', 21], ['wash.flowCheckDays', 30])
    const { kitId } = await house()
    expect((await facts(kitId)).kit).toMatchObject({
      nextWashOn: '2026-03-23',
      nextFlowCheckOn: '2026-04-01',
    })
  })

  it('prompts a household no oftener in a week than that', async () => {
    await set(['sending.promptsAWeek', 1], ['wash.days.cloudy', 5])
    await house()
    const sentAfter = async (days: number) => {
      deps.clock.advance(days * DAY)
      await planPrompts(deps)
      await sendDueTexts(deps)
      return deps.carrier.sent.length
    }
    // The welcome goes at once; the wash, due after five days, waits for the week to pass.
    expect([await sentAfter(0), await sentAfter(5), await sentAfter(2)]).toEqual([1, 1, 2])
  })

  it('nudges after the days that were set', async () => {
    await set(['sending.firstNudgeDays', 1])
    await house()
    for (let day = 0; day < 2; day += 1) {
      await planPrompts(deps)
      await sendDueTexts(deps)
      deps.clock.advance(14 * DAY)
    }
    const asked = await deps.store.db.select().from(prompts).where(eq(prompts.kind, 'wash'))
    const sentAt = deps.clock.now() - 14 * DAY
    expect(asked.map(({ nudgeAfter }) => nudgeAfter)).toEqual([sentAt + DAY])
  })

  it('errs as it is set from the next reading on', async () => {
    await house()
    await set(['flow.timeErrorShare', 0.3], ['flow.bottleErrorShare', 0.4])
    await say(deps, PHONE, '5 minutos')
    const rows = await deps.store.db.select().from(flowReadings).orderBy(asc(flowReadings.n))
    expect(rows.map(({ errorShare }) => errorShare.toFixed(3))).toEqual(['0.112', '0.500'])
  })

  it('judges the next reading, and leaves what a ticket was told before', async () => {
    await house()
    const agent = await actorOf(deps, 'agent')
    await say(deps, PHONE, 'sale poca agua')
    // 20 L/h at first; 5 minutes a litre is 12 L/h, 60 %: partly back.
    await answer(deps, PHONE, '5')
    const states = async () => fold(await events())
    const events = async () => {
      const { id } = await lastTicket(deps)
      return deps.store.db
        .select()
        .from(ticketEvents)
        .where(eq(ticketEvents.ticketId, id))
        .orderBy(asc(ticketEvents.n))
    }
    const before = await states()
    expect(before?.walk?.readings.at(-1)).toMatchObject({ kind: 'partly', partlyShare: 0.4 })
    const shown = (await sheetOf(deps, agent)).column.verdict
    expect(shown).toContain('partly back')

    await set(['flow.partlyShare', 0.3], ['flow.restoredShare', 0.55])
    expect(await states()).toEqual(before)
    expect((await sheetOf(deps, agent)).column.verdict).toBe(shown)

    await answer(deps, PHONE, '5')
    expect((await states())?.walk?.readings.at(-1)).toMatchObject({
      kind: 'restored',
      partlyShare: 0.3,
    })
    expect(await lastTicket(deps)).toMatchObject({ stage: 'flowing' })
  })

  it('says how much water is needed, and whether a flow is enough', async () => {
    await house()
    await set(['need.litresPerPersonDay', 10], ['need.enoughHours', 2], ['need.slowHours', 4])
    await say(deps, PHONE, '5 minutos')
    // 12 L/h for 60 L a day: five hours, which is too long now.
    const agent = await actorOf(deps, 'agent')
    const { title, people } = await sheetOf(deps, agent)
    expect(people).toContain('Needs 60 L a day.')
    expect(title).toContain('needs 60 L a day: 5 h 00')
    const [opened] = await deps.store.db.select().from(ticketEvents)
    expect(opened?.event).toMatchObject({ figure: { need: 'short' } })
  })
})
