'use client'

import { Door } from '@/components/door/door'
import { Button } from '@/components/ui/button'
import './globals.css'

type GlobalErrorProps = { error: Error & { digest?: string }; reset: () => void }

/** Stands in for the whole page, root layout and all, when that itself fails. */
export default function GlobalError({ error, reset }: GlobalErrorProps) {
  return (
    <html lang="en">
      <body className="bg-paper font-sans text-base text-ink antialiased">
        <title>Something broke · Rillpost</title>
        <Door>
          <h1 className="font-title text-3xl font-semibold tracking-[-0.01em]">
            Something broke here
          </h1>
          <p className="mt-1 mb-6 text-faint">
            What was already saved is kept. Try again; if it stays so, tell whoever runs the desk
            {error.digest && (
              <>
                {' '}
                this number: <span className="font-mono text-ink">{error.digest}</span>
              </>
            )}
            .
          </p>
          <Button kind="main" onClick={reset}>
            Try again
          </Button>
        </Door>
      </body>
    </html>
  )
}
