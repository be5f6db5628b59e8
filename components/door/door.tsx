import type { ReactNode } from 'react'
import { Column } from '../kit/column'
import type { ColumnStage } from '../kit/stage'

const fullKit: readonly ColumnStage[] = [
  { position: 1, left: 0.8, state: 'good' },
  { position: 2, left: 0.6, state: 'good' },
  { position: 3, left: 0.9, state: 'good' },
]

/** The door of the desk: the line falls from the wordmark into a filter; beside it, the way in. */
export function Door({ children }: { children: ReactNode }) {
  return (
    <div className="min-h-dvh">
      <header className="relative border-b border-rule pt-4 pb-2.5 pl-[calc(var(--fall-x)-0.75rem)] md:pt-5">
        <p className="font-title text-xl font-semibold tracking-[-0.01em]">Rillpost</p>
        <span
          aria-hidden
          className="absolute -bottom-px left-fall -ml-px h-3 w-0.5 bg-water md:h-3.5"
        />
      </header>
      <main
        id="sheet"
        className="relative min-h-[calc(100dvh-4rem)] pr-edge pb-16 pl-lead md:pl-[22rem]"
      >
        <span
          aria-hidden
          className="absolute top-0 left-fall -ml-px h-12 w-0.5 bg-water max-md:h-full"
        />
        <div className="absolute top-12 left-[calc(var(--fall-x)-5.3125rem)] max-md:hidden">
          <Column
            size="large"
            stages={fullKit}
            level={0.7}
            description="A filter: a container on top, three stages below it, a vessel at the foot"
            className="h-[28.25rem] w-[10.625rem]"
          />
        </div>
        <div className="max-w-md pt-10 md:pt-20">{children}</div>
      </main>
    </div>
  )
}
