import { distance } from 'fastest-levenshtein'

/** Letters that share a key on a twelve-key phone. */
const keys = ['abc', 'def', 'ghi', 'jkl', 'mno', 'pqrs', 'tuv', 'wxyz']
const keyOf = new Map(
  keys.flatMap((letters, key) => letters.split('').map((letter) => [letter, key])),
)

/**
 * How far a written word may stand from the word it is taken for. Short words are never guessed:
 * at three letters every slip is another word.
 */
export function allowedSlips(length: number): number {
  if (length < 4) return 0
  return length < 8 ? 1 : 2
}

/** Rows of the other common keyboard, on which a finger lands beside the letter it meant. */
const rows = ['qwertyuiop', 'asdfghjkl', 'zxcvbnm']

/** Letters taken for each other because they sound alike, or because nobody is sure of the vowel. */
const alike = ['aeiouy', 'szc', 'bvp', 'gj', 'mn', 'ckq', 'td', 'fv', 'rl']

/**
 * A letter put for another in a short word is believed only where a finger or an ear explains it:
 * "slpw" is "slow", but "shop" is not "stop" and "state" is not "stage".
 */
export function isLikelySlip(written: string, meant: string): boolean {
  if (written.length !== meant.length) return true
  for (let at = 0; at < written.length; at += 1) {
    const [one = '', other = ''] = [written[at], meant[at]]
    if (one === other) continue
    if (written[at + 1] === meant[at] && written[at] === meant[at + 1]) return true
    return shareKey(one, other) || areNeighbours(one, other) || soundAlike(one, other)
  }
  return true
}

function areNeighbours(one: string, other: string): boolean {
  return rows.some((row) => {
    const [left, right] = [row.indexOf(one), row.indexOf(other)]
    return left >= 0 && right >= 0 && Math.abs(left - right) === 1
  })
}

function soundAlike(one: string, other: string): boolean {
  return alike.some((letters) => letters.includes(one) && letters.includes(other))
}

/** Edit distance in which two letters changed about and a slip on the same key count once. */
export function slipsBetween(written: string, meant: string): number {
  const plain = distance(written, meant)
  if (plain <= 1) return plain
  if (plain === 2 && isSwap(written, meant)) return 1
  return plain
}

function isSwap(written: string, meant: string): boolean {
  if (written.length !== meant.length) return false
  let at = 0
  while (written[at] === meant[at]) at += 1
  return (
    written[at] === meant[at + 1] &&
    written[at + 1] === meant[at] &&
    written.slice(at + 2) === meant.slice(at + 2)
  )
}

/** Two letters lie on the same key. */
export function shareKey(one: string, other: string): boolean {
  const key = keyOf.get(one)
  return key !== undefined && key === keyOf.get(other)
}

/** All differences lie on the same key, as when a key is pressed once too often. */
export function isKeypadSlip(written: string, meant: string): boolean {
  if (written.length !== meant.length || written.length < 4) return false
  let differing = 0
  for (let at = 0; at < written.length; at += 1) {
    if (written[at] === meant[at]) continue
    differing += 1
    if (!shareKey(written[at] ?? '', meant[at] ?? '')) return false
  }
  return differing <= 2
}
