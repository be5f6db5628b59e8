import type { ReactNode } from 'react'
import { Bead, type BeadState } from '../ui/bead'
import { FallDashes } from './fall-line'

type LineRowProps = {
  /** How long, or when: set in mono left of the line; on a phone above the content. */
  time: ReactNode
  /** A second, lighter line under the time. */
  since?: ReactNode
  bead: BeadState
  tone?: 'water' | 'clay'
  beadLabel?: string
  /** Someone is waited for: the line is broken below the bead. */
  waiting?: boolean
  /** A hairline above it: for every row of a list but the first. */
  ruled?: boolean
  /** Closer to its neighbours: for rows of a line or two. */
  tight?: boolean
  className?: string
  children: ReactNode
}

/** One thing hung on the fall line: its time at the left, its bead on the line, the rest right. */
export function LineRow({ time, since, waiting, ruled, className = '', ...rest }: LineRowProps) {
  const room = `${rest.tight ? 'py-2' : 'py-3.5'} ${since ? 'md:min-h-14' : ''}`
  return (
    <div className={`relative pl-lead ${room} ${className}`}>
      {waiting && <FallDashes />}
      {ruled && (
        <span aria-hidden className="absolute top-0 right-0 left-lead border-t border-rule" />
      )}
      <Bead
        state={rest.bead}
        tone={rest.tone}
        label={rest.beadLabel}
        className={`absolute left-fall -ml-2 ${rest.tight ? 'top-3' : 'top-[1.125rem]'}`}
      />
      <p className="font-mono text-sm font-medium md:absolute md:left-0 md:w-[calc(var(--fall-x)-1.75rem)] md:pt-0.5 md:pl-1 md:text-right">
        {time}
        {since && (
          <span className="font-sans text-xs font-normal text-faint max-md:ml-2 md:block">
            {since}
          </span>
        )}
      </p>
      {rest.children}
    </div>
  )
}

type BandProps = { name: string; note?: ReactNode; id?: string; children: ReactNode }

/** A stretch of the line under one name, with its count. */
export function Band({ name, note, id, children }: BandProps) {
  return (
    <section aria-label={name} id={id} className="mt-7 first:mt-6">
      <h2 className="flex items-baseline gap-3 pl-lead font-title text-lg font-semibold">
        {name}
        {note && <span className="font-sans text-sm font-normal text-faint">{note}</span>}
      </h2>
      {children}
    </section>
  )
}
