import type { ReplyKind } from './reply-kind'
import { isOfRules } from './reply-traits'

/** A text whose meaning a person gave. */
export type Example = {
  traits: readonly string[]
  kind: ReplyKind
  /** The word lists were written with this text in view: what they make of it proves nothing. */
  isKnown: boolean
}

/** Weights of each trait for each kind; `weights` has a row of `kinds.length` for each trait. */
export type Learned = { kinds: ReplyKind[]; traits: string[]; weights: Float32Array }

/** Times that each example is shown. */
const rounds = 10
/** How far an example moves a weight the first time, and how much of a weight each step takes back. */
const rate = 0.3
const decay = 3e-4
/** A trait of fewer texts is chance. */
const leastTexts = 3

/** Steps of a linear congruential generator: the same examples give the same weights. */
function shuffler(): (places: number[]) => void {
  let state = 7
  return (places) => {
    for (let at = places.length - 1; at > 0; at--) {
      state = (state * 1103515245 + 12345) % 2147483648
      const other = Math.floor((state / 2147483648) * (at + 1))
      const held = places[at] as number
      places[at] = places[other] as number
      places[other] = held
    }
  }
}

/** Chances of each kind for a text with these traits (by their places): a softmax of summed weights. */
export function chancesFrom(
  places: readonly number[],
  {
    weights,
    kinds,
    scale = 1,
  }: { weights: ArrayLike<number>; kinds: readonly unknown[]; scale?: number },
): Float64Array {
  const sums = new Float64Array(kinds.length)
  const share = scale / Math.sqrt(Math.max(1, places.length))
  for (const place of places) {
    const row = place * kinds.length
    for (let kind = 0; kind < kinds.length; kind++) {
      sums[kind] = (sums[kind] as number) + (weights[row + kind] as number) * share
    }
  }
  const most = Math.max(...sums)
  const raised = sums.map((sum) => Math.exp(sum - most))
  const total = raised.reduce((sum, one) => sum + one, 0)
  return raised.map((one) => one / total)
}

function countTraits(examples: readonly Example[]): string[] {
  const counts = new Map<string, number>()
  for (const { traits } of examples) {
    for (const trait of traits) counts.set(trait, (counts.get(trait) ?? 0) + 1)
  }
  return [...counts].filter(([, texts]) => texts >= leastTexts).map(([trait]) => trait)
}

/**
 * Multinomial logistic regression by stochastic gradient descent with per-weight rates (AdaGrad; Duchi, Hazan,
 * Singer 2011). What the rules made of a text is shown only every other time: else the readings of the lists would
 * be learned by heart, and two readers would be one.
 */
export function learn(examples: readonly Example[]): Learned {
  const seen = examples.map(({ traits, isKnown }) =>
    isKnown ? traits.filter((trait) => !isOfRules(trait)) : traits,
  )
  const kinds = [...new Set(examples.map(({ kind }) => kind))].sort()
  const traits = countTraits(examples.map((one, at) => ({ ...one, traits: seen[at] ?? [] })))
  const placeOf = new Map(traits.map((trait, at) => [trait, at]))
  const places = seen.map((own) =>
    own.map((trait) => placeOf.get(trait) ?? -1).filter((at) => at >= 0),
  )
  const weights = new Float32Array(traits.length * kinds.length)
  const squares = new Float32Array(weights.length).fill(1e-6)
  const order = examples.map((_, at) => at)
  const shuffle = shuffler()
  for (let round = 0; round < rounds; round++) {
    shuffle(order)
    for (const at of order) {
      const own = (places[at] ?? []).filter(
        (place) => !isOfRules(traits[place] ?? '') || (at + round) % 2 === 0,
      )
      const right = kinds.indexOf((examples[at] as Example).kind)
      step({ own, right, kinds, weights, squares })
    }
  }
  return { kinds, traits, weights }
}

/** Moves the weights of one example's traits towards its kind; `own` are the places of its traits. */
function step({
  own,
  right,
  kinds,
  weights,
  squares,
}: {
  own: readonly number[]
  right: number
  kinds: readonly ReplyKind[]
  weights: Float32Array
  squares: Float32Array
}): void {
  const chances = chancesFrom(own, { weights, kinds })
  const share = 1 / Math.sqrt(Math.max(1, own.length))
  for (let kind = 0; kind < kinds.length; kind++) {
    const slope = ((chances[kind] as number) - (kind === right ? 1 : 0)) * share
    // What is as good as right already costs most of the time and moves nothing.
    if (Math.abs(slope) < 1e-3) continue
    for (const place of own) {
      const at = place * kinds.length + kind
      const pull = slope + decay * (weights[at] as number)
      const square = (squares[at] as number) + pull * pull
      squares[at] = square
      weights[at] = (weights[at] as number) - (rate * pull) / Math.sqrt(square)
    }
  }
}
