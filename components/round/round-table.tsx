import { dayOffWords } from '@/lib/domain/holiday'
import { roundKinds, type RoundDay, type Rounds } from '@/lib/schemas/rounds'
import { RowTh, Table, Td, Th } from '../ui/table'

/** Day by day, how many texts and about what. */
export function RoundTable({ rounds }: { rounds: Rounds }) {
  return (
    <Table caption="What goes out, by day" hideCaption>
      <thead>
        <tr>
          <Th>Day</Th>
          <Th className="text-right">Texts</Th>
          {roundKinds.map((kind) => (
            <Th key={kind} className="text-right">
              {columnNames[kind]}
            </Th>
          ))}
        </tr>
      </thead>
      <tbody>
        {rounds.days.map((day) => (
          <DayRow key={day.on} day={day} />
        ))}
      </tbody>
    </Table>
  )
}

const columnNames: Record<(typeof roundKinds)[number], string> = {
  wash: 'Wash',
  change: 'Change',
  'flow check': 'Flow check',
  welcome: 'Welcome',
  nudge: 'Nudge',
  other: 'Other',
}

/** Why nothing goes that day, or not everywhere. */
function DaysOff({ day: { off, daysOff } }: { day: RoundDay }) {
  const why = dayOffWords(daysOff)
  if (!off && why === '') return null
  return (
    <span className="block max-w-72 text-sm font-normal whitespace-normal text-faint">
      {off && why === '' ? 'no texts any more that day' : `no texts: ${why}`}
    </span>
  )
}

function DayRow({ day }: { day: RoundDay }) {
  return (
    <tr>
      <RowTh className="whitespace-nowrap">
        {day.texts > 0 ? (
          <a href={`#${day.on}`} className="plain-link">
            {day.long}
          </a>
        ) : (
          day.long
        )}
        <DaysOff day={day} />
      </RowTh>
      <Td number className="font-medium">
        {day.texts}
      </Td>
      {roundKinds.map((kind) => (
        <Td key={kind} number className={day.counts[kind] === 0 ? 'text-faint' : ''}>
          {day.counts[kind] === 0 ? '–' : day.counts[kind]}
        </Td>
      ))}
    </tr>
  )
}
