import type { Metadata } from 'next'
import { SignInForm } from '@/components/door/sign-in-form'

export const metadata: Metadata = { title: 'Sign in' }

type SignInPageProps = { searchParams: Promise<{ from?: string | string[] }> }

/** Only a path of this desk: never another host, not even by `//` or a backslash. */
function ownPath(from: string | string[] | undefined): string {
  return typeof from === 'string' && /^\/(?![/\\])[^\\]*$/.test(from) ? from : '/'
}

export default async function SignInPage({ searchParams }: SignInPageProps) {
  const { from } = await searchParams
  return (
    <>
      <h1 className="font-title text-3xl font-semibold tracking-[-0.01em]">Sign in</h1>
      <p className="mt-1 mb-6 text-faint">
        The text desk that keeps household water filters running.
      </p>
      <SignInForm goTo={ownPath(from)} />
    </>
  )
}
