import { Gauge } from './gauge'
import { share, type ColumnStage, type DrawingProps, type StageBox } from './stage'
import { StagePatterns, textureId } from './stage-patterns'

const boxes: Record<ColumnStage['position'], StageBox> = {
  1: { x: 52, y: 136, width: 66, height: 34 },
  2: { x: 56, y: 176, width: 58, height: 72 },
  3: { x: 56, y: 254, width: 58, height: 96 },
}

function Notches({ box, count }: { box: StageBox; count: number }) {
  const edge = box.x + box.width + 1
  return Array.from({ length: count }, (_, index) => (
    <path key={index} d={`M${edge} ${box.y + 8 + index * 7}h7`} strokeWidth="2" />
  ))
}

function LargeStage({ stage, idPrefix }: { stage: ColumnStage; idPrefix: string }) {
  const box = boxes[stage.position]
  const lit = stage.suspect === 'likely' || stage.suspect === 'possible'
  const middle = box.y + box.height / 2
  return (
    <>
      <rect {...box} className="fill-sheet" stroke="none" />
      <rect
        {...box}
        fill={`url(#${textureId(idPrefix, stage.position)})`}
        className={lit ? 'stroke-clay' : ''}
        strokeWidth={lit ? 2.8 : 2}
        strokeDasharray={stage.suspect === 'possible' ? '7 4' : undefined}
      />
      <Notches box={box} count={stage.position} />
      <Gauge box={{ ...box, x: 30, width: 8 }} stage={stage} idPrefix={idPrefix} />
      {stage.state === 'out' && (
        <path
          d={`M${box.x - 9} ${middle}h${box.width + 18}`}
          className="stroke-clay"
          strokeWidth="6"
        />
      )}
    </>
  )
}

function Container() {
  return (
    <>
      <path d="M85 0v44" className="stroke-water" strokeWidth="2" />
      <path d="M42 52h86l-8 54H50Z" className="fill-water" fillOpacity="0.2" stroke="none" />
      <path d="M43 56q10-4 21 0t21 0 21 0 21 0" className="stroke-water" strokeWidth="1.6" />
      <path d="M38 30h94l-11 78H49Z" strokeWidth="2" />
      <path d="M79 108v14h12v-14" strokeWidth="2" />
      <path d="M85 96v30" className="stroke-water" strokeWidth="1.6" />
      <path d="M58 128q0-6 6-6h42q6 0 6 6v8H58Z" className="fill-sheet" strokeWidth="2" />
    </>
  )
}

function Vessel({ level }: { level: number | null }) {
  const flows = level !== null && level > 0
  const water = 50 * share(level ?? 0)
  const top = 443 - water
  return (
    <>
      <path d="M60 248v6M110 248v6" strokeWidth="2" />
      <path d="M58 350h54v8q0 6-6 6H64q-6 0-6-6Z" className="fill-sheet" strokeWidth="2" />
      <path
        d="M85 364v26"
        className="stroke-water"
        strokeWidth="2"
        strokeDasharray={flows && share(level) > 0.6 ? undefined : '3 5'}
      />
      <path d="M46 392h78v46q0 6-6 6H52q-6 0-6-6Z" className="fill-sheet" stroke="none" />
      {flows && (
        <path
          d={`M47 ${top}h76V${Math.max(top, 438)}q0 5-5 5H52q-5 0-5-5Z`}
          className="fill-water"
          fillOpacity="0.75"
          stroke="none"
        />
      )}
      <path
        d="M46 392h78v46q0 6-6 6H52q-6 0-6-6Z"
        strokeWidth="2"
        strokeDasharray={level === null ? '5 4' : undefined}
      />
      <path d="M40 402h6M40 412h6M40 422h6M40 432h6" strokeWidth="1.2" />
    </>
  )
}

export function LargeColumn({ idPrefix, stages, level }: DrawingProps) {
  return (
    <>
      <StagePatterns idPrefix={idPrefix} />
      <Container />
      {stages.map((stage) => (
        <LargeStage key={stage.position} stage={stage} idPrefix={idPrefix} />
      ))}
      <Vessel level={level} />
    </>
  )
}
