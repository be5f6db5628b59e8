import Link from 'next/link'
import type { Going, RoundDay } from '@/lib/schemas/rounds'
import { Bead, type BeadState } from '../ui/bead'
import { RowTh, Table, Td, Th } from '../ui/table'

/** Who hears what on one day, in the order of the hours. */
export function DayList({ day }: { day: RoundDay }) {
  return (
    <section id={day.on} aria-labelledby={`${day.on}-name`} className="mt-10 scroll-mt-4">
      <h2 id={`${day.on}-name`} className="mb-2 font-title text-lg font-semibold">
        {day.long}{' '}
        <span className="font-sans text-sm font-normal text-faint">
          {day.texts === 1 ? '1 text' : `${day.texts} texts`}
        </span>
      </h2>
      <Table caption={`Texts of ${day.long}`} hideCaption>
        <thead className="sr-only">
          <tr>
            <Th>Hour</Th>
            <Th>Household</Th>
            <Th>About</Th>
            <Th>State</Th>
          </tr>
        </thead>
        <tbody>
          {day.going.map((going, index) => (
            <GoingRow key={`${going.householdId} ${going.what} ${index}`} going={going} />
          ))}
        </tbody>
      </Table>
      {day.more > 0 && <p className="mt-2 text-sm text-faint">And {day.more} more that day.</p>}
    </section>
  )
}

const states: Record<Going['state'], { bead: BeadState; words: string }> = {
  queued: { bead: 'half', words: 'written, waits for its hour' },
  planned: { bead: 'ring', words: 'planned' },
  'if silent': { bead: 'broken', words: 'only if they stay silent' },
}

function GoingRow({ going }: { going: Going }) {
  const { bead, words } = states[going.state]
  return (
    <tr>
      <Td className="w-20 font-mono font-medium">{going.hour}</Td>
      <RowTh className="md:w-[30%]">
        <Link href={`/households/${going.householdId}`} className="plain-link">
          {going.house}
        </Link>
        <span className="block text-xs font-normal text-faint">{going.area}</span>
      </RowTh>
      <Td>{going.what}</Td>
      <Td className="md:w-[28%]">
        <span className="inline-flex items-start gap-2">
          <Bead state={bead} className="mt-0.5" />
          {words}
        </span>
      </Td>
    </tr>
  )
}
