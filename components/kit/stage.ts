export type ColumnStage = {
  position: 1 | 2 | 3
  /** Share of its cycle that is left, 0..1. */
  left: number
  state: 'good' | 'due' | 'overdue' | 'out'
  suspect?: 'likely' | 'possible' | 'unlikely'
}

export type DrawingProps = {
  idPrefix: string
  stages: readonly ColumnStage[]
  level: number | null
}

/** Where a stage stands in a drawing, in the units of its view box. */
export type StageBox = { x: number; y: number; width: number; height: number }

/** Holds a share within 0..1. */
export function share(value: number): number {
  return Math.min(1, Math.max(0, value))
}
