import type { ReactNode } from 'react'

type MarginBlockProps = { title: string; children: ReactNode }

/** One thing known, in a sheet's margin: a name and what is to say. */
export function MarginBlock({ title, children }: MarginBlockProps) {
  return (
    <section className="mt-4.5 border-t border-rule pt-3 first:mt-0 first:border-0 first:pt-0">
      <h2 className="mb-1 text-sm font-semibold">{title}</h2>
      {children}
    </section>
  )
}

/** The one number of a margin, with what it counts under it. */
export function MarginFigure({ figure, children }: { figure: ReactNode; children: ReactNode }) {
  return (
    <div className="mb-4.5">
      <p className="font-title text-4xl font-semibold">{figure}</p>
      <p className="mt-1">{children}</p>
    </div>
  )
}
