import 'server-only'
import { notFound, redirect } from 'next/navigation'
import { cache } from 'react'
import { currentActor } from './auth'
import { may, type Act, type Actor } from './domain/role'

/** Read once a request: the layout and the page both ask. */
const actorOfRequest = cache(currentActor)

/**
 * Who opens this staff page. Nobody signed in goes to the sign-in page; a role that may not do `act` gets
 * the page that says there is nothing here. The service behind the page asks again.
 */
export async function deskActor(act?: Act): Promise<Actor> {
  const actor = await actorOfRequest()
  if (!actor) redirect('/sign-in')
  if (act && !may(actor.role, act)) notFound()
  return actor
}
