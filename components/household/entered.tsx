'use client'

import { useEffect, useRef } from 'react'
import type { EnteredHousehold } from '@/lib/schemas/household-entry'
import { Button, ButtonLink } from '../ui/button'
import { Notice } from '../ui/notice'

type EnteredProps = { made: EnteredHousehold; onAnother: () => void }

/** In place of the form: the kit’s number, to be written on its container, and what wants a second look. */
export function Entered({ made, onAnother }: EnteredProps) {
  const heading = useRef<HTMLHeadingElement>(null)
  useEffect(() => heading.current?.focus(), [])
  return (
    <div className="grid max-w-2xl gap-6">
      <div>
        <h2 ref={heading} tabIndex={-1} className="font-title text-xl font-semibold">
          Entered: kit number <span className="font-mono">{made.kitNumber}</span>
        </h2>
        <p className="text-faint">Write the number on the container.</p>
      </div>
      {made.notes.map((note) => (
        <Notice key={note} tone="due">
          {note}
        </Notice>
      ))}
      <div className="flex flex-wrap gap-4">
        <ButtonLink href={`/households/${made.householdId}`} kind="main">
          Open its sheet
        </ButtonLink>
        <Button onClick={onAnother}>Enter another</Button>
      </div>
    </div>
  )
}
