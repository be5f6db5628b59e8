/** The few functions of jstat, which ships no types, that the checks hold ours against. */
declare module 'jstat' {
  type Distribution = { cdf(...at: number[]): number; inv(...at: number[]): number }
  export const jStat: { normal: Distribution; studentt: Distribution }
}
