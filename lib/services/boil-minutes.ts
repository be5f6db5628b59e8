import { drinkAdvice } from '@/lib/domain/advice'

/** The table that texts boil by until a programme chooses another. */
export const boilTableId = 'boil-cdc'

/** Minutes to boil at an altitude, as the published table prints them. */
export function boilMinutes(altitudeMetres: number): number {
  const advice = drinkAdvice({ tableId: boilTableId, altitudeMetres, cloudy: false })
  if (!advice.ok || advice.drink.method !== 'boil') {
    throw new Error(`The boiling table ${boilTableId} does not say how long to boil.`)
  }
  return advice.drink.minutes
}
