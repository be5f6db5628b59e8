import type { DueKind } from './round'

const stageNames: Record<number, string> = { 1: 'cloth', 2: 'carbon', 3: 'fibre' }

/** What a prompt is about, as staff read it: `wash`, `change of cloth and carbon`. */
export function dueWords({
  kind,
  positions,
}: {
  kind: DueKind
  positions: readonly number[]
}): string {
  if (kind !== 'change' || positions.length === 0) return kind
  const names = [...positions]
    .sort((one, other) => one - other)
    .map((position) => stageNames[position] ?? `stage ${position}`)
  return `change of ${joined(names)}`
}

/** Several things of one text, each once: `wash, change of cloth`. */
export function listWords(things: readonly string[]): string {
  return [...new Set(things)].join(', ')
}

/** `cloth, carbon and fibre`. */
export function joined(names: readonly string[]): string {
  const last = names.at(-1) ?? ''
  return names.length < 2 ? last : `${names.slice(0, -1).join(', ')} and ${last}`
}
