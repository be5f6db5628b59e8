import Link from 'next/link'
import type { WordingMatrixCell } from '@/lib/schemas/wording'
import { PartBoxes } from '../ui/part-boxes'

type MatrixCellProps = {
  cell: WordingMatrixCell
  row: { moment: string; name: string }
  languageName: string
}

/** One moment in one language: its parts, its edition, and what is not as it should be. */
export function MatrixCell({ cell, row, languageName }: MatrixCellProps) {
  const { language, parts, edition, draft } = cell
  return (
    <Link
      href={`/wording/${row.moment}/${language}`}
      className="block min-w-0 grow px-3 py-2.5 no-underline -outline-offset-3 hover:bg-ink/6 max-md:-mx-1 max-md:px-1 max-md:py-1.5 pointer-coarse:min-h-11"
    >
      <span className="sr-only">
        {row.name}, {languageName}:{' '}
      </span>
      <span aria-hidden lang={language} className="block text-xs text-faint md:hidden">
        {languageName}
      </span>
      <PartBoxes parts={parts} />
      {edition !== null && (
        <span className="whitespace-nowrap">
          edition {edition}
          {cell.lags && <strong className="font-semibold text-clay"> lags</strong>}
        </span>
      )}
      {edition === null && !draft && <strong className="font-semibold text-clay">none</strong>}
      {draft && (
        <span className={edition === null ? '' : 'block pt-0.5'}>
          {draft.state === 'approved' ? (
            'waits for a second yes'
          ) : (
            <em className="text-faint">
              draft{draft.writtenBy && `, ${shortName(draft.writtenBy)}`}
            </em>
          )}
        </span>
      )}
    </Link>
  )
}

/** `T. Ibarra` for `Tomas Ibarra`; a single name stays whole. */
function shortName(name: string): string {
  const [first = '', ...rest] = name.trim().split(/\s+/)
  const last = rest.at(-1)
  return last ? `${String.fromCodePoint(first.codePointAt(0) ?? 0)}. ${last}` : first
}
