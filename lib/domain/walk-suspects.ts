/** What may make a three-stage gravity kit run slow. */
export type SuspectId =
  | 'full-cloth'
  | 'fouled-fibre'
  | 'packed-carbon'
  | 'air-lock'
  | 'kinked-hose'
  | 'low-container'
  | 'cold-water'
  | 'misfitted-cap'
  | 'cracked-fibre'
  | 'spent-fibre'

export const suspectNames: Record<SuspectId, string> = {
  'full-cloth': 'Cloth stage full',
  'fouled-fibre': 'Fibre fouled',
  'packed-carbon': 'Carbon packed',
  'air-lock': 'Air in the line',
  'kinked-hose': 'Hose kinked',
  'low-container': 'Container low',
  'cold-water': 'Water cold',
  'misfitted-cap': 'Cap misfitted',
  'cracked-fibre': 'Fibre cracked',
  'spent-fibre': 'Fibre spent',
}

export const suspectIds = Object.keys(suspectNames) as readonly SuspectId[]

/** The stage a suspect sits in, counted from the container; 0 is no stage. */
export const suspectStage: Record<SuspectId, 0 | 1 | 2 | 3> = {
  'full-cloth': 1,
  'fouled-fibre': 3,
  'packed-carbon': 2,
  'air-lock': 0,
  'kinked-hose': 0,
  'low-container': 0,
  'cold-water': 0,
  'misfitted-cap': 0,
  'cracked-fibre': 3,
  'spent-fibre': 3,
}

/**
 * How a walk deals with each suspect: by a step that cures it, by the flow figure (cold is in it),
 * by changing the stage, or by the safety question.
 */
export const dealtWithBy: Record<SuspectId, 'cure' | 'figure' | 'change' | 'safety'> = {
  'full-cloth': 'cure',
  'fouled-fibre': 'cure',
  'packed-carbon': 'cure',
  'air-lock': 'cure',
  'kinked-hose': 'cure',
  'low-container': 'cure',
  'cold-water': 'figure',
  'misfitted-cap': 'cure',
  'cracked-fibre': 'safety',
  'spent-fibre': 'change',
}

/** Probability of each suspect; they sum to 1, since a walk looks for one fault. */
export type Odds = Record<SuspectId, number>

/** Factors on the odds; a suspect not named keeps its own. */
export type Evidence = Partial<Record<SuspectId, number>>

/** Where a walk starts from when no history is counted. Common practice, no source. */
export const defaultPriors: Record<'slow' | 'no flow', Odds> = {
  slow: {
    'fouled-fibre': 0.54,
    'full-cloth': 0.1,
    'spent-fibre': 0.08,
    'packed-carbon': 0.06,
    'air-lock': 0.05,
    'low-container': 0.05,
    'kinked-hose': 0.04,
    'cold-water': 0.04,
    'misfitted-cap': 0.02,
    'cracked-fibre': 0.02,
  },
  'no flow': {
    'air-lock': 0.26,
    'fouled-fibre': 0.2,
    'low-container': 0.14,
    'kinked-hose': 0.12,
    'full-cloth': 0.08,
    'spent-fibre': 0.06,
    'misfitted-cap': 0.06,
    'packed-carbon': 0.04,
    'cracked-fibre': 0.03,
    'cold-water': 0.01,
  },
}

export type Cue = 'dropped' | 'leak' | 'odd water' | 'after rain' | 'refitted' | 'cloth overdue'

/** What was told or is known before the first step. Common practice, no source. */
export const cueEvidence: Record<Cue, Evidence> = {
  dropped: { 'cracked-fibre': 12, 'misfitted-cap': 2 },
  leak: { 'misfitted-cap': 8, 'cracked-fibre': 8 },
  'odd water': { 'cracked-fibre': 8 },
  'after rain': { 'full-cloth': 3, 'fouled-fibre': 1.5 },
  refitted: { 'air-lock': 6, 'misfitted-cap': 4, 'kinked-hose': 2 },
  'cloth overdue': { 'full-cloth': 3 },
}

/**
 * What the water's temperature says of cold as the cause. Water at 10 °C runs 1.3 times slower than
 * at 20 °C by its viscosity alone; at 18 °C the difference is less than a reading's own error.
 */
export function coldEvidence(celsius: number): Evidence {
  if (celsius >= 18) return { 'cold-water': 0.02 }
  return celsius <= coldCelsius ? { 'cold-water': 4 } : {}
}

/** At or below it a whole filter runs so slowly that a household calls it slow. Common practice. */
export const coldCelsius = 10

/**
 * What the first timed litre says, by its normalised share of the first flow. Cold is in the figure
 * already: what is still missing at 20 °C is not the cold's doing. Common practice, no source.
 */
export function shareEvidence(share: number): Evidence {
  const notCold = { 'cold-water': 0.1 }
  if (share < 0.15) return { ...notCold, 'air-lock': 2.5, 'kinked-hose': 2, 'low-container': 2 }
  return notCold
}
