import type { Concept } from './reply-words/concept'

type Names = Partial<Record<Concept, string>>

const waterNames = {
  slow: 'slow',
  little: 'little, less',
  long: 'takes a long time',
  drip: 'only drips',
  dry: 'not a drop comes',
  none: 'nothing, empty',
  blocked: 'blocked',
  better: 'runs well again',
  same: 'no change',
  fast: 'fast',
  good: 'well, good',
  bad: 'bad',
  flow: 'to flow, to come',
  fill: 'to fill',
  current: 'the flow, the pressure',
  almost: 'almost none',
  strength: 'force',
  meanwhile: 'so long that something else gets done',
  full: 'full, half full',
} as const satisfies Names

const dangerNames = {
  broken: 'broken, cracked',
  leak: 'leaking',
  fall: 'fell or was dropped',
  frozen: 'frozen',
  tooFast: 'runs too fast',
  odd: 'odd colour, or bits in it',
  oddSmell: 'odd smell or taste',
  smell: 'to smell',
  taste: 'to taste',
  fuel: 'fuel or chemicals',
  dirty: 'dirty',
  clean: 'clean, clear',
  mended: 'mended',
  ooze: 'oozing',
  overflow: 'over the brim',
  sudden: 'suddenly',
  creature: 'something living in it',
  substance: 'soap, salt and their kind',
} as const satisfies Names

const illnessNames = {
  ill: 'ill',
  vomit: 'vomiting',
  sign: 'a danger sign of illness',
  pain: 'pain',
  blood: 'blood',
  sleepy: 'very sleepy',
  frail: 'weak',
  limp: 'does not move',
  wake: 'to wake, to answer',
  drink: 'to drink, to feed',
  breast: 'the breast or the bottle',
  stool: 'stool',
  belly: 'belly',
  problem: 'a trouble',
  all: 'everything',
  care: 'hospital, medicine',
  recovered: 'well again',
  body: 'skin, eyes, head',
} as const satisfies Names

const answerNames = {
  done: 'done',
  notYet: 'not yet',
  forgot: 'forgot',
  time: 'time for it',
  wash: 'to wash',
  change: 'to change a stage',
  need: 'wants, asks for',
  lack: 'has none',
  lost: 'lost or stolen',
  ask: 'a question',
  where: 'where, may I',
  thanks: 'thanks',
  yes: 'yes',
  no: 'no',
  greeting: 'a greeting',
  please: 'please',
  worn: 'worn out',
  gave: 'gave, sold or left it',
  explain: 'to explain, to speak',
} as const satisfies Names

const contactNames = {
  wrongNumber: 'wrong number',
  mistaken: 'wrong, mistaken',
  who: 'who is this',
  name: 'a name',
  moved: 'the family moved',
  stopAsk: 'asks for no more texts',
  stopWord: 'stop',
  end: 'to end, to remove',
  itStopped: 'it stopped: the desk asks what',
  startWord: 'texts again',
  helpWord: 'help',
  texts: 'texts, to text',
  phone: 'a phone or its number',
  receive: 'to get, to understand',
  fedUp: 'tired of it',
  leaveMe: 'leave us alone',
  business: 'a shop, an office',
} as const satisfies Names

const thingNames = {
  water: 'water',
  filter: 'the filter',
  piece: 'a part',
  outlet: 'where water comes out',
  edge: 'where no water should come out',
  tool: 'the syringe',
  cloth: 'the cloth',
  container: 'the container',
  source: 'the river, the well',
  child: 'a child',
  person: 'a person',
  pronoun: 'him, her',
  me: 'me, my',
  you: 'you, your',
  cup: 'a cup, a glass',
  animal: 'an animal',
  elsewhere: 'a thing that is no part of the filter',
} as const satisfies Names

const bearingNames = {
  not: 'denies what follows',
  notNext: 'denies the next word',
  notBack: 'denies what stands before',
  notAround: 'denies the verb before, else what follows',
  notPlus: 'no longer, or more',
  ne: 'announces a denial',
  ceased: 'has stopped',
  but: 'but',
  and: 'and',
  or: 'or',
  if: 'if',
  future: 'will',
  past: 'was, before',
  now: 'now',
  ago: 'ago',
  within: 'in so many minutes',
  day: 'some day',
  still: 'still',
  again: 'again',
  very: 'very, too',
  see: 'to see',
  be: 'to be, to become',
  can: 'can, wants to',
  calm: 'means nothing here, though it sounds so',
} as const satisfies Names

/** Each concept in words for staff. */
export const conceptNames: Record<Concept, string> = {
  ...waterNames,
  ...dangerNames,
  ...illnessNames,
  ...answerNames,
  ...contactNames,
  ...thingNames,
  ...bearingNames,
}

function group(name: string, names: Names): { name: string; concepts: readonly Concept[] } {
  return { name, concepts: Object.keys(names) as Concept[] }
}

/** The concepts under headings, in the order in which a coordinator looks for them. */
export const conceptGroups = [
  group('The water', waterNames),
  group('A filter or water not to trust', dangerNames),
  group('Illness', illnessNames),
  group('What they answer', answerNames),
  group('The phone and the texts', contactNames),
  group('Things and people', thingNames),
  group('How words bear on each other', bearingNames),
]
