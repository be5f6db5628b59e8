import { scaleLinear, type ScaleLinear } from 'd3-scale'
import { line } from 'd3-shape'
import type { FlowForecast, FlowPoint } from './flow-point'

type FlowDrawingProps = {
  points: readonly FlowPoint[]
  /** Litres an hour that give the house its day's water in time. */
  needLitresPerHour: number
  forecast: FlowForecast
  formatDay: (at: number) => string
  label: string
}

type Scales = { x: ScaleLinear<number, number>; y: ScaleLinear<number, number> }

const size = { width: 380, height: 220 }
const inside = { left: 34, right: 366, top: 14, bottom: 188 }
const dayMilliseconds = 86_400_000
/** Room kept right of the last reading, so that a forecast has somewhere to go. */
const daysAhead = 21
/** A latest day this far behind the likeliest would press the readings together: the fan runs off the page. */
const widestDays = 90

function latestDrawn({ onAt, latestAt }: Extract<FlowForecast, { kind: 'falls' }>): number | null {
  return latestAt !== null && latestAt <= onAt + widestDays * dayMilliseconds ? latestAt : null
}

function scalesOf({ points, needLitresPerHour, forecast }: FlowDrawingProps): Scales {
  const first = points[0]?.at ?? 0
  const last = points.at(-1)?.at ?? 0
  const falls = forecast.kind === 'falls' ? (latestDrawn(forecast) ?? forecast.onAt) : last
  const tallest = points.map((point) => point.litresPerHour + (point.errorLitresPerHour ?? 0))
  return {
    x: scaleLinear(
      [first, Math.max(falls, last + daysAhead * dayMilliseconds)],
      [inside.left + 8, inside.right],
    ),
    y: scaleLinear([0, Math.max(needLitresPerHour, ...tallest) * 1.1], [inside.bottom, inside.top]),
  }
}

function Axis({ y }: { y: Scales['y'] }) {
  return y.ticks(4).map((tick) => (
    <g key={tick}>
      <path d={`M${inside.left} ${y(tick)}H${inside.right}`} className="stroke-rule" />
      <text x={inside.left - 7} y={y(tick) + 4} textAnchor="end" className="fill-faint">
        {tick}
      </text>
    </g>
  ))
}

type FanProps = { scales: Scales; last: FlowPoint; need: number; forecast: FlowForecast }

function Fan({ scales: { x, y }, last, need, forecast }: FanProps) {
  // What lies before the last reading is no forecast; the words say that it is under the need.
  if (forecast.kind !== 'falls' || forecast.onAt <= last.at) return null
  const from = `${x(last.at)} ${y(last.litresPerHour)}`
  // Without a latest day the slow edge of the fan never falls: it runs level to the right edge.
  const latest = latestDrawn(forecast)
  const slow = latest
    ? `${x(latest)} ${y(need)}`
    : `${inside.right} ${y(last.litresPerHour)}L${inside.right} ${y(need)}`
  return (
    <>
      <path
        d={`M${from}L${slow}L${x(Math.max(forecast.earliestAt, last.at))} ${y(need)}Z`}
        className="fill-water"
        fillOpacity="0.18"
      />
      <path
        d={`M${from}L${x(forecast.onAt)} ${y(need)}`}
        className="stroke-water"
        strokeWidth="1.5"
        strokeDasharray="4 4"
      />
    </>
  )
}

function Point({ point, scales: { x, y } }: { point: FlowPoint; scales: Scales }) {
  const error = point.errorLitresPerHour ?? 0
  const low = y(Math.max(0, point.litresPerHour - error))
  return (
    <g>
      {error > 0 && (
        <path
          d={`M${x(point.at)} ${low}V${y(point.litresPerHour + error)}`}
          className="stroke-water"
          strokeWidth="1.2"
        />
      )}
      <circle
        cx={x(point.at)}
        cy={y(point.litresPerHour)}
        r="4.5"
        className={`stroke-water ${point.afterWash ? 'fill-water' : 'fill-paper'}`}
        strokeWidth="2"
      />
    </g>
  )
}

/** Flow over time, the need as a line across, the forecast as a fan that falls to it. */
export function FlowDrawing(props: FlowDrawingProps) {
  const { points, needLitresPerHour: need, forecast, formatDay, label } = props
  const scales = scalesOf(props)
  const { x, y } = scales
  const last = points.at(-1)
  const path = line<FlowPoint>()
    .x((point) => x(point.at))
    .y((point) => y(point.litresPerHour))
  const days = points.length > 1 ? [points[0], last] : [last]
  return (
    <svg
      role="img"
      aria-label={label}
      viewBox={`0 0 ${size.width} ${size.height}`}
      fill="none"
      className="block w-full max-w-[29rem] font-mono text-[12px]"
    >
      <Axis y={y} />
      {last && <Fan scales={scales} last={last} need={need} forecast={forecast} />}
      <path d={path(points) ?? undefined} className="stroke-water" strokeWidth="1.5" />
      {points.map((point) => (
        <Point key={point.at} point={point} scales={scales} />
      ))}
      <path
        d={`M${inside.left} ${y(need)}H${inside.right}`}
        className="stroke-ink"
        strokeWidth="1.5"
      />
      <text x={inside.right} y={y(need) + 15} textAnchor="end" className="fill-ink">
        need {need.toFixed(1)}
      </text>
      {days.map(
        (point) =>
          point && (
            <text
              key={point.at}
              x={x(point.at)}
              y={inside.bottom + 18}
              textAnchor={point === points[0] && points.length > 1 ? 'start' : 'middle'}
              className="fill-faint"
            >
              {formatDay(point.at)}
            </text>
          ),
      )}
    </svg>
  )
}
