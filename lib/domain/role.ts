/** Who may do what. Every service that serves a person asks this table; a menu only mirrors it. */
export type Role = 'agent' | 'coordinator' | 'visitor'

/** A person of staff who is signed in now, as the session gate found them in the database. */
export type Actor = {
  staffId: string
  name: string
  role: Role
  /** The languages they can serve. */
  languages: readonly string[]
}

const acts = {
  'see the shift': ['agent', 'coordinator'],
  'work tickets': ['agent', 'coordinator'],
  'see households': ['agent', 'coordinator'],
  'enter households': ['agent', 'coordinator'],
  'write wording': ['coordinator'],
  'see wording': ['coordinator'],
  'set reply words': ['coordinator'],
  'see rounds': ['coordinator'],
  'set up areas': ['coordinator'],
  'change settings': ['coordinator'],
  'keep stock': ['coordinator'],
  'see own visits': ['visitor', 'coordinator'],
  'move the practice clock': ['agent', 'coordinator', 'visitor'],
} as const satisfies Record<string, readonly Role[]>

export type Act = keyof typeof acts

export function may(role: Role, act: Act): boolean {
  return (acts[act] as readonly Role[]).includes(role)
}

/** The roles that may do it. */
export function rolesFor(act: Act | 'public'): readonly Role[] {
  return act === 'public' ? [] : acts[act]
}

/** Thrown by a service when the person may not do what was asked; the border answers 403. */
export class NotAllowedError extends Error {
  constructor(act: Act) {
    super(`Your role may not do this: ${act}.`)
    this.name = 'NotAllowedError'
  }
}

/** Stops a use case that the actor's role does not cover. */
export function allow(actor: Actor, act: Act): void {
  if (!may(actor.role, act)) throw new NotAllowedError(act)
}
