import type { RoundDay, Rounds } from '@/lib/schemas/rounds'

const widthEach = 64
const heightFull = 120
const roomAbove = 26
const roomBelow = 42
const barWidth = 30

/** The most that the strip shows: what goes out, or what the sender carries if that is near. */
function ceilingOf({ days, carriesADay }: Rounds): { top: number; lineShown: boolean } {
  const most = Math.max(1, ...days.map(({ texts }) => texts))
  const lineShown = carriesADay > 0 && carriesADay <= most * 2
  return { top: lineShown ? Math.max(most, carriesADay) : most, lineShown }
}

/**
 * Fourteen days side by side; a day's height is what goes out, the dashed line what the sender can carry.
 * The table beneath says the same, so the drawing is not read out.
 */
export function RoundStrip({ rounds }: { rounds: Rounds }) {
  const { top, lineShown } = ceilingOf(rounds)
  const width = rounds.days.length * widthEach
  const y = (texts: number) => roomAbove + heightFull - (texts / top) * heightFull
  return (
    <div
      role="region"
      aria-label="Fourteen days, drawn"
      tabIndex={0}
      className="max-w-full overflow-x-auto"
    >
      <svg
        aria-hidden
        width={width}
        height={roomAbove + heightFull + roomBelow}
        className="block min-w-[56rem]"
      >
        {rounds.days.map((day, index) => (
          <DayBar key={day.on} day={day} x={index * widthEach} y={y(day.texts)} />
        ))}
        <line
          x1="0"
          x2={width}
          y1={roomAbove + heightFull}
          y2={roomAbove + heightFull}
          className="stroke-ink"
          strokeWidth="1.5"
        />
        {lineShown && (
          <line
            x1="0"
            x2={width}
            y1={y(rounds.carriesADay)}
            y2={y(rounds.carriesADay)}
            className="stroke-clay"
            strokeWidth="2"
            strokeDasharray="7 5"
          />
        )}
      </svg>
      <p className="mt-1 text-sm text-faint">
        {rounds.carriesADay > 0 &&
          (lineShown
            ? `The dashed line: the sender can carry ${rounds.carriesADay} texts a day.`
            : `The sender can carry ${rounds.carriesADay} texts a day, far above this strip.`)}
      </p>
    </div>
  )
}

function DayBar({ day, x, y }: { day: RoundDay; x: number; y: number }) {
  const middle = x + widthEach / 2
  const foot = roomAbove + heightFull
  return (
    <g>
      <rect
        x={middle - barWidth / 2}
        y={y}
        width={barWidth}
        height={Math.max(0, foot - y)}
        className="fill-water"
      />
      {day.texts > 0 && (
        <text
          x={middle}
          y={y - 7}
          textAnchor="middle"
          className="fill-ink font-mono text-sm font-medium"
        >
          {day.texts}
        </text>
      )}
      <text x={middle} y={foot + 18} textAnchor="middle" className="fill-ink text-sm">
        {day.weekday}
      </text>
      <text x={middle} y={foot + 35} textAnchor="middle" className="fill-faint text-xs">
        {day.off ? 'no texts' : day.short}
      </text>
    </g>
  )
}
