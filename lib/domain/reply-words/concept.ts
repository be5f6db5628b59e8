/**
 * What a word or phrase can mean to the desk. A language pack gives the words; the rules in
 * `reply-*.ts` combine the meanings, so that a new way of saying a thing needs one word, not a
 * new sentence.
 */
export const concepts = [
  // how words bear on each other
  'not', // denies what follows
  'notNext', // "no" before a noun: denies the very next word only
  'notBack', // denies what stands before it
  'notAround', // French "pas": the verb before it, else what follows
  'notPlus', // French "plus": no longer, unless it compares
  'ne', // French "ne": announces a denial
  'ceased', // "stopped", "no longer": what follows is over
  'but',
  'and',
  'or',
  'if',
  'future',
  'past', // "was", "before"
  'now',
  'ago',
  'within', // "in ten minutes"
  'still',
  'very', // also "too"
  'little',
  'long', // a long time
  'again',
  // things and people
  'water',
  'filter',
  'piece', // a part that can be broken, lost or wanted
  'outlet', // a part that water comes from when all is well
  'edge', // where water should not come out: the side, the joint
  'tool', // the syringe: broken, it is wanted, but the water is none the worse
  'cloth', // what may be dirty without the water being odd
  'container',
  'person',
  'pronoun', // may be a person or the filter
  'child',
  'breast', // or the feeding bottle
  'name',
  'me',
  'you',
  'texts', // a message, to text
  'phone', // a phone or a phone number
  'receive', // to get, read or understand a text
  'see',
  'stool',
  'belly',
  'all', // everything
  'source', // the river, the well
  'animal', // a sick goat makes nobody unwell
  'business', // "this is a shop": not the family that is meant
  'cup', // what one drinks from
  'full', // full or half: what a bottle is not yet
  'elsewhere', // what may break or fall without harm to the water: a phone, a bus, a roof
  'body', // skin, eyes, head: coloured or hurting it is illness
  // what the water does
  'flow',
  'fill',
  'drip',
  'slow',
  'current', // the flow as a thing: a bad one is slow, where bad water is odd
  'dry', // "not a drop": of water only
  'none', // nothing, empty
  'blocked',
  'fast',
  'tooFast',
  'good',
  'bad',
  'better',
  'same', // no change
  'strength', // "no strength": slow
  'meanwhile', // "by the time": with a cup or a bottle, slow
  'almost', // before a denial: little, not nothing
  // danger
  'broken',
  'leak',
  'ooze', // of a joint it is a leak, of a washed filter slow water
  'fall', // fell or dropped: the filter is broken, the flow is slow
  'frozen',
  'overflow', // over the brim: with nothing below it only does not run
  'sudden',
  'mended',
  'odd', // colour, bits
  'creature', // what lives or grows in the water: odd whatever thing is named beside it
  'oddSmell',
  'smell',
  'taste',
  'dirty', // of water: odd; of a filter: only in want of a wash
  'clean',
  'fuel',
  'substance', // soap, bleach, salt: odd where the water tastes of it, not where one asks to use it
  'ill',
  'care', // hospital, medicine: somebody is ill, unless a stranger says where we have rung
  'recovered',
  'frail', // weak: of a person ill, of the water slow
  'pain',
  'blood',
  'vomit',
  'sign', // an IMCI general danger sign by itself
  'limp', // "does not move": of a child a danger sign, of the water no flow
  'wake', // wakes, answers, reacts
  'problem',
  'sleepy',
  'drink',
  'be', // Bengali "hoy": passes a denial on
  'can', // can, will, want
  // what they say
  'done',
  'wash',
  'change',
  'notYet',
  'day', // Bengali "kal": tomorrow or yesterday, as the verb has it
  'forgot',
  'time', // denied, a reason for "not yet"
  'need',
  'lack', // "I have no"
  'lost',
  'worn', // of a part: wanted
  'gave', // gave, sold, left behind: with the filter they have it no more
  'ask',
  'explain', // "speak slowly": the telling is slow, not the water
  'where', // also "can you": asks for a thing as often as about it
  'thanks',
  'yes',
  'no',
  'greeting',
  'please',
  'wrongNumber',
  'mistaken', // with a phone, a person or a text: a wrong number
  'who',
  'moved',
  'stopWord',
  'stopAsk',
  'fedUp', // of the texts: an opt-out
  'leaveMe',
  'end', // to end or take away: with texts or a phone an opt-out
  'startWord',
  'helpWord',
  'itStopped', // neither opt-out nor clear trouble: asks
  'calm', // consumes a phrase that would otherwise read as something
] as const

export type Concept = (typeof concepts)[number]

/** Units of the numbers people answer with. */
export type NumberUnit = 'hour' | 'minute' | 'second' | 'other'

/**
 * The words of one language. Entries are separated by commas; an entry may hold several words;
 * `*` at the end of a word stands for any ending; `~` stands for up to two words of any kind, `.`
 * for the end of a clause.
 */
export type LanguagePack = {
  concepts: Partial<Record<Concept, string>>
  /** Number words, each followed by its value, that stand for a figure wherever they are. */
  numbers: string
  /** Number words that are also articles or something else: only before a unit. */
  weakNumbers: string
  units: Record<NumberUnit, string>
  /** Whole spans of time said in words, each followed by its minutes. */
  spans: string
  /** "and a half" and its kind, each followed by its part of the unit before it. */
  halves: string
  /** Bengali words that shift the number after them: half more, a quarter less. */
  shifts?: string
  /** Small words that a denial passes over on its way to what it denies. */
  light: string
  /** Everyday words without a meaning here; they keep guesses at spelling off. */
  common: string
  /** How a word of this language may be respelled: see `reply-spelling.ts`. */
  spelling: 'latin' | 'spanish' | 'french' | 'bengali'
}
