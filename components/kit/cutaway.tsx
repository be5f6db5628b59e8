import type { ReactNode } from 'react'
import { Column } from './column'
import type { ColumnStage } from './stage'

export type CutawayLabel = {
  at: 'container' | 1 | 2 | 3 | 'vessel'
  title: string
  /** A suspect's odds as a word … */
  word?: 'likely' | 'possible' | 'unlikely' | undefined
  /** … and as a number, shown on hover and focus: `5 in 10`. */
  odds?: string | undefined
  note?: ReactNode
}

type CutawayProps = {
  stages: readonly ColumnStage[]
  level: number | null
  description: string
  labels: readonly CutawayLabel[]
  /** Said below: suspects that have no place in the drawing, what is ruled out. */
  also?: ReactNode
}

const places = ['container', 1, 2, 3, 'vessel'] as const

/** Where each label begins, level with its part of the drawing beside it. */
const slots: Record<CutawayLabel['at'], string> = {
  container: 'row-start-1 pt-13',
  1: 'row-start-2',
  2: 'row-start-3',
  3: 'row-start-4 pt-3.5',
  vessel: 'row-start-5',
}

const edges = {
  likely: 'border-clay',
  possible: 'border-dashed border-clay',
  unlikely: 'border-ink',
}

function Label({ label }: { label: CutawayLabel }) {
  const { at, title, word, odds, note } = label
  const isLit = word === 'likely' || word === 'possible'
  return (
    <div
      tabIndex={odds ? 0 : undefined}
      role={odds ? 'group' : undefined}
      aria-label={odds ? `${title}: ${word}, ${odds}` : undefined}
      className={`group border-l-2 pl-2.5 text-sm leading-snug ${word ? edges[word] : 'border-ink'}`}
    >
      <p className={`font-semibold ${isLit ? 'text-clay' : ''}`}>{title}</p>
      {word && (
        <p>
          {word}
          {odds && (
            <span className="sr-only group-hover:not-sr-only group-focus:not-sr-only pointer-coarse:not-sr-only">
              {' · '}
              {odds}
            </span>
          )}
        </p>
      )}
      {note && <div className={at === 'vessel' ? '' : 'text-faint'}>{note}</div>}
    </div>
  )
}

/**
 * The large column with its suspects named beside it. The rows keep the measures of the drawing
 * but may grow, so that larger or wider-spaced type never runs over its neighbour.
 */
export function Cutaway({ stages, level, description, labels, also }: CutawayProps) {
  return (
    <div>
      <div className="grid grid-cols-[10.625rem_minmax(0,1fr)] gap-x-3">
        <Column
          size="large"
          stages={stages}
          level={level}
          description={description}
          className="h-[28.25rem] w-[10.625rem]"
        />
        <div className="grid grid-rows-[minmax(8.625rem,auto)_minmax(4.125rem,auto)_minmax(4.25rem,auto)_minmax(7.5rem,auto)_auto]">
          {places.map((place) => {
            const here = labels.filter((label) => label.at === place)
            if (here.length === 0) return null
            return (
              <div key={place} className={`space-y-1.5 pb-1.5 ${slots[place]}`}>
                {here.map((label) => (
                  <Label key={label.title} label={label} />
                ))}
              </div>
            )
          })}
        </div>
      </div>
      {also && <div className="mt-4 text-sm text-faint">{also}</div>}
    </div>
  )
}
