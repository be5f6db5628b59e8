'use client'

import { useState } from 'react'
import { Button } from '../ui/button'
import type { TicketDesk } from './use-ticket'

/** Picks a step in place of the proposed one. */
export function OtherSteps({ desk }: { desk: TicketDesk }) {
  const [isOpen, setOpen] = useState(false)
  return (
    <>
      <Button kind="quiet" aria-expanded={isOpen} onClick={() => setOpen(!isOpen)}>
        Another step
      </Button>
      {isOpen && (
        <ul aria-label="Other steps" className="w-full border-t border-rule">
          {desk.ticket.otherSteps.map(({ id, name, lead }) => (
            <li key={id} className="border-b border-rule">
              <button
                type="button"
                onClick={() => desk.choose(id)}
                className="flex min-h-11 w-full flex-wrap items-baseline gap-x-3 py-2 text-left hover:bg-ink/8"
              >
                <span className="font-semibold">{name}</span>
                <span className="text-sm text-faint">{lead}</span>
              </button>
            </li>
          ))}
        </ul>
      )}
    </>
  )
}
