import { beforeEach, describe, expect, it } from 'vitest'
import { updatePhone } from '@/db/queries/phone'
import { householdListSchema, householdQuerySchema } from '@/lib/schemas/household'
import { listHouseholds } from '@/lib/services/list-households'
import { testDeps, type TestDeps } from '../factories/deps'
import { entered, programme, type Programme } from '../factories/programme'

let deps: TestDeps
let place: Programme

beforeEach(async () => {
  deps = await testDeps({ at: '2026-03-12T15:00:00Z' })
  place = await programme(deps)
})

async function list(q = '', page = 1) {
  return householdListSchema.parse(await listHouseholds(deps, place.coordinator, { q, page }))
}

async function names(q: string) {
  return (await list(q)).rows.map(({ name }) => name)
}

describe('the list of households', () => {
  it('is empty on one page when there is none', async () => {
    expect(await list()).toEqual({ rows: [], total: 0, page: 1, pages: 1 })
  })

  it('shows what comes next, and what is late', async () => {
    await entered(deps, place)
    const [row] = (await list()).rows
    expect(row).toMatchObject({
      name: 'Orellana house',
      area: 'Loma Clara',
      phone: '+1 505 555 0142',
      silentBecause: null,
      nextDue: { words: 'Wash late', day: '2 days', overdue: true },
      ticket: null,
    })
    expect(row?.column.stages.map(({ state }) => state)).toEqual(['good', 'good', 'good'])
    expect(row?.column.level).toBe(1)
  })

  it('says which phone is not texted, and why', async () => {
    const { phoneId } = await entered(deps, place)
    await updatePhone(deps.store.db, phoneId, { state: 'suspended', stateWhy: 'wrong number' })
    expect((await list()).rows[0]?.silentBecause).toBe('suspended: wrong number')
  })

  it.each([
    ['orell', ['Orellana house']],
    ['QUISPE', ['Quispe house']],
    ['loma', ['Orellana house', 'Quispe house']],
    ['505 555 0143', ['Quispe house']],
    ['+1505555', ['Orellana house', 'Quispe house']],
    ['kit 2', ['Quispe house']],
    ['2', ['Quispe house']],
    ['mill', ['Orellana house']],
    ['%', []],
    ['nobody', []],
  ])('finds %s', async (q, expected) => {
    await entered(deps, place)
    await entered(deps, place, {
      name: 'Quispe house',
      place: '',
      phones: [{ number: '+15055550143', answeredBy: '' }],
    })
    expect(await names(q)).toEqual(expected)
  })

  it('has 40 on a page, and a page past the end is the last', async () => {
    for (let n = 0; n < 41; n += 1) {
      await entered(deps, place, { name: `House ${String(n).padStart(2, '0')}` })
    }
    const first = await list()
    expect([first.rows.length, first.total, first.pages]).toEqual([40, 41, 2])
    const past = await list('', 99)
    expect([past.page, past.rows.map(({ name }) => name)]).toEqual([2, ['House 40']])
  })

  it.each([
    [{}, { q: '', page: 1 }],
    [
      { q: '  Loma ', page: '3' },
      { q: 'Loma', page: 3 },
    ],
    [{ page: 'x' }, { q: '', page: 1 }],
  ])('reads %j from its address', (query, expected) => {
    expect(householdQuerySchema.parse(query)).toEqual(expected)
  })
})
