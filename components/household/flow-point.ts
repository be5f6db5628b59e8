/** A flow reading at 20 °C and full head, as the chart wants it; instants are epoch milliseconds. */
export type FlowPoint = {
  at: number
  litresPerHour: number
  errorLitresPerHour?: number
  afterWash?: boolean
  /** What to say of it in the table: `first reading`, `after a wash`. */
  note?: string
}

export type FlowForecast =
  | { kind: 'too few' }
  | { kind: 'holds' }
  | { kind: 'falls'; onAt: number; earliestAt: number; latestAt: number | null }
