import type { ReactNode } from 'react'
import type { Language } from '@/lib/domain/language'

type WordingSlipProps = { language: Language; children: ReactNode; faint?: boolean }

/** What a text says, on the ruled paper of the slips. */
export function WordingSlip({ language, children, faint }: WordingSlipProps) {
  return (
    <div
      className={`border border-l-[3px] border-rule bg-sheet px-3 py-2 ${
        faint ? 'border-l-rule' : 'border-l-water'
      }`}
    >
      <p
        lang={language}
        className="min-h-6 ruled font-mono text-[0.9375rem] leading-6! break-words whitespace-pre-line"
      >
        {children}
      </p>
    </div>
  )
}
