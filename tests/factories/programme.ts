import { insertReferenceData, listKitModels, listModelStages } from '@/db/queries/reference'
import { insertStaff } from '@/db/queries/staff'
import type { Actor, Role } from '@/lib/domain/role'
import type { AreaInput } from '@/lib/schemas/area'
import type { HouseholdInput } from '@/lib/schemas/household-entry'
import { enterArea } from '@/lib/services/enter-area'
import { enterDepot } from '@/lib/services/enter-depot'
import { enterHousehold } from '@/lib/services/enter-household'
import type { TestDeps } from './deps'

/** Somebody of staff who is signed in. Cannot sign in by password: tests of that make their own. */
export async function signedIn(
  deps: TestDeps,
  role: Role,
  name = `The ${role}`,
): Promise<Actor & { email: string }> {
  const email = `${name.toLowerCase().replaceAll(' ', '.')}@desk.example`
  const languages = ['en', 'es']
  const createdAt = deps.clock.now()
  const row = { email, name, role, languages, passwordHash: 'none', createdAt }
  const made = await insertStaff(deps.store.db, row)
  if (!made) throw new Error(`${email} is on the staff already.`)
  return { staffId: made.id, name, role, languages, email }
}

export const areaInput = {
  name: 'Loma Clara',
  timeZone: 'America/La_Paz',
  language: 'es',
  windowOpens: '08:00',
  windowCloses: '20:00',
  sundaysOff: true,
  holidays: [],
  altitudeMetres: 1200,
  wetMonths: [12, 1, 2, 3],
  monthCelsius: [22, 22, 21, 20, 18, 16, 16, 17, 19, 20, 21, 22],
} satisfies Omit<AreaInput, 'depotId'>

/** A programme with one coordinator, one depot with ten of each part, and one area. */
export async function programme(deps: TestDeps, area: Partial<AreaInput> = {}) {
  await deps.store.transaction((tx) => insertReferenceData(tx))
  const coordinator = await signedIn(deps, 'coordinator')
  const [model] = await listKitModels(deps.store.db)
  if (!model) throw new Error('There is no kit model.')
  const stages = await listModelStages(deps.store.db, model.id)
  const stock = stages.map(({ partId }) => ({ partId, quantity: 10 }))
  const depot = await enterDepot(deps, coordinator, { name: 'Vado depot', place: '', stock })
  if (!depot.ok) throw new Error(depot.reason)
  const made = await enterArea(deps, coordinator, {
    ...areaInput,
    depotId: depot.depotId,
    ...area,
  })
  if (!made.ok) throw new Error(made.reason)
  const parts = stages.map(({ partId }) => partId)
  return { coordinator, areaId: made.areaId, depotId: depot.depotId, modelId: model.id, parts }
}

export type Programme = Awaited<ReturnType<typeof programme>>

/** A family of six with consent, a kit handed over on 1 March 2026 and a first reading of 4 minutes. */
export function householdInput(
  { areaId, modelId }: Pick<Programme, 'areaId' | 'modelId'>,
  change: Partial<HouseholdInput> = {},
): HouseholdInput {
  return {
    name: 'Orellana house',
    areaId,
    place: 'Behind the mill',
    language: 'es',
    people: 6,
    infant: true,
    pregnant: false,
    elderly: false,
    ill: false,
    sourceClass: 'cloudy',
    phones: [{ number: '+15055550142', answeredBy: 'the mother' }],
    consent: { how: 'on paper', by: 'Rosa Orellana' },
    kit: { modelId, handedOverOn: '2026-03-01' },
    reading: { minutes: 4, celsius: 20 },
    ...change,
  }
}

/** Enters that family, and throws where the service refuses it. */
export async function entered(
  deps: TestDeps,
  place: Programme,
  change: Partial<HouseholdInput> = {},
) {
  const made = await enterHousehold(deps, place.coordinator, householdInput(place, change))
  if (!made.ok) throw new Error(made.reason)
  return made
}
