import { dayOffWords } from '@/lib/domain/holiday'
import type { RoundDay, Rounds } from '@/lib/schemas/rounds'

const heightFull = 120
const roomAbove = 26
const roomBelow = 42
const barWidth = 34

/** The most that the strip shows: what goes out, or what the sender carries if that is near. */
function ceilingOf({ days, carriesADay }: Rounds): { top: number; lineShown: boolean } {
  const most = Math.max(1, ...days.map(({ texts }) => texts))
  const lineShown = carriesADay > 0 && carriesADay <= most * 2
  return { top: lineShown ? Math.max(most, carriesADay) : most, lineShown }
}

/**
 * The days side by side; a day's height is what goes out, the dashed line what the sender can carry. The
 * table beneath says the same, so the drawing is not read out.
 */
export function RoundStrip({ rounds }: { rounds: Rounds }) {
  const { days, carriesADay } = rounds
  const { top, lineShown } = ceilingOf(rounds)
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
        width="100%"
        height={roomAbove + heightFull + roomBelow}
        className="block min-w-[44rem]"
      >
        {days.map((day, index) => (
          <svg key={day.on} x={`${((index + 0.5) / days.length) * 100}%`} overflow="visible">
            <DayBar day={day} y={y(day.texts)} />
          </svg>
        ))}
        <Across y={roomAbove + heightFull} className="stroke-ink" />
        {lineShown && <Across y={y(carriesADay)} className="stroke-clay" dashed />}
      </svg>
      {carriesADay > 0 && (
        <p className="mt-1 text-sm text-faint">
          {lineShown ? 'The dashed line: the' : 'The'} sender can carry{' '}
          {carriesADay.toLocaleString('en')} texts a day
          {lineShown ? '.' : ', far above this strip.'}
        </p>
      )}
      <DaysNamed days={days} />
    </div>
  )
}

/** Days off that are not just Sundays, each with its name: the strip has no room for one. */
function DaysNamed({ days }: { days: readonly RoundDay[] }) {
  const named = days.filter(({ daysOff }) => daysOff.some(({ why }) => why !== 'Sunday'))
  return named.map(({ on, long, daysOff }) => (
    <p key={on} className="mt-1 text-sm">
      {long}, no texts: {dayOffWords(daysOff)}.
    </p>
  ))
}

function Across({ y, className, dashed }: { y: number; className: string; dashed?: boolean }) {
  return (
    <line
      x1="0"
      x2="100%"
      y1={y}
      y2={y}
      className={className}
      strokeWidth="1.5"
      strokeDasharray={dashed ? '7 5' : undefined}
    />
  )
}

function DayBar({ day, y }: { day: RoundDay; y: number }) {
  const foot = roomAbove + heightFull
  return (
    <>
      <rect
        x={-barWidth / 2}
        y={y}
        width={barWidth}
        height={Math.max(0, foot - y)}
        className="fill-water"
      />
      {day.texts > 0 && (
        <text y={y - 7} textAnchor="middle" className="fill-ink font-mono text-sm font-medium">
          {day.texts}
        </text>
      )}
      <text y={foot + 18} textAnchor="middle" className="fill-ink text-sm">
        {day.weekday}
      </text>
      <text y={foot + 35} textAnchor="middle" className="fill-faint text-xs">
        {day.off ? 'no texts' : day.short}
      </text>
    </>
  )
}
