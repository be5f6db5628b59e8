import type { ReactNode } from 'react'

type EmptyStateProps = {
  /** What there is none of, said as good or plain news. */
  title: string
  children?: ReactNode
  /** The one thing to do about it. */
  action?: ReactNode
}

/** In place of a list with nothing in it. */
export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <div className="max-w-reading py-6">
      <p className="font-title text-lg font-semibold">{title}</p>
      {children && <div className="mt-1 text-faint">{children}</div>}
      {action && <div className="mt-4">{action}</div>}
    </div>
  )
}
