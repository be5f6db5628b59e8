/** A chance as staff read it: `5 in 10`, `1 in 20`, `1 in 50`. */
export function oddsInWords(chance: number): string {
  if (chance >= 0.95) return 'almost sure'
  if (chance >= 0.075) return `${Math.round(chance * 10)} in 10`
  return chance >= 0.035 ? '1 in 20' : '1 in 50'
}
