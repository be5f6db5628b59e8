import { writeFileSync } from 'node:fs'
import path from 'node:path'
import { openPglite } from '@/db/client'
import { lockDataFolder } from '@/db/lock'
import { standingClock } from '@/lib/clock'
import type { Deps } from '@/lib/deps'
import { washIntervalDays } from '@/lib/domain/cycle'
import { monthOf } from '@/lib/domain/day'
import type { Actor } from '@/lib/domain/role'
import { localDay } from '@/lib/domain/round'
import { env } from '@/lib/env'
import { log } from '@/lib/log'
import { prepareDesk } from '@/lib/services/prepare-desk'
import { startQueue } from '@/jobs/boss'
import { buildQueue } from './build-queue'
import { lastMorning, liveHistory, type History } from './history'
import { makePeople } from './people'
import { phoneHistory } from './phone-history'
import { places, timeZone } from './places'
import { random as seeded } from './random'
import { modelIdOf, settleFamily, settlePlaces } from './settle'
import { virtualCarrier, type Carried } from './virtual-carrier'

const DAY = 86_400_000
const HOUR = 3_600_000
const DAYS = 28
const SEED = 20_260_401
const NEWCOMERS = 4

type Phone = { number: string; label: string; language: string }

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
    suppressionKey: env().suppressionKey,
    publicBaseUrl: env().publicBaseUrl,
    log: { info: () => undefined, warn: () => undefined, error: log.error.bind(log) },
    close: () => store.close(),
  }
  return { deps, clock, queue, random, carried }
}

type Settling = { history: Omit<History, 'agent'>; coordinator: Actor; modelId: string }

/** Settles one more family of a place and remembers its phone for the shelf. */
async function settleOne(
  { history, coordinator, modelId }: Settling,
  given: Parameters<typeof settleFamily>[1],
): Promise<Phone> {
  const { deps, random, families, numbers } = history
  const { family, label, householdId } = await settleFamily(
    { deps, coordinator, random, modelId },
    given,
  )
  families.set(family.number, family)
  numbers.set(householdId, family.number)
  return { number: family.number, label, language: given.place.language }
}

async function settleAll(settling: Settling, areas: Map<string, string>): Promise<Phone[]> {
  const phones: Phone[] = []
  for (const place of places) {
    for (let index = 0; index < place.households; index++) {
      const areaId = areas.get(place.name) ?? ''
      const daysAgo = settling.history.random.whole(0, 27)
      phones.push(await settleOne(settling, { place, areaId, index, daysAgo, days: DAYS }))
    }
  }
  return phones
}

/** Newcomers whose first wash falls due on each of the next days: whenever one looks, something goes out. */
async function settleNewcomers(settling: Settling, areas: Map<string, string>): Promise<Phone[]> {
  const [place] = places
  if (!place) return []
  const phones: Phone[] = []
  const wet = place.wetMonths.includes(
    monthOf(localDay(settling.history.deps.clock.now(), timeZone)),
  )
  const interval = washIntervalDays({ sourceClass: 'cloudy', wet })
  for (let inDays = 1; inDays <= NEWCOMERS; inDays++) {
    phones.push(
      await settleOne(settling, {
        place,
        areaId: areas.get(place.name) ?? '',
        index: place.households + inDays - 1,
        daysAgo: interval - inDays,
        days: DAYS,
        sourceClass: 'cloudy',
      }),
    )
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
  const { coordinator } = people
  const modelId = await modelIdOf(deps)
  const settling = { history, coordinator, modelId }
  const areas = await settlePlaces({ deps, coordinator, modelId })
  const phones = await settleAll(settling, areas)
  await liveHistory(history, DAYS)
  phones.push(...(await settleNewcomers(settling, areas)))
  await lastMorning(history)
  writeFileSync(path.join(folder, 'phones.json'), JSON.stringify(phones))
  const past = await phoneHistory(deps)
  writeFileSync(path.join(folder, 'phone-history.json'), JSON.stringify(past))
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
