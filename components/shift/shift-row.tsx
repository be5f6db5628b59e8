import Link from 'next/link'
import { languageNamesInEnglish } from '@/lib/domain/language'
import { LineRow } from '../frame/line-row'
import { Column } from '../kit/column'
import type { ShownRow } from './held-shift'

type ShiftRowProps = { row: ShownRow; ruled: boolean; isNew: boolean; onSeen: () => void }

/** One household's trouble in the shift; the whole row leads to its ticket. */
export function ShiftRowView({ row, ruled, isNew, onSeen }: ShiftRowProps) {
  const { column, words, language } = row
  const about = [row.house, row.area, languageNamesInEnglish[language], row.about]
  return (
    <LineRow
      time={row.waited}
      since={row.since}
      bead={row.bead}
      beadLabel={row.beadWords}
      tone={row.tone}
      ruled={ruled}
      waiting={row.waits}
      className={row.gone ? 'opacity-60' : 'focus-within:bg-sheet hover:bg-sheet'}
    >
      <div
        onPointerEnter={onSeen}
        onFocus={onSeen}
        className="grid grid-cols-[2.5rem_minmax(0,1fr)] gap-x-4 md:grid-cols-[2.5rem_minmax(0,1fr)_auto]"
      >
        <Column size="small" {...column} className="h-auto w-[2.125rem]" />
        <div>
          <p className="font-semibold">
            {isNew && <span className="mr-2 border border-ink px-1.5 text-xs">new</span>}
            <Link
              data-shift-row
              href={`/tickets/${row.ticketId}`}
              className="no-underline after:absolute after:inset-y-0 after:right-0 after:left-lead"
            >
              <span lang={row.sentenceLanguage}>{row.sentence}</span>
              <span className="sr-only"> {row.house}</span>
            </Link>
          </p>
          {words && (
            <p
              lang={language}
              className="mt-0.5 line-clamp-3 font-mono text-[0.9375rem] before:content-['“'] after:content-['”']"
            >
              {words}
            </p>
          )}
          <p className="mt-1 text-sm text-faint">{about.filter(Boolean).join(' · ')}</p>
        </div>
        <RowMarks row={row} />
      </div>
    </LineRow>
  )
}

function RowMarks({ row }: { row: ShownRow }) {
  const marks = row.gone ? [{ before: '', strong: 'no longer open', after: '' }] : row.marks
  return (
    <div className="text-sm text-faint max-md:col-start-2 md:max-w-56 md:text-right">
      {marks.map(({ before, strong, after }) => (
        <p key={`${before}${strong}`}>
          {before}
          <b className="font-semibold text-ink">{strong}</b>
          {after}
        </p>
      ))}
    </div>
  )
}
