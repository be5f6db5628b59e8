'use client'

import type { ReactNode } from 'react'
import { Button } from '../ui/button'
import { Notice } from '../ui/notice'
import type { EntryState } from './use-entry'

type EntryFormProps = {
  entry: Pick<EntryState, 'onSubmit' | 'reason' | 'busy'>
  /** What the button does: `Enter the area`. */
  keep: string
  /** Beside the button: a way back. */
  beside?: ReactNode
  children: ReactNode
}

/** A plain form to enter something: its fields, what is wrong, one button. */
export function EntryForm({ entry, keep, beside, children }: EntryFormProps) {
  return (
    <form onSubmit={entry.onSubmit} noValidate className="grid max-w-2xl gap-8">
      {children}
      {entry.reason && (
        <Notice tone="danger" title={entry.reason} live>
          <p className="text-sm">Nothing was kept yet.</p>
        </Notice>
      )}
      <div className="flex flex-wrap items-center gap-4">
        <Button kind="main" type="submit" busy={entry.busy}>
          {entry.busy ? 'Keeping …' : keep}
        </Button>
        {beside}
      </div>
    </form>
  )
}

type EntryPartProps = { title: string; lead?: ReactNode; children: ReactNode }

/** Fields of one kind, under a name. */
export function EntryPart({ title, lead, children }: EntryPartProps) {
  return (
    <section aria-label={title} className="grid gap-5">
      <div className="border-b border-rule pb-1.5">
        <h2 className="font-title text-lg font-semibold">{title}</h2>
        {lead && <p className="text-sm text-faint">{lead}</p>}
      </div>
      {children}
    </section>
  )
}

/** Two fields beside each other where there is room. */
export function Pair({ children }: { children: ReactNode }) {
  return <div className="grid gap-5 sm:grid-cols-2">{children}</div>
}
