'use client'

import { signOut } from 'next-auth/react'

export function SignOut() {
  return (
    <button
      type="button"
      onClick={() => void signOut({ callbackUrl: '/sign-in' })}
      className="py-2.5 whitespace-nowrap text-ink underline decoration-rule decoration-[1.5px] underline-offset-4 hover:decoration-water"
    >
      Sign out
    </button>
  )
}
