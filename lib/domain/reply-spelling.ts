/* Respelling: what the writers of each language leave to chance. */

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
      .replace(/gu(?=[ei])/g, 'g')
      .replace(/(?<=\w{3})it(?=[oa]s?$)/, ''),
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
