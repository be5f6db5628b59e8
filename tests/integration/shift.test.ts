import { beforeEach, describe, expect, test } from 'vitest'
import { NotAllowedError, type Actor } from '@/lib/domain/role'
import { listShift } from '@/lib/services/list-shift'
import { sendDueTexts } from '@/lib/services/send-text'
import { takeNext } from '@/lib/services/take-next'
import { ticketSheet } from '@/lib/services/ticket-sheet'
import { testDeps, type TestDeps } from '../factories/deps'
import { actorOf, houseIn, say, world, type World } from '../factories/world'

const HOUR = 3_600_000

const slow = { name: 'Orellana', number: '+12025550101', language: 'es' } as const
const ill = { name: 'Quispe', number: '+12025550102', language: 'es' } as const
const cracked = { name: 'Harrow', number: '+12025550103', language: 'en' } as const
const puzzling = { name: 'Adeyo', number: '+12025550104', language: 'en' } as const
const bengali = { name: 'Sarkar', number: '+12025550105', language: 'bn' } as const

let deps: TestDeps
let place: World
let agent: Actor

const house = (given: { name: string; number: string; language: 'en' | 'es' | 'bn' }) =>
  houseIn(deps, place, { ...given, handedOverOn: '2026-03-02' })

beforeEach(async () => {
  deps = await testDeps({ at: '2026-03-02T07:00:00Z' })
  place = await world(deps)
  agent = await actorOf(deps, 'agent', { name: 'Ana Belmonte', languages: ['en', 'es'] })
})

describe('the order of the shift', () => {
  test('stands by harm: unwell, no safe water, slow, unread words', async () => {
    for (const one of [puzzling, slow, cracked, ill]) await house(one)
    await say(deps, puzzling.number, 'zorblax van lady frotz')
    await say(deps, slow.number, 'sale poca agua')
    deps.clock.advance(HOUR)
    await say(deps, cracked.number, 'it fell and the cap is cracked')
    await say(deps, ill.number, 'mi hijo tiene diarrea')
    const { bands, waiting, taken } = await listShift(deps, agent)
    expect(bands.map(({ name, rows }) => [name, rows.map(({ house: at }) => at)])).toEqual([
      ['Unwell', ['Quispe house']],
      ['No safe water', ['Harrow house']],
      ['Slow', ['Orellana house']],
      ['Unread words', ['Adeyo house']],
    ])
    expect({ waiting, taken }).toEqual({ waiting: 4, taken: 0 })
    expect(bands[3]?.rows[0]?.words).toBe('zorblax van lady frotz')
    expect(bands[1]?.rows[0]?.sentence).toContain('nothing safe since')
  })

  test('puts the house that waits longer for as many people first', async () => {
    await house(slow)
    await house({ ...slow, name: 'Later', number: '+12025550106' })
    // Their first litre, timed at the hand-over, is no figure of this trouble.
    deps.clock.advance(HOUR)
    await say(deps, slow.number, 'sale poca agua')
    deps.clock.advance(2 * HOUR)
    await say(deps, '+12025550106', 'sale poca agua')
    const { bands, longest } = await listShift(deps, agent)
    expect(bands[0]?.rows.map((row) => [row.house, row.waited])).toEqual([
      ['Orellana house', '2 h 00'],
      ['Later house', '0 h 00'],
    ])
    expect(bands[0]?.note).toBe('2 houses, 12 people')
    expect(longest).toBe('11:00')
  })

  test('says why in the language of who reads it', async () => {
    await house(slow)
    await say(deps, slow.number, 'no sale agua')
    const spanish: Actor = { ...agent, languages: ['es', 'en'] }
    const [row] = (await listShift(deps, spanish)).bands[0]?.rows ?? []
    expect(row).toMatchObject({ sentenceLanguage: 'es' })
    expect(row?.sentence).toContain('nada de agua')
    const sheet = await ticketSheet(deps, spanish, { ticketId: row?.ticketId ?? '' })
    expect(sheet).toMatchObject({ titleLanguage: 'es' })
    expect('title' in sheet && sheet.title).toContain('nada de agua')
  })

  test('says that nobody waits when nobody does', async () => {
    const shift = await listShift(deps, agent)
    expect(shift).toMatchObject({ bands: [], waiting: 0, next: { ticketId: null } })
    expect(shift.title).toBe('Monday, before noon')
  })
})

describe('danger', () => {
  test('is at the top with its fixed text queued, and no step goes by itself', async () => {
    await house(slow)
    await house(ill)
    await say(deps, slow.number, 'no sale agua')
    deps.clock.advance(HOUR)
    await say(deps, ill.number, 'mi hija tiene diarrea y esta muy dormida')
    const before = await listShift(deps, agent)
    const top = before.bands[0]?.rows[0]
    expect(top).toMatchObject({ house: 'Quispe house', waits: true, tone: 'clay' })
    expect(top?.sentence).toContain('Not yet told to go')
    expect(top?.about).toBe('go to the health worker now on its way')
    await sendDueTexts(deps)
    const after = await listShift(deps, agent)
    expect(after.bands[0]?.rows[0]?.sentence).toContain('Told to go to the health worker now')
    const sheet = await ticketSheet(deps, agent, { ticketId: top?.ticketId ?? '' })
    if ('ok' in sheet) throw new Error(sheet.reason)
    expect(sheet).toMatchObject({ isDanger: true, now: { kind: 'danger' } })
    expect(sheet.fixed).toHaveLength(1)
  })
})

describe('the next', () => {
  test('is the worst that nobody has in a language of this agent', async () => {
    await house(bengali)
    await house(slow)
    await say(deps, bengali.number, 'পানি আসে না')
    await say(deps, slow.number, 'sale poca agua')
    const { next } = await listShift(deps, agent)
    expect(next.words).toBe('The worst you can serve in English or Spanish: the Orellana house.')
    expect(await takeNext(deps, agent)).toMatchObject({ ok: true, ticketId: next.ticketId })
    expect(await takeNext(deps, agent)).toEqual({
      ok: false,
      reason: 'None that you can serve in English or Spanish. 1 in Bengali.',
    })
    const { bands, waiting, taken } = await listShift(deps, agent)
    expect({ waiting, taken }).toEqual({ waiting: 1, taken: 1 })
    const marks = bands.flatMap(({ rows }) => rows.map((row) => row.marks))
    expect(marks).toContainEqual([{ before: 'taken by ', strong: 'you', after: '' }])
  })

  test('is taken once when two agents press at the same moment', async () => {
    const other = await actorOf(deps, 'agent', { name: 'Mirela Duarte', languages: ['es'] })
    await house(slow)
    await say(deps, slow.number, 'sale poca agua')
    const both = await Promise.all([takeNext(deps, agent), takeNext(deps, other)])
    expect(both.filter(({ ok }) => ok)).toHaveLength(1)
  })

  test('is refused to a visitor, as the shift is', async () => {
    const visitor = await actorOf(deps, 'visitor', { name: 'Amparo Nieto' })
    await expect(listShift(deps, visitor)).rejects.toThrow(NotAllowedError)
    await expect(takeNext(deps, visitor)).rejects.toThrow(NotAllowedError)
  })
})
