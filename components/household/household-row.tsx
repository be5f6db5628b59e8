import Link from 'next/link'
import { languageNamesInEnglish } from '@/lib/domain/language'
import type { HouseholdRow as Row } from '@/lib/schemas/household'
import { LineRow } from '../frame/line-row'
import { Column } from '../kit/column'
import type { BeadState } from '../ui/bead'

type Mark = { bead: BeadState; tone?: 'water' | 'clay'; beadLabel: string }

function markOf(row: Row): Mark {
  if (row.ticket) return { bead: 'half', tone: 'clay', beadLabel: 'In trouble' }
  if (row.kitState === 'retired') return { bead: 'broken', beadLabel: 'Retired' }
  if (row.silentBecause) return { bead: 'broken', beadLabel: 'Not texted' }
  if (row.nextDue?.overdue) return { bead: 'half', beadLabel: 'Due' }
  return { bead: 'ring', beadLabel: 'Planned' }
}

function Sides({ row }: { row: Row }) {
  return (
    <div className="text-sm sm:text-right">
      {row.ticket && (
        <p>
          <Link href={`/tickets/${row.ticket.id}`} className="font-semibold plain-link">
            {row.ticket.words}
            <span className="sr-only">: open the ticket of {row.name}</span>
          </Link>
        </p>
      )}
      {row.kitState !== 'in use' && <p className="font-semibold text-clay">{row.kitState}</p>}
      {row.silentBecause && <p>not texted: {row.silentBecause}</p>}
    </div>
  )
}

/** One kit of a household, hung by what comes next for it. */
export function HouseholdLine({ row, ruled }: { row: Row; ruled: boolean }) {
  const { nextDue } = row
  return (
    <LineRow
      time={nextDue?.day ?? '—'}
      since={nextDue?.words.toLowerCase()}
      {...markOf(row)}
      ruled={ruled}
    >
      <div className="flex gap-4 max-sm:mt-1">
        <Column size="small" {...row.column} />
        <div className="min-w-0 flex-1 gap-x-6 sm:flex">
          <div className="min-w-0 flex-1">
            <p className="font-semibold">
              <Link href={`/households/${row.householdId}`} className="plain-link decoration-rule">
                {row.name}
              </Link>
            </p>
            <p className="text-sm text-faint">
              {row.area} · {row.people} {row.people === 1 ? 'person' : 'people'} ·{' '}
              {languageNamesInEnglish[row.language]}
            </p>
            <p className="text-sm text-faint">
              kit <span className="font-mono">{row.kitNumber}</span>
              {row.phone && (
                <>
                  {' · '}
                  <span className="font-mono whitespace-nowrap">{row.phone}</span>
                </>
              )}
            </p>
          </div>
          <Sides row={row} />
        </div>
      </div>
    </LineRow>
  )
}
