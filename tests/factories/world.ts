import { findStaff, insertStaff } from '@/db/queries/staff'
import { listKitModels, listModelStages } from '@/db/queries/reference'
import type { Deps } from '@/lib/deps'
import type { Language } from '@/lib/domain/language'
import type { Actor, Role } from '@/lib/domain/role'
import { areaInputSchema } from '@/lib/schemas/area'
import { householdInputSchema } from '@/lib/schemas/household-entry'
import { enterArea } from '@/lib/services/enter-area'
import { enterDepot } from '@/lib/services/enter-depot'
import { enterHousehold } from '@/lib/services/enter-household'
import { prepareDesk } from '@/lib/services/prepare-desk'
import { receiveText, storeInbound } from '@/lib/services/receive-text'

/** A person of staff who may sign in; the password is not one that opens anything. */
export async function actorOf(
  deps: Deps,
  role: Role,
  given: { name?: string; languages?: Language[] } = {},
): Promise<Actor> {
  const name = given.name ?? `Test ${role}`
  const row = await insertStaff(deps.store.db, {
    email: `${name.toLowerCase().replaceAll(' ', '.')}@rillpost.example`,
    name,
    role,
    languages: given.languages ?? ['en', 'es'],
    passwordHash: 'none',
    createdAt: deps.clock.now(),
  })
  const found = row && (await findStaff(deps.store.db, row.id))
  if (!found) throw new Error('The actor was not kept.')
  return { staffId: found.id, name, role, languages: found.languages }
}

export type World = { coordinator: Actor; areaId: string; depotId: string; modelId: string }

/** A desk with an area in the Nairobi zone, a depot with `stock` of each stage's part, and nobody in it. */
export async function world(deps: Deps, { stock = 3 }: { stock?: number } = {}): Promise<World> {
  await prepareDesk(deps)
  const coordinator = await actorOf(deps, 'coordinator', { name: 'Tomas Ibarra' })
  const [model] = await listKitModels(deps.store.db)
  if (!model) throw new Error('There is no kit model.')
  const stages = await listModelStages(deps.store.db, model.id)
  const depot = await enterDepot(deps, coordinator, {
    name: 'Vado depot',
    place: '',
    stock: stages.map(({ partId }) => ({ partId, quantity: stock })),
  })
  if (!depot.ok) throw new Error(depot.reason)
  const area = await enterArea(
    deps,
    coordinator,
    areaInputSchema.parse({
      name: 'Loma Clara',
      timeZone: 'Africa/Nairobi',
      language: 'es',
      windowOpens: '08:00',
      windowCloses: '20:00',
      sundaysOff: false,
      holidays: [],
      altitudeMetres: 400,
      wetMonths: [],
      monthCelsius: Array.from({ length: 12 }, () => 20),
      depotId: depot.depotId,
    }),
  )
  if (!area.ok) throw new Error(area.reason)
  return { coordinator, areaId: area.areaId, depotId: depot.depotId, modelId: model.id }
}

/** A household of six on one phone, with its kit handed over on a day and a first litre in 3 minutes. */
export async function houseIn(
  deps: Deps,
  { coordinator, areaId, modelId }: World,
  given: {
    name?: string
    number?: string
    language?: Language
    handedOverOn: string
    infant?: boolean
  },
) {
  const entered = await enterHousehold(
    deps,
    coordinator,
    householdInputSchema.parse({
      name: given.name ?? 'Orellana',
      areaId,
      language: given.language ?? 'es',
      people: 6,
      infant: given.infant ?? false,
      sourceClass: 'cloudy',
      phones: [{ number: given.number ?? '+12025550101', answeredBy: 'Rosa' }],
      consent: { how: 'by word at the hand-over', by: 'Rosa' },
      kit: { modelId, handedOverOn: given.handedOverOn },
      reading: { minutes: 3, celsius: 20 },
    }),
  )
  if (!entered.ok) throw new Error(entered.reason)
  return entered
}

let inbound = 0

/** A household's text, through the same doors as the webhook's and the job's. */
export async function say(deps: Deps, from: string, body: string): Promise<void> {
  inbound += 1
  const sid = `SM${inbound.toString(16).padStart(32, 'a')}`
  const stored = await storeInbound(deps, { sid, from, body, raw: {} })
  if (stored) await receiveText(deps, stored)
}
