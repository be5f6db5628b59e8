import Link from 'next/link'
import type { Going, RoundDay } from '@/lib/schemas/rounds'
import { Bead, type BeadState } from '../ui/bead'

/** Who hears what on one day, in the order of the hours. */
export function DayList({ day }: { day: RoundDay }) {
  return (
    <section id={day.on} aria-labelledby={`${day.on}-name`} className="mt-9 scroll-mt-4">
      <h2
        id={`${day.on}-name`}
        className="border-b border-ink pb-1.5 font-title text-lg font-semibold"
      >
        {day.long}{' '}
        <span className="font-sans text-sm font-normal text-faint">
          {day.texts === 1 ? '1 text' : `${day.texts} texts`}
        </span>
      </h2>
      <ol className="text-sm">
        {day.going.map((going, index) => (
          <GoingRow key={`${going.householdId} ${going.what} ${index}`} going={going} />
        ))}
      </ol>
      {day.more > 0 && <p className="mt-2 text-sm text-faint">And {day.more} more that day.</p>}
    </section>
  )
}

const states: Record<Going['state'], { bead: BeadState | null; words: string }> = {
  queued: { bead: 'half', words: 'written, waits for its hour' },
  planned: { bead: 'ring', words: 'planned' },
  'if silent': { bead: null, words: 'only if they stay silent' },
}

function GoingRow({ going }: { going: Going }) {
  const { bead, words } = states[going.state]
  return (
    <li className="grid grid-cols-[3.25rem_minmax(0,1fr)] gap-x-4 border-b border-rule py-2 md:grid-cols-[3.25rem_minmax(0,5fr)_minmax(0,5fr)_14rem]">
      <span className="font-mono font-medium">{going.hour}</span>
      <span>
        <Link href={`/households/${going.householdId}`} className="font-semibold plain-link">
          {going.house}
        </Link>{' '}
        <span className="text-faint">{going.area}</span>
      </span>
      <span className="max-md:col-start-2">{going.what}</span>
      <span className="inline-flex items-start gap-2 max-md:col-start-2">
        {bead && <Bead state={bead} className="mt-0.5" />}
        <span className={bead ? '' : 'text-faint italic md:ml-6'}>{words}</span>
      </span>
    </li>
  )
}
