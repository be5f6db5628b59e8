'use client'

import { signOut } from 'next-auth/react'

export function SignOut() {
  return (
    <button
      type="button"
      onClick={() => void signOut({ callbackUrl: '/sign-in' })}
      className="text-ink decoration-rule hover:decoration-water py-2.5 whitespace-nowrap underline decoration-[1.5px] underline-offset-4"
    >
      Sign out
    </button>
  )
}
