/** Two-sided 95 %: the quantile every interval of the desk is taken at. */
export const upperTail95 = 0.975

/* Wichura 1988, algorithm AS 241 (PPND16): rational approximations, lowest power first. */
const centre = {
  over: [
    3.3871328727963665, 133.14166789178438, 1971.5909503065513, 13731.69376550946,
    45921.95393154987, 67265.7709270087, 33430.57558358813, 2509.0809287301227,
  ],
  under: [
    1, 42.31333070160091, 687.1870074920579, 5394.196021424751, 21213.794301586597,
    39307.89580009271, 28729.085735721943, 5226.495278852854,
  ],
}
const shoulder = {
  over: [
    1.4234371107496835, 4.630337846156546, 5.769497221460691, 3.6478483247632045,
    1.2704582524523684, 0.2417807251774506, 0.022723844989269184, 0.0007745450142783414,
  ],
  under: [
    1, 2.053191626637759, 1.6763848301838038, 0.6897673349851, 0.14810397642748008,
    0.015198666563616457, 0.0005475938084995345, 1.0507500716444169e-9,
  ],
}
const tail = {
  over: [
    6.657904643501104, 5.463784911164114, 1.7848265399172913, 0.29656057182850487,
    0.026532189526576124, 0.0012426609473880784, 0.000027115555687434876, 2.0103343992922881e-7,
  ],
  under: [
    1, 0.599832206555888, 0.1369298809227358, 0.014875361290850615, 0.0007868691311456133,
    0.000018463183175100548, 1.421511758316446e-7, 2.0442631033899397e-15,
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
