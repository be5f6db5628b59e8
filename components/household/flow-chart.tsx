import { Table, Td, Th, RowTh } from '../ui/table'
import { FlowDrawing } from './flow-drawing'
import type { FlowForecast, FlowPoint } from './flow-point'

type FlowChartProps = {
  /** Oldest first. */
  points: readonly FlowPoint[]
  needLitresPerHour: number
  forecast: FlowForecast
  /** The forecast as staff read it. */
  forecastWords: string
  /** The area's, in which days are named. */
  timeZone: string
}

function dayFormat(timeZone: string): (at: number) => string {
  const format = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', timeZone })
  return (at) => format.format(at)
}

function Readings({
  points,
  formatDay,
}: Pick<FlowChartProps, 'points'> & { formatDay: (at: number) => string }) {
  return (
    <Table caption="Flow readings, litres an hour at 20 °C and full head" hideCaption>
      <thead>
        <tr>
          <Th>Day</Th>
          <Th className="text-right">L/h at 20 °C</Th>
          <Th className="text-right">±</Th>
          <Th>Taken</Th>
        </tr>
      </thead>
      <tbody>
        {points.toReversed().map((point) => (
          <tr key={point.at}>
            <RowTh className="font-normal whitespace-nowrap">{formatDay(point.at)}</RowTh>
            <Td number>{point.litresPerHour.toFixed(1)}</Td>
            <Td number>{point.errorLitresPerHour?.toFixed(1) ?? ''}</Td>
            <Td>{point.note ?? (point.afterWash ? 'after a wash' : '')}</Td>
          </tr>
        ))}
      </tbody>
    </Table>
  )
}

/** A kit's flow against its need, in words, as a drawing, and as a table for who wants the figures. */
export function FlowChart({ points, needLitresPerHour, forecast, ...rest }: FlowChartProps) {
  const { forecastWords: words, timeZone } = rest
  const formatDay = dayFormat(timeZone)
  const last = points.at(-1)
  if (!last) return <p className="text-faint">No flow reading yet.</p>
  const label = `${points.length} flow readings, the last ${last.litresPerHour.toFixed(1)} litres an hour; need ${needLitresPerHour.toFixed(1)}. ${words}`
  return (
    <figure className="m-0">
      <FlowDrawing
        points={points}
        needLitresPerHour={needLitresPerHour}
        forecast={forecast}
        formatDay={formatDay}
        label={label}
      />
      <figcaption className="mt-2 text-sm">
        <span className="text-faint">
          Litres an hour at 20 °C and full head; full beads after a wash.
        </span>{' '}
        {words}
      </figcaption>
      <details className="mt-2">
        <summary className="inline-block py-2 text-sm font-semibold underline decoration-rule decoration-[1.5px] underline-offset-4">
          The readings as a table
        </summary>
        <Readings points={points} formatDay={formatDay} />
      </details>
    </figure>
  )
}
