'use client'

import { useState } from 'react'
import type { Shift } from '@/lib/schemas/shift'
import { Band } from '../frame/line-row'
import { Button } from '../ui/button'
import { EmptyState } from '../ui/empty-state'
import { findInShift, type ShownBand } from './held-shift'
import { ShiftRowView } from './shift-row'
import { useHeld } from './use-held'

/** Which rows somebody has had under the eye; the rest are marked as new. */
function useSeen(shift: Shift) {
  const ids = () => shift.bands.flatMap(({ rows }) => rows.map(({ ticketId }) => ticketId))
  const [seen, setSeen] = useState<ReadonlySet<string>>(() => new Set(ids()))
  return {
    isNew: (id: string) => !seen.has(id),
    see: (id: string) => {
      if (!seen.has(id)) setSeen(new Set([...seen, id]))
    },
  }
}

type Seen = ReturnType<typeof useSeen>

function Bands({ bands, seen }: { bands: readonly ShownBand[]; seen: Seen }) {
  return bands.map(({ name, note, rows }) => (
    <Band key={name} name={name} note={note}>
      {rows.map((row, index) => (
        <ShiftRowView
          key={row.ticketId}
          row={row}
          ruled={index > 0}
          isNew={seen.isNew(row.ticketId)}
          onSeen={() => seen.see(row.ticketId)}
        />
      ))}
    </Band>
  ))
}

function Newcomers({ count, onShow }: { count: number; onShow: () => void }) {
  if (count === 0) return null
  return (
    <div className="sticky top-3 z-10 h-0 pl-lead">
      <Button kind="main" size="small" onClick={onShow} className="shadow-float">
        {count === 1 ? '1 new ticket' : `${count} new tickets`}: show
      </Button>
    </div>
  )
}

/** The rows in their bands. While somebody reads, none of them moves; what is new waits above. */
export function ShiftList({ shift, sought }: { shift: Shift; sought: string }) {
  const { bands, newcomers, release, watch } = useHeld(shift)
  const seen = useSeen(shift)
  const shown = findInShift(bands, sought)
  if (shown.length === 0) {
    return (
      <div className="pl-lead">
        <EmptyState title={sought ? 'Nothing in the shift speaks of that.' : 'Nobody waits.'}>
          {!sought && 'Every household that wrote has been answered, as far as we know.'}
        </EmptyState>
      </div>
    )
  }
  return (
    <div {...watch}>
      <Newcomers count={newcomers.length} onShow={release} />
      <Bands bands={shown} seen={seen} />
      {shift.cut && (
        <p className="mt-6 pl-lead font-semibold">
          There are more than 500 open tickets: these are the worst.
        </p>
      )}
    </div>
  )
}
