import { listModelStages, listKitModels } from '@/db/queries/reference'
import { upsertSetting } from '@/db/queries/setting'
import type { Deps } from '@/lib/deps'
import { addDays } from '@/lib/domain/day'
import type { SourceClass } from '@/lib/domain/cycle'
import type { Actor } from '@/lib/domain/role'
import { localDay } from '@/lib/domain/round'
import { areaInputSchema } from '@/lib/schemas/area'
import { householdInputSchema } from '@/lib/schemas/household-entry'
import { enterArea } from '@/lib/services/enter-area'
import { enterDepot } from '@/lib/services/enter-depot'
import { enterHousehold } from '@/lib/services/enter-household'
import { newFamily } from './family'
import { feasts, places, timeZone, type Place } from './places'
import type { Random } from './random'

type Setting = { deps: Deps; coordinator: Actor; random: Random; modelId: string }

const stock: Record<string, readonly number[]> = {
  'Vado depot': [40, 14, 4],
  'Ferry depot': [30, 9, 3],
  'Char depot': [24, 8, 2],
}

/** The programme's depots and areas. Gives the areas' ids by name. */
export async function settlePlaces({ deps, coordinator, modelId }: Omit<Setting, 'random'>) {
  await upsertSetting(deps.store.db, {
    key: 'programme.name',
    value: 'Three Fords Water',
    setAt: deps.clock.now(),
  })
  const stages = await listModelStages(deps.store.db, modelId)
  const depots = new Map<string, string>()
  for (const [name, quantities] of Object.entries(stock)) {
    const made = await enterDepot(deps, coordinator, {
      name,
      place: '',
      stock: stages.map(({ partId }, at) => ({ partId, quantity: quantities[at] ?? 0 })),
    })
    if (!made.ok) throw new Error(made.reason)
    depots.set(name, made.depotId)
  }
  const today = localDay(deps.clock.now(), timeZone)
  const areas = new Map<string, string>()
  for (const place of places) {
    const made = await enterArea(
      deps,
      coordinator,
      areaInputSchema.parse(areaOf(place, { depots, today })),
    )
    if (!made.ok) throw new Error(made.reason)
    areas.set(place.name, made.areaId)
  }
  return areas
}

function areaOf(place: Place, { depots, today }: { depots: Map<string, string>; today: string }) {
  const here = feasts.filter((feast) => feast.place === null || feast.place === place.name)
  return {
    name: place.name,
    timeZone,
    language: place.language,
    windowOpens: '08:00',
    windowCloses: '20:00',
    sundaysOff: false,
    holidays: here.map(({ day, name }) => ({ on: addDays(today, day), name })),
    altitudeMetres: place.altitudeMetres,
    wetMonths: place.wetMonths,
    monthCelsius: place.monthCelsius,
    depotId: depots.get(place.depot) ?? '',
  }
}

export async function modelIdOf(deps: Deps): Promise<string> {
  const [model] = await listKitModels(deps.store.db)
  if (!model) throw new Error('There is no kit model.')
  return model.id
}

/** A family of a place gets its kit on a day; its phone joins the shelf of practice phones. */
export async function settleFamily(
  { deps, coordinator, random, modelId }: Setting,
  given: {
    place: Place
    areaId: string
    index: number
    daysAgo: number
    days: number
    sourceClass?: SourceClass
  },
) {
  const { place, areaId, index, daysAgo } = given
  const number = `+1${place.areaCode}5550${100 + index}`
  const family = newFamily(random, { number, language: place.language, days: given.days })
  const name = place.families[index] ?? `House ${index + 1}`
  const entered = await enterHousehold(
    deps,
    coordinator,
    householdInputSchema.parse({
      name,
      areaId,
      place: `${random.pick(['upper', 'lower', 'mill', 'chapel', 'river'])} side, house ${index + 1}`,
      language: place.language,
      people: random.whole(2, 9),
      infant: random.chance(0.25),
      pregnant: random.chance(0.08),
      elderly: random.chance(0.2),
      ill: random.chance(0.05),
      sourceClass: given.sourceClass ?? random.pick(place.source),
      phones: [
        { number, answeredBy: random.pick(['mother', 'father', 'grandmother', 'eldest child']) },
      ],
      consent: { how: 'by word at the hand-over', by: 'the family' },
      kit: { modelId, handedOverOn: addDays(localDay(deps.clock.now(), timeZone), -daysAgo) },
      reading: { minutes: Math.round(family.cleanMinutes * 4) / 4, celsius: null },
    }),
  )
  if (!entered.ok) throw new Error(entered.reason)
  return { family, label: `${name} house, ${place.name}`, householdId: entered.householdId }
}
