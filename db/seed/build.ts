import { writeFileSync } from 'node:fs'
import path from 'node:path'
import { openPglite } from '@/db/client'
import { lockDataFolder } from '@/db/lock'
import { standingClock } from '@/lib/clock'
import type { Deps } from '@/lib/deps'
import { env } from '@/lib/env'
import { log } from '@/lib/log'
import { prepareDesk } from '@/lib/services/prepare-desk'
import { startQueue } from '@/jobs/boss'
import { buildQueue } from './build-queue'
import { lastMorning, liveHistory, type History } from './history'
import { makePeople } from './people'
import { places } from './places'
import { random as seeded } from './random'
import { modelIdOf, settleFamily, settlePlaces } from './settle'
import { virtualCarrier, type Carried } from './virtual-carrier'

const DAY = 86_400_000
const HOUR = 3_600_000
const DAYS = 28
const SEED = 20_260_401

/** Opens an empty desk whose clock stands `DAYS` days ago and whose carrier is virtual. */
async function openDesk(folder: string) {
  const store = await openPglite(path.join(folder, 'db'))
  await store.migrate()
  // The queue's own tables are made now, so that the first start of the desk need not.
  await (await startQueue(store, log, false)).stop()
  const queue = buildQueue()
  const random = seeded(SEED)
  const carried: Carried[] = []
  const clock = standingClock(Math.floor(Date.now() / HOUR) * HOUR - DAYS * DAY)
  const deps: Deps = {
    store,
    queue,
    carrier: virtualCarrier(random, (text) => carried.push(text)),
    mail: { send: () => Promise.resolve() },
    mailSet: false,
    clock,
    practice: clock,
    practicePhonesUrl: null,
    publicBaseUrl: env().publicBaseUrl,
    log: { info: () => undefined, warn: () => undefined, error: log.error.bind(log) },
    close: () => store.close(),
  }
  return { deps, clock, queue, random, carried }
}

async function settle(
  history: Omit<History, 'agent'>,
  coordinator: Parameters<typeof settlePlaces>[0]['coordinator'],
) {
  const { deps, random, families, numbers } = history
  const modelId = await modelIdOf(deps)
  const areas = await settlePlaces({ deps, coordinator, modelId })
  const phones = []
  for (const place of places) {
    for (let index = 0; index < place.households; index++) {
      const areaId = areas.get(place.name) ?? ''
      const given = { place, areaId, index, daysAgo: random.whole(0, 27), days: DAYS }
      const { family, label, householdId } = await settleFamily(
        { deps, coordinator, random, modelId },
        given,
      )
      families.set(family.number, family)
      numbers.set(householdId, family.number)
      phones.push({ number: family.number, label, language: place.language })
    }
  }
  return phones
}

async function main(): Promise<void> {
  const folder = path.resolve(env().dataDir)
  const unlock = await lockDataFolder(folder)
  const desk = await openDesk(folder)
  const { deps } = desk
  await prepareDesk(deps)
  const people = await makePeople(deps)
  const history: History = {
    ...desk,
    agent: people.agent,
    families: new Map(),
    numbers: new Map(),
    replies: [],
    texts: 0,
  }
  const phones = await settle(history, people.coordinator)
  await liveHistory(history, DAYS)
  await lastMorning(history)
  writeFileSync(path.join(folder, 'phones.json'), JSON.stringify(phones))
  await deps.store.keepHouse()
  await deps.close()
  unlock()
}

main().then(
  () => process.exit(0),
  (error: unknown) => {
    console.error(error)
    process.exit(1)
  },
)
