import { share, type ColumnStage, type StageBox } from './stage'
import { hatchId } from './stage-patterns'

type GaugeProps = { box: StageBox; stage: ColumnStage; idPrefix: string }

/** Beside a large stage, whose inside shows its kind: how much of its cycle is left. */
export function Gauge({ box, stage, idPrefix }: GaugeProps) {
  const filled = stage.state === 'good' || stage.state === 'out'
  const fill = box.height * share(stage.left)
  return (
    <>
      <rect
        {...box}
        className="fill-sheet"
        strokeWidth="1.2"
        strokeDasharray={stage.state === 'overdue' ? '4 3' : undefined}
      />
      {stage.state === 'due' && <rect {...box} fill={`url(#${hatchId(idPrefix)})`} stroke="none" />}
      {filled && (
        <rect
          x={box.x}
          y={box.y + box.height - fill}
          width={box.width}
          height={fill}
          className="fill-ink"
          stroke="none"
        />
      )}
    </>
  )
}
