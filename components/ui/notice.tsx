import type { ReactNode } from 'react'

type NoticeTone = 'plain' | 'good' | 'due' | 'danger'

type NoticeProps = {
  tone?: NoticeTone
  /** The word that carries the tone, so that the colour need not. */
  title?: ReactNode
  children?: ReactNode
  /** Spoken when it appears: for what a person has just done. */
  live?: boolean
  className?: string
}

const edges: Record<NoticeTone, string> = {
  plain: 'border-l-2 border-ink',
  good: 'border-l-4 border-slate',
  due: 'border-l-4 border-double border-straw',
  danger: 'border-l-4 border-clay',
}

/** A few words set apart by a bar at their left. */
export function Notice({ tone = 'plain', title, children, live, className = '' }: NoticeProps) {
  const role = live ? (tone === 'danger' ? 'alert' : 'status') : undefined
  return (
    <div
      role={role}
      className={`max-w-reading bg-sheet py-2 pr-4 pl-3.5 ${edges[tone]} ${className}`}
    >
      {title && <p className={`font-semibold ${tone === 'danger' ? 'text-clay' : ''}`}>{title}</p>}
      {children}
    </div>
  )
}
