/** Two-sided 95 %: the quantile every interval of the desk is taken at. */
export const upperTail95 = 0.975

/* Wichura 1988, algorithm AS 241 (PPND16): rational approximations, lowest power first. */
const centre = {
  over: [
    3.3871328727963666, 1.3314166789178438e2, 1.9715909503065514e3, 1.3731693765509461e4,
    4.5921953931549871e4, 6.7265770927008701e4, 3.3430575583588128e4, 2.5090809287301227e3,
  ],
  under: [
    1, 4.2313330701600911e1, 6.871870074920579e2, 5.3941960214247511e3, 2.1213794301586596e4,
    3.9307895800092711e4, 2.8729085735721943e4, 5.2264952788528545e3,
  ],
}
const shoulder = {
  over: [
    1.42343711074968358, 4.63033784615654529, 5.7694972214606914, 3.64784832476320461,
    1.27045825245236838, 2.41780725177450612e-1, 2.27238449892691845e-2, 7.7454501427834141e-4,
  ],
  under: [
    1, 2.05319162663775882, 1.6763848301838038, 6.897673349851e-1, 1.4810397642748007e-1,
    1.51986665636164572e-2, 5.475938084995345e-4, 1.05075007164441684e-9,
  ],
}
const tail = {
  over: [
    6.6579046435011038, 5.4637849111641144, 1.7848265399172913, 2.9656057182850489e-1,
    2.6532189526576123e-2, 1.2426609473880784e-3, 2.71155556874348758e-5, 2.01033439929228813e-7,
  ],
  under: [
    1, 5.9983220655588794e-1, 1.3692988092273581e-1, 1.48753612908506149e-2, 7.868691311456133e-4,
    1.8463183175100547e-5, 1.4215117583164459e-7, 2.04426310338993979e-15,
  ],
}

type Rational = { over: readonly number[]; under: readonly number[] }

function valueOf({ over, under }: Rational, at: number): number {
  const polynomial = (terms: readonly number[]) => terms.reduceRight((sum, term) => sum * at + term)
  return polynomial(over) / polynomial(under)
}

/** The standard normal quantile of `chance` (0 to 1, ends excluded), to about 16 digits. */
export function normalQuantile(chance: number): number {
  if (!(chance > 0 && chance < 1)) throw new RangeError('a chance lies between 0 and 1')
  const offset = chance - 0.5
  if (Math.abs(offset) <= 0.425) return offset * valueOf(centre, 0.180625 - offset * offset)
  const depth = Math.sqrt(-Math.log(Math.min(chance, 1 - chance)))
  const size = depth <= 5 ? valueOf(shoulder, depth - 1.6) : valueOf(tail, depth - 5)
  return Math.sign(offset) * size
}

/**
 * Chance that Student's t lies within ±`t`, for whole degrees of freedom: the finite series of
 * Abramowitz and Stegun 26.7.3 and 26.7.4.
 */
function withinChance(t: number, freedom: number): number {
  const angle = Math.atan(t / Math.sqrt(freedom))
  const square = Math.cos(angle) ** 2
  const odd = freedom % 2 === 1
  let term = odd ? Math.cos(angle) : 1
  let sum = freedom === 1 ? 0 : term
  for (let k = odd ? 3 : 2; k <= freedom - 2; k += 2) {
    term *= ((k - 1) / k) * square
    sum += term
  }
  return odd ? (2 / Math.PI) * (angle + Math.sin(angle) * sum) : Math.sin(angle) * sum
}

/** Student's t quantile of `chance` (above one half) for whole degrees of freedom of at least 1. */
export function studentQuantile(chance: number, freedom: number): number {
  if (!(chance > 0.5 && chance < 1)) throw new RangeError('a chance lies between one half and 1')
  if (!(Number.isInteger(freedom) && freedom >= 1)) throw new RangeError('no freedom, no quantile')
  const within = 2 * chance - 1
  let low = 0
  let high = 1
  while (withinChance(high, freedom) < within) high *= 2
  for (let step = 0; step < 80; step += 1) {
    const middle = (low + high) / 2
    if (withinChance(middle, freedom) < within) low = middle
    else high = middle
  }
  return (low + high) / 2
}
