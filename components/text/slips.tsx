import type { ReactNode } from 'react'

/** A conversation: `Slip`s and `SlipDay`s on a line of their own, oldest on top. */
export function Slips({ label, children }: { label: string; children: ReactNode }) {
  return (
    <div className="relative py-1.5">
      <span aria-hidden className="absolute -top-7 bottom-0 left-1/2 -ml-px w-0.5 bg-water" />
      <ol aria-label={label} className="relative">
        {children}
      </ol>
    </div>
  )
}

/** The day that the slips below it belong to, set across the line. */
export function SlipDay({ children }: { children: ReactNode }) {
  return (
    <li className="relative my-4 text-center text-sm text-faint">
      <span className="bg-paper px-3">{children}</span>
    </li>
  )
}
