import { share, type ColumnStage, type DrawingProps, type StageBox } from './stage'

const boxes: Record<ColumnStage['position'], StageBox> = {
  1: { x: 6, y: 15, width: 12, height: 7 },
  2: { x: 7, y: 23, width: 10, height: 9 },
  3: { x: 7, y: 33, width: 10, height: 10 },
}

function Notches({ box, count }: { box: StageBox; count: number }) {
  const edge = box.x + box.width
  return Array.from({ length: count }, (_, index) => {
    const y = box.y + 2 + index * 2.2
    return <path key={index} d={`M${edge} ${y}h2.2`} strokeWidth="1" />
  })
}

function SmallStage({ stage, hatch }: { stage: ColumnStage; hatch: string }) {
  const box = boxes[stage.position]
  const lit = stage.suspect === 'likely' || stage.suspect === 'possible'
  const filled = stage.state === 'good' || stage.state === 'out'
  const room = box.height - 1.2
  const fill = room * share(stage.left)
  const middle = box.y + box.height / 2
  return (
    <>
      <rect
        {...box}
        className={`fill-sheet ${lit ? 'stroke-clay' : ''}`}
        strokeWidth={lit ? 1.8 : 1.1}
        strokeDasharray={stage.state === 'overdue' ? '2 1.4' : undefined}
      />
      {stage.state === 'due' && <rect {...box} fill={`url(#${hatch})`} stroke="none" />}
      {filled && (
        <rect
          x={box.x + 0.6}
          y={box.y + box.height - 0.6 - fill}
          width={box.width - 1.2}
          height={fill}
          className="fill-ink"
          fillOpacity="0.82"
          stroke="none"
        />
      )}
      <Notches box={box} count={stage.position} />
      {stage.state === 'out' && (
        <path
          d={`M${box.x - 2.5} ${middle}h${box.width + 5}`}
          className="stroke-clay"
          strokeWidth="2.2"
        />
      )}
    </>
  )
}

function Vessel({ level }: { level: number | null }) {
  const flows = level !== null && level > 0
  const water = 7.3 * share(level ?? 0)
  return (
    <>
      <path
        d="M12 43v2.6"
        className="stroke-water"
        strokeWidth="1.4"
        strokeDasharray={flows ? undefined : '1 1.2'}
      />
      <path
        d="M5 46h14v8.5H5Z"
        className="fill-sheet"
        strokeWidth="1.2"
        strokeDasharray={level === null ? '2 1.4' : undefined}
      />
      <rect
        x="5.6"
        y={53.9 - water}
        width="12.8"
        height={water}
        className="fill-water"
        stroke="none"
      />
    </>
  )
}

export function SmallColumn({ idPrefix, stages, level }: DrawingProps) {
  const hatch = `${idPrefix}-hatch`
  return (
    <>
      <defs>
        <pattern
          id={hatch}
          width="3"
          height="3"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <path d="M0.6 0v3" className="stroke-ink" strokeWidth="1.1" />
        </pattern>
      </defs>
      <path d="M4 1.5h16l-1.6 11.5H5.6Z" className="fill-sheet" strokeWidth="1.2" />
      <path
        d="M4.8 6.2h14.4l-.9 6.3H5.7Z"
        className="fill-water"
        fillOpacity="0.35"
        stroke="none"
      />
      {stages.map((stage) => (
        <SmallStage key={stage.position} stage={stage} hatch={hatch} />
      ))}
      <Vessel level={level} />
    </>
  )
}
