import { percentOf } from '@/lib/domain/setting-catalogue'
import { troubleWords } from '@/lib/domain/ticket-words'
import type { StartingOdds as Rows } from '@/lib/schemas/settings'
import { RowTh, Table, Td, Th } from '../ui/table'

type StartingOddsProps = {
  rows: Rows
  /** Whether walks start from them. */
  areOn: boolean
}

const percent = (share: number) => `${Math.round(percentOf(share))} %`

function Row({ row }: { row: Rows[number] }) {
  return (
    <tr>
      <RowTh>
        {row.area}
        <span className="block font-normal whitespace-nowrap text-faint">{row.season} months</span>
      </RowTh>
      <Td>{troubleWords[row.trouble]}</Td>
      <Td number>{row.tickets}</Td>
      <Td>
        {row.likely.words} <span className="font-mono">{row.likely.tickets}</span>
      </Td>
      <Td>
        <ul>
          {row.odds.map(({ words, used, catalogue }) => (
            <li key={words} className="flex justify-between gap-3 whitespace-nowrap">
              {words}
              <span className="font-mono">
                {percent(used)} <span className="text-faint">({percent(catalogue)})</span>
              </span>
            </li>
          ))}
        </ul>
      </Td>
    </tr>
  )
}

/** What the closed tickets of a year say of the causes, and the odds that walks start from by them. */
export function StartingOdds({ rows, areOn }: StartingOddsProps) {
  if (rows.length === 0) {
    return (
      <p className="text-sm text-faint">
        No ticket of slow or stopped water was closed with its cause in the last year: every walk
        starts from the catalogue.
      </p>
    )
  }
  const caption = areOn ? 'Where walks start now' : 'Where walks would start'
  return (
    <div className="min-w-0">
      <Table caption={caption}>
        <thead>
          <tr>
            <Th>Area</Th>
            <Th>Trouble</Th>
            <Th className="text-right">Tickets</Th>
            <Th>Most were</Th>
            <Th>Likeliest at the start (by the catalogue)</Th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <Row key={`${row.areaId} ${row.season} ${row.trouble}`} row={row} />
          ))}
        </tbody>
      </Table>
      <p className="mt-2 text-sm text-faint">
        Counted with the weight that is kept. Where nothing is counted the catalogue stands alone.
      </p>
    </div>
  )
}
