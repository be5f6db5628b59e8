import { insertStaff } from '@/db/queries/staff'
import { hash } from '@node-rs/argon2'
import type { Deps } from '@/lib/deps'
import type { Actor } from '@/lib/domain/role'

/** The password of every demo account; the README prints it. */
const PASSWORD = 'water runs downhill'

const people = [
  {
    key: 'agent',
    email: 'ana@rillpost.example',
    name: 'Ana Belmar',
    role: 'agent',
    languages: ['en', 'es'],
  },
  {
    key: 'second agent',
    email: 'rupa@rillpost.example',
    name: 'Rupa Sen',
    role: 'agent',
    languages: ['bn', 'en'],
  },
  {
    key: 'coordinator',
    email: 'tomas@rillpost.example',
    name: 'Tomas Ibarra',
    role: 'coordinator',
    languages: ['en', 'es', 'fr'],
  },
  {
    key: 'second coordinator',
    email: 'ines@rillpost.example',
    name: 'Ines Moreau',
    role: 'coordinator',
    languages: ['en', 'fr'],
  },
  {
    key: 'visitor',
    email: 'vera@rillpost.example',
    name: 'Vera Lindo',
    role: 'visitor',
    languages: ['es'],
  },
] as const

export type Person = (typeof people)[number]['key']

/** Makes the demo's accounts and gives each as the actor that services ask for. */
export async function makePeople(deps: Deps): Promise<Record<Person, Actor>> {
  const passwordHash = await hash(PASSWORD)
  const actors = {} as Record<Person, Actor>
  for (const { key, email, name, role, languages } of people) {
    const row = await insertStaff(deps.store.db, {
      email,
      name,
      role,
      languages: [...languages],
      passwordHash,
      createdAt: deps.clock.now(),
    })
    if (!row) throw new Error(`The account of ${name} was not made.`)
    actors[key] = { staffId: row.id, name, role, languages }
  }
  return actors
}
