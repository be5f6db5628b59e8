import type { Practice } from '@/lib/schemas/practice'

/** The practice time; where areas lie in several zones, in each. */
export function PracticeClocks({ practice }: { practice: Practice }) {
  const [first, ...others] = practice.clocks
  if (!first) return null
  return (
    <div>
      <p className="font-title text-3xl font-semibold tabular-nums">
        {first.hour}
        <span className="block text-lg">{first.day}</span>
      </p>
      <p className="mt-1 text-sm text-faint">
        by the clocks of the areas in {zoneWords(first.zone)}
      </p>
      {others.length > 0 && (
        <ul className="mt-3 text-sm">
          {others.map(({ zone, hour, day }) => (
            <li key={zone}>
              <span className="font-mono font-medium">{hour}</span> {day}{' '}
              <span className="text-faint">in {zoneWords(zone)}</span>
            </li>
          ))}
        </ul>
      )}
    </div>
  )
}

/** `America/Costa_Rica` as `Costa Rica time`. */
function zoneWords(zone: string): string {
  return `${(zone.split('/').at(-1) ?? zone).replaceAll('_', ' ')} time`
}
