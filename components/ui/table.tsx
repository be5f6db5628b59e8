import type { ComponentProps, ReactNode } from 'react'

type TableProps = {
  /** Names the table; shown unless `hideCaption`. */
  caption: string
  hideCaption?: boolean
  children: ReactNode
}

/** A table that scrolls sideways by itself where the window is narrow. */
export function Table({ caption, hideCaption, children }: TableProps) {
  return (
    <section aria-label={caption} tabIndex={0} className="relative max-w-full overflow-x-auto">
      <table className="w-full border-collapse text-left text-sm">
        <caption className={hideCaption ? 'sr-only' : 'pb-1 text-left font-semibold'}>
          {caption}
        </caption>
        {children}
      </table>
    </section>
  )
}

/** A column's name. */
export function Th({ className = '', ...rest }: ComponentProps<'th'>) {
  return (
    <th
      scope="col"
      {...rest}
      className={`border-b-[1.5px] border-ink px-3 py-2 align-bottom font-semibold ${className}`}
    />
  )
}

/** The cell that names its row. */
export function RowTh({ className = '', ...rest }: ComponentProps<'th'>) {
  return (
    <th
      scope="row"
      {...rest}
      className={`border-b border-rule px-3 py-2.5 align-top font-semibold ${className}`}
    />
  )
}

/** A cell; `number` sets figures in mono at the right. */
export function Td({
  className = '',
  number,
  ...rest
}: ComponentProps<'td'> & { number?: boolean }) {
  const set = number ? 'text-right font-mono' : ''
  return (
    <td {...rest} className={`border-b border-rule px-3 py-2.5 align-top ${set} ${className}`} />
  )
}
