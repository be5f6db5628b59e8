import type { WhatIfAnswer } from '@/lib/schemas/what-if'
import { RowTh, Table, Td, Th } from '../ui/table'

const rowHeight = 84
const roomAbove = 24
const roomBelow = 26
const gap = 0.2

type Weeks = WhatIfAnswer['byWeek']
type Which = 'today' | 'other'

const rowNames: Record<Which, string> = { today: 'Today’s cycles', other: 'These cycles' }

/** Texts week by week as two rows of bars to one measure; the table beneath says the same. */
export function WhatIfWeeks({ answer: { byWeek } }: { answer: WhatIfAnswer }) {
  const most = Math.max(1, ...byWeek.flatMap(({ today, other }) => [today.texts, other.texts]))
  return (
    <div className="mt-7">
      <h3 className="font-semibold">Texts, week by week</h3>
      <div
        role="region"
        aria-label="Weeks, drawn"
        tabIndex={0}
        className="mt-2 max-w-full overflow-x-auto px-4"
      >
        {(['today', 'other'] as const).map((which) => (
          <WeekRow key={which} which={which} weeks={byWeek} most={most} />
        ))}
      </div>
      <details className="mt-2" open={byWeek.length <= 13}>
        <summary className="inline-block py-2 text-sm font-semibold underline decoration-rule decoration-[1.5px] underline-offset-4">
          The weeks as a table
        </summary>
        <div className="max-w-3xl">
          <WeekTable weeks={byWeek} />
        </div>
      </details>
    </div>
  )
}

type WeekRowProps = { which: Which; weeks: Weeks; most: number }

function WeekRow({ which, weeks, most }: WeekRowProps) {
  const foot = roomAbove + rowHeight
  const percent = (share: number) => `${(share / weeks.length) * 100}%`
  // Where the weeks stand close, only some are named.
  const every = Math.ceil(weeks.length / 13)
  return (
    <div className="mt-3">
      <p className="text-sm">{rowNames[which]}</p>
      <svg
        aria-hidden
        width="100%"
        height={foot + roomBelow}
        className="block min-w-[44rem] overflow-visible"
      >
        {weeks.map((week, index) => {
          const height = (week[which].texts / most) * rowHeight
          return (
            <g key={index}>
              <rect
                x={percent(index + gap / 2)}
                width={percent(1 - gap)}
                y={foot - height}
                height={height}
                className={
                  which === 'today' ? 'fill-transparent stroke-water stroke-2' : 'fill-water'
                }
              />
              {index % every === 0 && (
                <svg x={percent(index + 0.5)} overflow="visible">
                  <text
                    y={foot - height - 7}
                    textAnchor="middle"
                    className="fill-ink font-mono text-xs font-medium"
                  >
                    {week[which].texts.toLocaleString('en')}
                  </text>
                  <text y={foot + 17} textAnchor="middle" className="fill-faint text-xs">
                    {week.from}
                  </text>
                </svg>
              )}
            </g>
          )
        })}
        <line x1="0" x2="100%" y1={foot} y2={foot} className="stroke-ink" strokeWidth="1.5" />
      </svg>
    </div>
  )
}

function WeekTable({ weeks }: { weeks: Weeks }) {
  return (
    <Table caption="Texts and parts by week" hideCaption>
      <thead>
        <tr>
          <Th>Week from</Th>
          <Th className="text-right">Texts, today’s</Th>
          <Th className="text-right">Texts, these</Th>
          <Th className="text-right">Parts, today’s</Th>
          <Th className="text-right">Parts, these</Th>
        </tr>
      </thead>
      <tbody>
        {weeks.map(({ from, today, other }, index) => (
          <tr key={index}>
            <RowTh className="font-normal whitespace-nowrap">{from}</RowTh>
            {[today.texts, other.texts, today.parts, other.parts].map((figure, column) => (
              <Td key={column} number className={figure === 0 ? 'text-faint' : ''}>
                {figure === 0 ? '–' : figure.toLocaleString('en')}
              </Td>
            ))}
          </tr>
        ))}
      </tbody>
    </Table>
  )
}
