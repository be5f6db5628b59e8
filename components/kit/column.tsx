import { useId } from 'react'
import { LargeColumn } from './column-large'
import { SmallColumn } from './column-small'
import type { ColumnStage } from './stage'

type ColumnProps = {
  size: 'small' | 'large'
  /** From the top down; positions left out are not drawn. */
  stages: readonly ColumnStage[]
  /** The last flow against the need, 0..1; null when there is no reading. */
  level: number | null
  /** The same in words, for who cannot see it. */
  description: string
  /** Its width and height, when not 24 × 56 px (small) or 170 × 452 px (large). */
  className?: string
}

const boxes = { small: { width: 24, height: 56 }, large: { width: 170, height: 452 } }

/** A kit: container on top, its stages below, vessel at the foot. One drawing in two sizes. */
export function Column({ size, stages, level, description, className = '' }: ColumnProps) {
  const { width, height } = boxes[size]
  // Several columns share a page, and a pattern is found by its id: each needs its own.
  const idPrefix = useId()
  const Drawing = size === 'small' ? SmallColumn : LargeColumn
  return (
    <svg
      role="img"
      aria-label={description}
      width={width}
      height={height}
      viewBox={`0 0 ${width} ${height}`}
      fill="none"
      strokeLinejoin="round"
      className={`shrink-0 stroke-ink ${className}`}
    >
      <Drawing idPrefix={idPrefix} stages={stages} level={level} />
    </svg>
  )
}
