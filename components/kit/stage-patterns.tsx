import type { ColumnStage } from './stage'

const textures = { 1: 'weave', 2: 'grain', 3: 'fibre' } as const

export function textureId(idPrefix: string, position: ColumnStage['position']): string {
  return `${idPrefix}-${textures[position]}`
}

export function hatchId(idPrefix: string): string {
  return `${idPrefix}-hatch`
}

/** What the stages of the large column are filled with: cloth, carbon grains, hollow fibres. */
export function StagePatterns({ idPrefix }: { idPrefix: string }) {
  const inUserSpace = { patternUnits: 'userSpaceOnUse' as const }
  return (
    <defs>
      <pattern
        id={hatchId(idPrefix)}
        width="5"
        height="5"
        {...inUserSpace}
        patternTransform="rotate(45)"
      >
        <path d="M1 0v5" className="stroke-ink" strokeWidth="1.8" />
      </pattern>
      <pattern id={textureId(idPrefix, 1)} width="7" height="7" {...inUserSpace}>
        <path d="M0 3.5h7M3.5 0v7" className="stroke-ink" strokeWidth="1" strokeOpacity="0.55" />
      </pattern>
      <pattern id={textureId(idPrefix, 2)} width="9" height="9" {...inUserSpace}>
        <circle cx="2.2" cy="2.4" r="1.3" className="fill-ink" stroke="none" fillOpacity="0.7" />
        <circle cx="6.6" cy="6.4" r="1.6" className="fill-ink" stroke="none" fillOpacity="0.5" />
      </pattern>
      <pattern id={textureId(idPrefix, 3)} width="6" height="12" {...inUserSpace}>
        <path
          d="M1.5 0v12M3.6 0v12"
          className="stroke-ink"
          strokeWidth="0.8"
          strokeOpacity="0.65"
        />
      </pattern>
    </defs>
  )
}
