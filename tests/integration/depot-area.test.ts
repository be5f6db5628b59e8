import { beforeEach, describe, expect, it } from 'vitest'
import { insertPromise } from '@/db/queries/promise'
import { insertReferenceData, listKitModels } from '@/db/queries/reference'
import { stockMoves } from '@/db/schema/stock'
import { holidayOfLine } from '@/lib/domain/holiday'
import { NotAllowedError } from '@/lib/domain/role'
import { areaInputSchema, areaListSchema } from '@/lib/schemas/area'
import { depotListSchema } from '@/lib/schemas/depot'
import { changeArea, enterArea } from '@/lib/services/enter-area'
import { countStock, enterDepot } from '@/lib/services/enter-depot'
import { areaForm, listAreas } from '@/lib/services/list-areas'
import { listDepots } from '@/lib/services/list-depots'
import { testDeps, type TestDeps } from '../factories/deps'
import { areaInput, entered, programme, signedIn, type Programme } from '../factories/programme'

let deps: TestDeps
let place: Programme

beforeEach(async () => {
  deps = await testDeps({ at: '2026-03-02T15:00:00Z' })
  place = await programme(deps)
})

async function shelf(position = 0) {
  const { depots } = depotListSchema.parse(await listDepots(deps, place.coordinator))
  const found = depots[0]?.shelves.find(({ partId }) => partId === place.parts[position])
  return found && [found.inHand, found.promised, found.available]
}

function count(why: 'received' | 'counted', quantity: number) {
  const stock = [{ partId: place.parts[0]!, quantity }]
  return countStock(deps, place.coordinator, { depotId: place.depotId, why, stock })
}

describe('the kit every programme begins with', () => {
  it('is made once', async () => {
    await deps.store.transaction((tx) => insertReferenceData(tx))
    const models = await listKitModels(deps.store.db)
    expect(models.map(({ name }) => name)).toEqual(['Three-stage gravity kit'])
  })
})

describe('a depot', () => {
  it('has what it was entered with', async () => {
    expect(await shelf()).toEqual([10, 0, 10])
    const { depots } = await listDepots(deps, place.coordinator)
    expect(depots[0]).toMatchObject({ name: 'Vado depot', areas: ['Loma Clara'] })
    expect(depots[0]?.shelves.map(({ name, inHand }) => `${name} ${inHand}`)).toEqual([
      'Cloth 10',
      'Carbon 10',
      'Fibre 10',
      'Cap 0',
      'Hose 0',
    ])
  })

  it('takes in what comes, and a count becomes the difference', async () => {
    await count('received', 5)
    expect(await shelf()).toEqual([15, 0, 15])
    await count('counted', 12)
    expect(await shelf()).toEqual([12, 0, 12])
    await count('counted', 12)
    const moves = await deps.store.db.select().from(stockMoves)
    const ofCloth = moves.filter(({ partId }) => partId === place.parts[0])
    expect(ofCloth.map(({ quantity, why }) => [quantity, why])).toEqual([
      [10, 'received'],
      [5, 'received'],
      [-3, 'counted'],
    ])
  })

  it('says when more is promised than is there', async () => {
    const { kitId } = await entered(deps, place)
    await insertPromise(deps.store.db, {
      kitId,
      position: 1,
      partId: place.parts[0]!,
      depotId: place.depotId,
      promisedAt: deps.clock.now(),
    })
    await count('counted', 0)
    expect(await shelf()).toEqual([0, 1, -1])
  })

  it('is not entered twice under one name, nor with parts that are not known', async () => {
    const depot = { name: 'Vado depot', place: '', stock: [] }
    expect(await enterDepot(deps, place.coordinator, depot)).toMatchObject({ ok: false })
    const odd = { name: 'Other', place: '', stock: [{ partId: 'x', quantity: 1 }] }
    expect(await enterDepot(deps, place.coordinator, odd)).toMatchObject({ ok: false })
    expect((await listDepots(deps, place.coordinator)).depots.length).toBe(1)
  })

  it('is not an agent’s to keep', async () => {
    const agent = await signedIn(deps, 'agent')
    await expect(listDepots(deps, agent)).rejects.toBeInstanceOf(NotAllowedError)
    const depot = { name: 'Other', place: '', stock: [] }
    await expect(enterDepot(deps, agent, depot)).rejects.toBeInstanceOf(NotAllowedError)
  })
})

describe('an area', () => {
  it('is listed with its hours, depot and households', async () => {
    await entered(deps, place)
    const { areas } = areaListSchema.parse(await listAreas(deps, place.coordinator))
    expect(areas[0]).toMatchObject({
      name: 'Loma Clara',
      windowOpens: '08:00',
      windowCloses: '20:00',
      depotName: 'Vado depot',
      households: 1,
    })
  })

  it('is changed in place; another’s name is refused', async () => {
    const { areaId, depotId, coordinator } = place
    const ferry = await enterArea(deps, coordinator, { ...areaInput, depotId, name: 'Ferry Bank' })
    expect(ferry.ok).toBe(true)
    const midwinter = { on: '2026-12-25', name: 'Midwinter day' }
    const holidays = [midwinter, { on: '2026-05-01', name: '' }]
    const input = { ...areaInput, depotId, areaId, windowCloses: '24:00', holidays }
    expect(await changeArea(deps, coordinator, input)).toEqual({ ok: true, areaId })
    const form = await areaForm(deps, coordinator, areaId)
    expect(form?.area).toMatchObject({
      windowCloses: '24:00',
      holidays: [{ on: '2026-05-01', name: '' }, midwinter],
    })
    const taken = await changeArea(deps, coordinator, { ...input, name: 'Ferry Bank' })
    expect(taken).toEqual({ ok: false, reason: 'Another area has this name.' })
  })

  it.each([
    ['timeZone', { timeZone: '+05:00' }],
    ['timeZone', { timeZone: 'Nowhere/Town' }],
    ['windowCloses', { windowOpens: '20:00', windowCloses: '08:00' }],
    ['windowCloses', { windowCloses: '25:00' }],
    ['holidays.0.on', { holidays: [{ on: '2026-02-30', name: 'Leap day' }] }],
    ['holidays.0.on', { holidays: [{ on: '25.12.2026', name: 'Midwinter day' }] }],
    ['holidays.0.name', { holidays: [{ on: '2026-12-25', name: 'x'.repeat(61) }] }],
    [
      'holidays.1.on',
      {
        holidays: [
          { on: '2026-12-25', name: 'Midwinter day' },
          { on: '2026-12-25', name: 'Feast' },
        ],
      },
    ],
    ['monthCelsius', { monthCelsius: [20] }],
    ['name', { name: '  ' }],
  ])('with a bad %s is refused at its field', (field, change) => {
    const result = areaInputSchema.safeParse({ ...areaInput, depotId: 'x', ...change })
    expect(result.error?.issues.map(({ path }) => path.join('.'))).toContain(field)
  })

  it('says of a bad line which it is and how to write it', () => {
    const holidays = ['25.12.2026 Midwinter day', '2026-02-30', 'Feast'].map(holidayOfLine)
    const result = areaInputSchema.safeParse({ ...areaInput, depotId: 'x', holidays })
    expect(result.error?.issues.map(({ message }) => message)).toEqual([
      '“25.12.2026” is not a day written as 2026-12-25.',
      'There is no 2026-02-30.',
      '“Feast” is not a day written as 2026-12-25.',
    ])
  })
})
