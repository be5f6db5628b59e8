import 'server-only'
import { verify } from '@node-rs/argon2'
import { getServerSession, type NextAuthOptions } from 'next-auth'
import Credentials from 'next-auth/providers/credentials'
import { RateLimiterMemory } from 'rate-limiter-flexible'
import { findStaff, findStaffByEmail } from '@/db/queries/staff'
import { getDeps } from './deps'
import type { Actor } from './domain/role'
import { env } from './env'

declare module 'next-auth' {
  interface Session {
    staffId?: string
    sessionVersion?: number
  }
  interface User {
    sessionVersion: number
  }
}

declare module 'next-auth/jwt' {
  interface JWT {
    sessionVersion?: number
  }
}

// Compared against where no such account is, so that unknown and wrong take the same time.
const NOBODY =
  '$argon2id$v=19$m=19456,t=2,p=1$c29tZXNhbHRzb21lc2FsdA$wDxGfHVQm0HT0oYW1Tq0dPTd7DW5v8XDXdtVDyDQ5zM'

/** Ten tries in a quarter of an hour for one account: guessing is slow, a forgotten key is not. */
const tries = new RateLimiterMemory({ points: 10, duration: 15 * 60 })

async function authorize(given: Record<'email' | 'password', string> | undefined) {
  const email = given?.email?.trim() ?? ''
  const password = given?.password ?? ''
  if (!email || !password || password.length > 200) return null
  const key = email.toLowerCase()
  const isLeft = await tries.consume(key).then(
    () => true,
    () => false,
  )
  if (!isLeft) throw new Error('too many tries')
  const { store } = await getDeps()
  const found = await findStaffByEmail(store.db, email)
  const right = await verify(found?.passwordHash ?? NOBODY, password).catch(() => false)
  if (!found || !right || found.disabledAt !== null) return null
  await tries.delete(key)
  return {
    id: found.id,
    email: found.email,
    name: found.name,
    sessionVersion: found.sessionVersion,
  }
}

/** How staff sign in. Made on use: the secret is read from the settings, not at build time. */
export function authOptions(): NextAuthOptions {
  return {
    secret: env().sessionSecret,
    session: { strategy: 'jwt', maxAge: 12 * 60 * 60 },
    pages: { signIn: '/sign-in' },
    providers: [
      Credentials({
        name: 'E-mail',
        credentials: { email: { type: 'email' }, password: { type: 'password' } },
        authorize,
      }),
    ],
    callbacks: {
      jwt({ token, user }) {
        // `user` is only there at sign-in, whatever its type says.
        if ((user as unknown) !== undefined) token.sessionVersion = user.sessionVersion
        return token
      },
      session({ session, token }) {
        session.staffId = token.sub
        session.sessionVersion = token.sessionVersion
        return session
      },
    },
  }
}

/** Who is signed in, read anew from the database: a session ends when its account is closed or changed. */
export async function currentActor(): Promise<Actor | null> {
  const session = await getServerSession(authOptions())
  if (!session?.staffId) return null
  const { store } = await getDeps()
  const found = await findStaff(store.db, session.staffId)
  if (!found || found.disabledAt !== null) return null
  if (found.sessionVersion !== session.sessionVersion) return null
  return { staffId: found.id, name: found.name, role: found.role, languages: found.languages }
}
