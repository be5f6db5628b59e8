import type { ReactNode } from 'react'

type TicketSheetProps = {
  /** The sentence of harm. */
  title: ReactNode
  /** Whose ticket it is, and where they live. */
  place?: ReactNode
  /** Right of the title: how long it has waited, hand on. */
  actions?: ReactNode
  /** A `Cutaway`, into whose container the fall line pours. */
  column: ReactNode
  step: ReactNode
  slips: ReactNode
  margin: ReactNode
}

/**
 * One household's trouble: column, step with the slips below it, margin. On a narrow window what
 * to do comes first, then the cautions, then the drawing, then the slips.
 */
export function TicketSheet({ title, place, actions, column, ...parts }: TicketSheetProps) {
  return (
    <main
      id="sheet"
      tabIndex={-1}
      className="grid max-w-[80rem] grid-cols-1 gap-x-7 px-edge pt-6.5 pb-16 outline-none lg:grid-cols-[19.75rem_minmax(0,1fr)] xl:grid-cols-[19.75rem_minmax(0,1fr)_14.75rem]"
    >
      <div className="mb-5.5 flex flex-wrap items-baseline gap-x-5 gap-y-2 lg:col-start-2 xl:col-span-2">
        <h1 className="min-w-0 flex-1 basis-80 font-title text-2xl font-semibold tracking-[-0.01em] md:text-3xl">
          {title}
          {place && <span className="block text-lg font-semibold text-faint">{place}</span>}
        </h1>
        {actions && <div className="flex items-baseline gap-4">{actions}</div>}
      </div>
      <section aria-label="Step" className="min-w-0 lg:col-start-2">
        {parts.step}
      </section>
      <aside
        aria-label="What is known"
        className="mt-7 text-sm lg:col-start-2 xl:col-start-3 xl:row-span-2 xl:row-start-2 xl:mt-0"
      >
        {parts.margin}
      </aside>
      <section
        aria-label="The filter"
        className="max-lg:mt-8 lg:col-start-1 lg:row-span-4 lg:row-start-1"
      >
        <div className="relative lg:sticky lg:top-0">
          <span
            aria-hidden
            className="absolute bottom-full left-[calc(var(--fall-x)-var(--edge-x))] -ml-px h-7 w-0.5 bg-water max-lg:hidden"
          />
          <div className="lg:-ml-px">{column}</div>
        </div>
      </section>
      <section aria-label="Texts" className="mt-7 min-w-0 lg:col-start-2">
        {parts.slips}
      </section>
    </main>
  )
}
