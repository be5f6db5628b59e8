'use client'

import { useState } from 'react'
import { Button } from '../ui/button'
import { AreaField } from '../ui/field'
import type { TicketDesk } from './use-ticket'

/** Notes what a visitor saw, and whether the water runs. */
export function NoteVisit({ desk }: { desk: TicketDesk }) {
  const [note, setNote] = useState<string | null>(null)
  if (note === null) {
    return (
      <Button size="small" className="my-1.5" onClick={() => setNote('')}>
        Note the visit
      </Button>
    )
  }
  const keep = (flowing: boolean) =>
    desk.act({ name: 'note-visit', body: { flowing, note }, said: 'The visit is noted.' })
  return (
    <div className="my-2 space-y-2">
      <AreaField
        label="What was seen"
        optional
        value={note}
        maxLength={500}
        onChange={({ currentTarget }) => setNote(currentTarget.value)}
      />
      <div className="flex flex-wrap gap-2">
        <Button size="small" busy={desk.busy} onClick={() => keep(true)}>
          It flows
        </Button>
        <Button size="small" busy={desk.busy} onClick={() => keep(false)}>
          It does not flow
        </Button>
      </div>
    </div>
  )
}
