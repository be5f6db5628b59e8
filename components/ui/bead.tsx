export type BeadState = 'ring' | 'half' | 'full' | 'broken'

type BeadProps = {
  state: BeadState
  tone?: 'water' | 'clay'
  /** What the shape means here, for who cannot see it. Left out when the words stand beside it. */
  label?: string
  className?: string
}

const center = 8
const radius = 6

/** A bead on the fall line: ring = planned, half = on its way, full = done, broken = failed. */
export function Bead({ state, tone = 'water', label, className = '' }: BeadProps) {
  const named = label ? { role: 'img', 'aria-label': label } : { 'aria-hidden': true }
  return (
    <svg
      {...named}
      width="16"
      height="16"
      viewBox="0 0 16 16"
      className={`shrink-0 overflow-visible ${tone === 'clay' ? 'text-clay' : 'text-water'} ${className}`}
    >
      <circle
        cx={center}
        cy={center}
        r={radius}
        className={state === 'full' ? 'fill-current' : 'fill-paper'}
        stroke="currentColor"
        strokeWidth="2"
        strokeDasharray={state === 'broken' ? '3.6 2.7' : undefined}
      />
      {state === 'half' && <path d="M2 8a6 6 0 0 0 12 0Z" fill="currentColor" />}
    </svg>
  )
}
