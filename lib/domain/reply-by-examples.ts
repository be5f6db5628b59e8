import learned from './reply-examples/learned.json'
import type { ReplyKind } from './reply-kind'
import { chancesFrom } from './reply-learning'

const kinds = learned.kinds as ReplyKind[]

let known: { placeOf: Map<string, number>; weights: Int8Array } | undefined

/** Unpacked on first use: most processes read no reply. */
function unpacked() {
  known ??= {
    placeOf: new Map(learned.traits.split('\n').map((trait, at) => [trait, at])),
    weights: Int8Array.from(atob(learned.weights), (letter) => (letter.charCodeAt(0) << 24) >> 24),
  }
  return known
}

/** What texts with these traits have meant, as chances from 0 to 1, the likeliest first. */
export function chancesOf(traits: readonly string[]): { kind: ReplyKind; chance: number }[] {
  const { placeOf, weights } = unpacked()
  const places = traits.map((trait) => placeOf.get(trait) ?? -1).filter((place) => place >= 0)
  const chances = chancesFrom(places, { weights, kinds, scale: learned.scale })
  return kinds
    .map((kind, at) => ({ kind, chance: chances[at] ?? 0 }))
    .sort((one, other) => other.chance - one.chance)
}
