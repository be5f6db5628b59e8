export type Danger = {
  kind: 'unwell' | 'broken' | 'odd-water'
  sure: number
  dangerSign?: boolean
}
