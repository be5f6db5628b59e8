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
        {day.off && <span className="font-normal text-faint"> · no texts that day</span>}
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
