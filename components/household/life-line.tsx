import type { ReactNode } from 'react'
import { LineRow } from '../frame/line-row'
import type { BeadState } from '../ui/bead'

export type LifeEvent = {
  id: string
  /** The day as printed, and a lighter word beside it (`in 12 days`, `08:20`). */
  day: string
  beside?: string
  bead: BeadState
  tone?: 'water' | 'clay'
  title: ReactNode
  note?: ReactNode
}

type LifeLineProps = {
  /** Oldest first: what was. */
  past: readonly LifeEvent[]
  /** Soonest first: what is planned. */
  planned: readonly LifeEvent[]
  /** Today as printed. */
  today: string
  /** How many of the past are shown unfolded, besides the first one (the hand-over). */
  shown?: number
}

function Event({ event, waiting }: { event: LifeEvent; waiting?: boolean }) {
  const { day, beside, bead, tone, title, note } = event
  return (
    <LineRow time={day} since={beside} bead={bead} tone={tone} waiting={waiting} tight>
      <p className="font-semibold">{title}</p>
      {note && <div className="text-sm text-faint">{note}</div>}
    </LineRow>
  )
}

function Folded({ events }: { events: readonly LifeEvent[] }) {
  if (events.length === 0) return null
  return (
    <details>
      <summary className="py-2 pl-lead text-sm text-faint underline decoration-rule decoration-[1.5px] underline-offset-4">
        {events.length} more in between
      </summary>
      {events.map((event) => (
        <Event key={event.id} event={event} />
      ))}
    </details>
  )
}

/** A kit's life on the fall line: from hand-over, through today, to what is planned. */
export function LifeLine({ past, planned, today, shown = 8 }: LifeLineProps) {
  const recentFrom = Math.max(1, past.length - shown)
  const first = past[0]
  return (
    <div>
      {first && <Event event={first} />}
      <Folded events={past.slice(1, recentFrom)} />
      {past.slice(recentFrom).map((event) => (
        <Event key={event.id} event={event} />
      ))}
      <p className="relative my-2 pl-lead text-sm font-semibold">
        <span
          aria-hidden
          className="absolute top-1/2 left-[calc(var(--fall-x)-0.75rem)] h-0.5 w-6 -translate-y-1/2 bg-ink"
        />
        Today, {today}
      </p>
      {planned.map((event) => (
        <Event key={event.id} event={event} waiting />
      ))}
      {planned.length === 0 && <p className="py-2 pl-lead text-sm text-faint">Nothing planned.</p>}
    </div>
  )
}
