import { distance } from 'fastest-levenshtein'

/** Letters that share a key on a twelve-key phone. */
const keys = ['abc', 'def', 'ghi', 'jkl', 'mno', 'pqrs', 'tuv', 'wxyz']
const keyOf = new Map(keys.flatMap((letters, key) => [...letters].map((letter) => [letter, key])))

/** "slooow" and "diarrea" for "diarrhea": runs of a letter count once. */
export function squeeze(word: string): string {
  return word.replace(/(.)\1+/gu, '$1')
}

/** Letters that Bengali writers exchange freely; also drops the nasal dot and the nukta. */
export function foldBengali(word: string): string {
  return squeeze(
    word
      .replace(/[\u0981\u09bc]/g, '')
      .replace(/ী/g, 'ি')
      .replace(/ূ/g, 'ু')
      .replace(/ণ/g, 'ন')
      .replace(/[শষ]/g, 'স')
      .replace(/য/g, 'জ')
      .replace(/ৎ/g, 'ত')
      .replace(/ঙ্গ|ং/g, 'ঙ')
      .replace(/ছ/g, 'স')
      .replace(/ো$/g, ''),
  )
}

/** Spanish letters that sound alike: "kebrado", "aser", "bomito". */
export function foldSpanish(word: string): string {
  return squeeze(
    word
      .replace(/ch/g, '7')
      .replace(/h/g, '')
      .replace(/ll/g, 'y')
      .replace(/qu(?=[ei])/g, 'k')
      .replace(/[cz](?=[ei])/g, 's')
      .replace(/z/g, 's')
      .replace(/[cq]/g, 'k')
      .replace(/v/g, 'b')
      .replace(/ge/g, 'je')
      .replace(/gi/g, 'ji'),
  )
}

/** French letters that sound alike or not at all: "koule", "laver" for "lavé", "bo". */
export function foldFrench(word: string): string {
  return squeeze(
    word
      .replace(/ph/g, 'f')
      .replace(/qu/g, 'k')
      .replace(/c(?=[aour]|l)/g, 'k')
      .replace(/eau|au/g, 'o')
      .replace(/(?:er|ez|ee|ees|es|ai|ait|et)$/, 'e')
      .replace(/ai|ei/g, 'e')
      .replace(/y/g, 'i')
      .replace(/z/g, 's')
      .replace(/(?<=..)[sxtd]$/, '')
      .replace(/(?<=...)e$/, ''),
  )
}

/** Bengali in Latin letters has no one spelling: breath, length and sibilants go. */
export function foldRoman(word: string): string {
  return squeeze(
    squeeze(word)
      .replace(/ee/g, 'i')
      .replace(/oo/g, 'u')
      .replace(/chh|ch|sh|s/g, 's')
      .replace(/([bcdgjkpt])h/g, '$1')
      .replace(/ph/g, 'f')
      .replace(/v/g, 'b')
      .replace(/w/g, 'o')
      .replace(/[zy]/g, 'j')
      .replace(/[ck]/g, 'k')
      .replace(/q/g, 'k'),
  )
}

/**
 * How far a written word may stand from the word it is taken for. Short words are never guessed:
 * at three letters every slip is another word.
 */
export function allowedSlips(length: number): number {
  if (length < 4) return 0
  return length < 8 ? 1 : 2
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
