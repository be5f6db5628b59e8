/**
 * A text as people send it, cut into words, numbers and breaks, with the differences that carry
 * no meaning (case, accents, curly quotes, digits of other scripts) taken away.
 */

export type Token =
  | { kind: 'word'; text: string }
  | { kind: 'number'; text: string; value: number }
  /** `strong` ends a sentence, `weak` ends a clause. */
  | { kind: 'break'; text: string; strength: 'strong' | 'weak' }

const fractions: Readonly<Record<string, string>> = { '½': '.5', '¼': '.25', '¾': '.75' }

/** Emoji with a plain meaning on a phone; the rest say nothing. */
const emojiWords: readonly (readonly [RegExp, string])[] = [
  [/[👍👌✅✔☑💯🆗]/gu, ' emojiyes '],
  [/[🙏❤🥰😊🙂😀😃🤗💙]/gu, ' emojithanks '],
  [/[👎❌🚫]/gu, ' emojino '],
  [/[🤒🤢🤮🤕🤧]/gu, ' emojiill '],
  [/[🐌🐢]/gu, ' emojislow '],
]

/** The emoji that a word of the packs stands for; null for any other word. */
export function emojiOf(word: string): string | null {
  const found = emojiWords.find(([, name]) => name.trim() === word)
  return found?.[0].source.match(/\p{Extended_Pictographic}/gu)?.join(' ') ?? null
}

/** French words that lose their vowel before an apostrophe; elsewhere an apostrophe just goes. */
const elided = new Set([
  'l',
  'd',
  'n',
  'c',
  'j',
  'm',
  't',
  's',
  'qu',
  'jusqu',
  'lorsqu',
  'puisqu',
  'quelqu',
])

/** Words people write with a digit in them. */
const digitWords: Readonly<Record<string, string>> = {
  '2day': 'today',
  '2moro': 'tomorrow',
  '2morrow': 'tomorrow',
  '2mrw': 'tomorrow',
  '2nite': 'tonight',
  b4: 'before',
  gr8: 'great',
  l8r: 'later',
  l8er: 'later',
  '4u': 'for you',
  u2: 'you too',
  m1: 'mañana',
  dem1: 'demain',
  bi1: 'bien',
  '2m1': 'demain',
  a2m1: 'demain',
}

function digitValue(digit: string): number {
  let code = digit.codePointAt(0) ?? 0
  let value = 0
  while (value < 9 && /\p{Nd}/u.test(String.fromCodePoint(code - 1))) {
    code -= 1
    value += 1
  }
  return value
}

/** "4 1/2" and "1/2" as decimals. */
function spellFraction(_: string, whole: string | undefined, over: string, under: string): string {
  return ` ${String(Number(whole ?? 0) + Number(over) / Number(under))} `
}

/** "1O min", "l4 min": letters that stand for the digits they look like. */
function figuresOfLetters(text: string): string {
  return text
    .replace(/(?<=(?<![\p{L}\d])\d)[oO](?![\p{L}\d])/gu, '0')
    .replace(/(?<![\p{L}\d])[lI](?=\d(?![\p{L}\d]))/gu, '1')
}

