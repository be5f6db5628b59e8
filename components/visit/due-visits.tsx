import type { DueVisit } from '@/lib/schemas/visit'
import { EmptyState } from '../ui/empty-state'

/** The visits that are due: the day, the house and where it is, and what is to be done there. */
export function DueVisits({ visits }: { visits: DueVisit[] }) {
  if (visits.length === 0) {
    return (
      <EmptyState title="No visit is due">
        When the desk books one for you, or for whoever can go, it stands here.
      </EmptyState>
    )
  }
  return (
    <ol className="grid max-w-reading gap-6">
      {visits.map((visit) => (
        <li key={visit.id}>
          <p className="text-sm text-faint">
            {visit.day}
            {!visit.given && ' · given to nobody yet'}
          </p>
          <h2 className="font-title text-lg font-semibold">{visit.household} house</h2>
          <p>{visit.why}</p>
          <p className="text-sm text-faint">
            {[visit.area, visit.place, visit.language].filter(Boolean).join(' · ')}
          </p>
        </li>
      ))}
    </ol>
  )
}
