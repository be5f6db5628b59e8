import { expect, test } from 'vitest'
import { visits } from '@/db/schema/visit'
import { NotAllowedError } from '@/lib/domain/role'
import { bookVisit } from '@/lib/services/book-visit'
import { listVisits } from '@/lib/services/list-visits'
import { testDeps } from '../factories/deps'
import { work } from '../factories/desk'
import { actorOf, houseIn, say, world } from '../factories/world'

const PHONE = '+12025550101'

async function deskWithVisit() {
  const deps = await testDeps({ at: '2026-03-02T07:00:00Z' })
  const place = await world(deps)
  const agent = await actorOf(deps, 'agent', { name: 'Ana Belmonte' })
  await houseIn(deps, place, { number: PHONE, handedOverOn: '2026-03-02' })
  await say(deps, PHONE, 'sale poca agua')
  await work(deps, (ref) =>
    bookVisit(deps, agent, { ...ref, dueOn: '2026-03-05', why: 'Look at the cap.' }),
  )
  return { deps, agent, vera: await actorOf(deps, 'visitor', { name: 'Vera Lund' }) }
}

test('a visitor reads the visits that are anybody’s, and no longer once another has one', async () => {
  const { deps, vera } = await deskWithVisit()
  expect(await listVisits(deps, vera)).toEqual([
    expect.objectContaining({
      day: 'Thursday 5 March',
      why: 'Look at the cap.',
      area: 'Loma Clara',
      given: false,
    }),
  ])
  const other = await actorOf(deps, 'visitor', { name: 'Vito Lund' })
  await deps.store.db.update(visits).set({ visitorId: other.staffId })
  expect(await listVisits(deps, vera)).toEqual([])
  expect(await listVisits(deps, other)).toEqual([expect.objectContaining({ given: true })])
})

test('an agent has no visits of their own to read', async () => {
  const { deps, agent } = await deskWithVisit()
  await expect(listVisits(deps, agent)).rejects.toBeInstanceOf(NotAllowedError)
})
