import type { ReactNode } from 'react'
import { FallLine } from './fall-line'

type SheetProps = {
  title: ReactNode
  /** Said under the title in a lighter hand. */
  lead?: ReactNode
  children: ReactNode
  /** The right margin: definitions, what else is known. On a phone it follows the title. */
  margin?: ReactNode
}

function SheetTitle({ title, lead }: { title: ReactNode; lead?: ReactNode }) {
  return (
    <div className="pr-edge pl-lead">
      <h1 className="font-title text-2xl font-semibold tracking-[-0.01em] md:text-3xl">{title}</h1>
      {lead && <p className="mt-1 max-w-reading text-faint">{lead}</p>}
    </div>
  )
}

/**
 * The sheet of the shift and of lists: times left of the fall line, what hangs on it, a margin.
 * Children that are `LineRow`s or `Band`s hang on the line; others want `pl-lead`.
 */
export function LineSheet({ title, lead, children, margin }: SheetProps) {
  return (
    <main
      id="sheet"
      tabIndex={-1}
      className="relative grid min-h-[calc(100dvh-4.25rem)] max-w-[77.5rem] grid-cols-1 content-start pt-7 pb-16 outline-none lg:grid-cols-[minmax(0,1fr)_19rem] lg:grid-rows-[auto_1fr] lg:pr-edge"
    >
      <FallLine />
      <SheetTitle title={title} lead={lead} />
      {margin && (
        <aside className="mt-5 pr-edge pl-lead text-sm lg:col-start-2 lg:row-span-2 lg:row-start-1 lg:mt-0 lg:pr-0 lg:pl-9">
          {margin}
        </aside>
      )}
      <div className="min-w-0 max-lg:pr-edge lg:row-start-2">{children}</div>
    </main>
  )
}

/** A sheet to read or fill in: text, a form or a table beside the fall line. */
export function ReadingSheet({ title, lead, children, margin }: SheetProps) {
  return (
    <LineSheet title={title} lead={lead} margin={margin}>
      <div className="mt-6 pl-lead">{children}</div>
    </LineSheet>
  )
}

/** A sheet that takes the whole width, for a matrix or a wide table. */
export function WideSheet({ title, lead, children }: Omit<SheetProps, 'margin'>) {
  return (
    <main
      id="sheet"
      tabIndex={-1}
      className="relative min-h-[calc(100dvh-4.25rem)] max-w-[77.5rem] pt-7 pb-16 outline-none"
    >
      <FallLine />
      <SheetTitle title={title} lead={lead} />
      <div className="mt-4 pr-edge pl-lead">{children}</div>
    </main>
  )
}
