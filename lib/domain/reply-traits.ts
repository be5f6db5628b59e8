import { findAnswer } from './reply-answers'
import { findDanger } from './reply-danger'
import { figureOf } from './reply-figure'
import type { ReplyReading } from './reply-kind'
import { optOutSureness } from './reply-opt-out'
import type { Sense } from './reply-sense'
import { noFlowSureness, slowSureness } from './reply-trouble'
import { wrongNumberSureness } from './reply-wrong-number'

/**
 * What is counted of a text: what was asked, the concepts found and how they follow each other, the words and their
 * threes of letters, and what the word lists made of it. A trait is a name; a text has it or not.
 */
export function traitsOf(sense: Sense, byWords: ReplyReading): string[] {
  return [
    ...new Set([
      ...outer(sense),
      ...ofConcepts(sense),
      ...ofLetters(sense),
      ...ofRules(sense, byWords),
    ]),
  ]
}

/** Marks a trait that comes from the rules: not counted of texts that the rules were written by. */
const ruled = 'rule '

export function isOfRules(trait: string): boolean {
  return trait.startsWith(ruled)
}

function outer(sense: Sense): string[] {
  const figure = figureOf(sense)
  return [
    'any',
    `asked ${sense.asked}`,
    `length ${Math.min(6, Math.floor(sense.words / 3))}`,
    `strange ${Math.min(3, sense.unknownWords)}`,
    ...(sense.text.includes('?') ? ['question'] : []),
    ...(figure ? ['figure', `figure ${sense.asked} ${figure.hasUnit ? 'unit' : 'bare'}`] : []),
  ]
}

function ofConcepts(sense: Sense): string[] {
  const found = sense.marks.map(({ concept, denied }) => (denied ? `!${concept}` : concept))
  const pairs = found.flatMap((one, at) =>
    found.slice(at + 1).map((other) => `both ${[one, other].sort().join(' ')}`),
  )
  return [
    ...found.flatMap((concept) => [`is ${concept}`, `is ${concept} ${sense.asked}`]),
    ...found.map((concept, at) => `next ${concept} ${found[at + 1] ?? '.'}`),
    ...pairs,
    ...found.slice(0, 1).map((concept) => `first ${concept}`),
    ...found.slice(-1).map((concept) => `last ${concept}`),
  ]
}

function ofLetters(sense: Sense): string[] {
  const words = sense.tokens.filter(({ kind }) => kind === 'word').map(({ text }) => text)
  const pairs = words.slice(1).map((word, at) => `two ${words[at]} ${word}`)
  return pairs.concat(
    words.flatMap((word) => {
      const padded = `<${word}>`
      const threes = Array.from({ length: padded.length - 2 }, (_, at) => padded.slice(at, at + 3))
      return [`word ${word}`, ...threes.map((three) => `abc ${three}`)]
    }),
  )
}

function ofRules(sense: Sense, byWords: ReplyReading): string[] {
  const found = [
    optOutSureness(sense) > 0 && 'stop',
    findDanger(sense)?.kind,
    wrongNumberSureness(sense) > 0 && 'wrong-number',
    noFlowSureness(sense) > 0 && 'no-flow',
    slowSureness(sense) > 0 && 'slow',
    findAnswer(sense)?.kind,
  ].filter((kind) => typeof kind === 'string')
  const { kind, sure } = byWords
  return [
    ...found.map((one) => `${ruled}finds ${one}`),
    `${ruled}reads ${kind}`,
    `${ruled}reads ${kind} ${sense.asked}`,
    `${ruled}reads ${kind} ${Math.floor(sure * 10)}`,
  ]
}