/** Lower case, Latin accents off, digits of any script as ASCII. Bengali vowel signs stay. */
export function foldText(text: string): string {
  let folded = figuresOfLetters(text).replace(
    /(?<![\d/])(?:(\d+)\s+)?([13])\/([24])(?![\d/])/g,
    spellFraction,
  )
  folded = folded.replace(/(\d?)\s?([½¼¾])/gu, (_, whole: string, part: string) => {
    return ` ${whole === '' ? '0' : whole}${fractions[part] ?? ''} `
  })
  for (const [emoji, word] of emojiWords) folded = folded.replace(emoji, word)
  return folded
    .normalize('NFKC')
    .toLowerCase()
    .replace(/\p{Nd}/gu, (digit) => String(digitValue(digit)))
    .normalize('NFD')
    .replace(/[\u0300-\u036f]/g, '')
    .normalize('NFC')
    .replace(/œ/g, 'oe')
    .replace(/æ/g, 'ae')
    .replace(/\u200b|\u200c|\u200d|\u200e|\u200f|\u2060|\ufeff|\u00ad|\ufe0f/g, '')
    .replace(/[‘’ʼ`´′]/g, "'")
    .replace(/[“”″]/g, '"')
    .replace(/#(?!\d)/g, ' number ')
    .replace(/\b2 (?=long|slow|much|late|little|small|weak|fast|hot|cold|sick|tired|low)/g, 'too ')
    .replace(/\bi'll\b/g, 'i will')
    .replace(/\bwe'll\b/g, 'we will')
}

/** 4'30" and 45" are minutes and seconds. */
function spellPrimes(text: string): string {
  return text
    .replace(/(\d+)\s*'\s*(\d{1,2})\s*(?:''|")?(?!\d)/g, '$1 min $2 s ')
    .replace(/(\d+)\s*(?:''|")/g, '$1 s ')
    .replace(/(\d+)\s*'(?![a-z])/g, '$1 min ')
}

const lexeme =
  /\d*[a-z][a-z0-9']*|\d+(?:[.,:]\d+)*|[\u0980-\u0983\u0985-\u09e3\u09f0-\u09fe]+|[^\s\p{P}\p{S}\d]+|[\p{P}\p{S}\n]+/gu

/** Words, numbers and breaks of a text, in order. */
export function tokenise(text: string): Token[] {
  const folded = spellPrimes(foldText(text)).replace(/(?<=\p{L})-(?=\p{L})/gu, ' ')
  const tokens: Token[] = []
  for (const [piece] of folded.matchAll(lexeme)) {
    if (/^\d+(?:[.,:]\d+)*$/.test(piece)) tokens.push(numberToken(piece))
    else if (/^[\p{P}\p{S}\n]/u.test(piece)) tokens.push(...breakTokens(piece))
    else tokens.push(...wordTokens(piece))
  }
  return tokens
}

function numberToken(piece: string): Token {
  const clock = /^(\d+):(\d{2})$/.exec(piece)
  if (clock) return { kind: 'number', text: piece, value: Number(clock[1]) + Number(clock[2]) / 60 }
  const plain = piece.replace(',', '.')
  const value = Number(plain)
  return { kind: 'number', text: piece, value: Number.isFinite(value) ? value : Number.NaN }
}

function breakTokens(piece: string): Token[] {
  if (/[.!?;।\n…|]/u.test(piece)) return [{ kind: 'break', text: piece, strength: 'strong' }]
  if (/^[/+&'"*#~_=<>]+$/u.test(piece)) return []
  return [{ kind: 'break', text: piece, strength: 'weak' }]
}

function wordTokens(piece: string): Token[] {
  const word = piece.replace(/^'+|'+$/g, '')
  const spelled = digitWords[word]
  if (spelled !== undefined) return spelled.split(' ').map(wordToken)
  if (!/\d/.test(word)) return elisions(word).map(wordToken)
  if (/^[a-z]+[013][a-z]+$/.test(word) || /^[a-z]{1,6}0$/.test(word))
    return [wordToken(unleet(word))]
  return word
    .split(/(?<=\d)(?=[a-z'])|(?<=[a-z'])(?=\d)/)
    .flatMap((part) => (/^\d/.test(part) ? [numberToken(part)] : elisions(part).map(wordToken)))
}

function unleet(word: string): string {
  return word.replace(/0/g, 'o').replace(/1/g, 'i').replace(/3/g, 'e').replace(/5/g, 's')
}

function elisions(word: string): string[] {
  const cut = word.indexOf("'")
  if (cut > 0 && elided.has(word.slice(0, cut))) {
    return [word.slice(0, cut), ...elisions(word.slice(cut + 1))]
  }
  return word === '' ? [] : [word.replace(/'/g, '')]
}

function wordToken(text: string): Token {
  return {
    kind: 'word',
    text: text
      .normalize('NFD')
      .replace(/[\u0300-\u036f]/g, '')
      .normalize('NFC'),
  }
}
