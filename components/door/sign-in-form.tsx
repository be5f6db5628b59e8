'use client'

import { signIn } from 'next-auth/react'
import { useState, type FormEvent } from 'react'
import { Button } from '../ui/button'
import { TextField } from '../ui/field'
import { Notice } from '../ui/notice'

type Trouble = 'wrong' | 'too many' | 'no answer'

const troubleWords: Record<Trouble, { title: string; detail: string }> = {
  wrong: {
    title: 'That e-mail and password do not go together.',
    detail: 'Check both, and try again. Whoever runs the desk can give you a new password.',
  },
  'too many': {
    title: 'Too many tries.',
    detail: 'Wait a while, then try again.',
  },
  'no answer': {
    title: 'The desk did not answer.',
    detail: 'Nothing is wrong with your password. Try again in a moment.',
  },
}

function written(form: FormData, name: string): string {
  const value = form.get(name)
  return typeof value === 'string' ? value : ''
}

async function trySignIn(email: string, password: string): Promise<Trouble | null> {
  try {
    const result = await signIn('credentials', { email, password, redirect: false })
    if (result?.ok) return null
    if (!result || result.status >= 500) return 'no answer'
    return /too many/i.test(result.error ?? '') ? 'too many' : 'wrong'
  } catch {
    return 'no answer'
  }
}

/** E-mail and password; afterwards on to `goTo`, a path of this desk. */
export function SignInForm({ goTo }: { goTo: string }) {
  const [trouble, setTrouble] = useState<Trouble | null>(null)
  const [busy, setBusy] = useState(false)

  async function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault()
    if (busy) return
    const form = new FormData(event.currentTarget)
    setBusy(true)
    setTrouble(null)
    const found = await trySignIn(written(form, 'email').trim(), written(form, 'password'))
    // A full load, so that nothing of an earlier person's session stays in the page.
    if (found === null) return window.location.assign(goTo)
    setTrouble(found)
    setBusy(false)
  }

  return (
    <form method="post" onSubmit={(event) => void submit(event)} className="grid gap-5">
      {trouble && (
        <Notice tone="danger" title={troubleWords[trouble].title} live>
          {troubleWords[trouble].detail}
        </Notice>
      )}
      <TextField label="E-mail" name="email" type="email" autoComplete="username" />
      <TextField label="Password" name="password" type="password" autoComplete="current-password" />
      <div>
        <Button kind="main" type="submit" busy={busy}>
          {busy ? 'Signing in …' : 'Sign in'}
        </Button>
      </div>
    </form>
  )
}
