type PartBoxesProps = {
  /** How many parts a text costs. */
  parts: number
  /** Boxes drawn at least, filled or not. */
  room?: number
}

/** What a text costs, as filled boxes: one per part. */
export function PartBoxes({ parts, room = 2 }: PartBoxesProps) {
  const boxes = Math.max(room, parts)
  return (
    <svg
      role="img"
      aria-label={parts === 1 ? '1 part' : `${parts} parts`}
      width={boxes * 19 - 3}
      height="9"
      className="mr-2 inline-block shrink-0 stroke-ink"
    >
      {Array.from({ length: boxes }, (_, index) => (
        <rect
          key={index}
          x={index * 19 + 0.75}
          y="0.75"
          width="14.5"
          height="7.5"
          rx="1"
          strokeWidth="1.5"
          className={index < parts ? 'fill-ink' : 'fill-transparent'}
        />
      ))}
    </svg>
  )
}
