import type { Mark } from './reply-marks'
import { promised } from './reply-figure'
import {
  areBeside,
  denied,
  isDenied,
  isNamed,
  isSaid,
  said,
  sureOf,
  type Sense,
} from './reply-sense'
import { isOver } from './reply-trouble'
import type { Concept } from './reply-words/concept'

/** Readings of what is left when there is neither danger nor trouble. */
export type AnswerKind =
  'done' | 'not-yet' | 'need-part' | 'ask' | 'thanks' | 'yes' | 'no' | 'start' | 'help' | 'moved'

export type Answer = { kind: AnswerKind; sure: number }

export function findAnswer(sense: Sense): Answer | null {
  const question = ask(sense)
  const isOpen = isOpenedByQuestion(sense) || asksOfPlan(sense) || isPlainQuestion(sense)
  if (question && isOpen) return question
  const rules = [
    soundParts,
    needPart,
    notYet,
    moved,
    () => question,
    done,
    keywords,
    thanksOnly,
    yesNo,
  ]
  for (const rule of rules) {
    const answer = rule(sense)
    if (answer) return answer
  }
  return null
}

/** "How long do I wait?" asks, though it waits too. */
function isOpenedByQuestion(sense: Sense): boolean {
  const marks = said(sense, 'ask')
  return sense.text.includes('?') ? marks.length > 0 : marks.some((mark) => mark.from === 0)
}

/** "I would like to know whether": a wording that only asks. */
function isPlainQuestion(sense: Sense): boolean {
  return (
    said(sense, 'ask').some((mark) => mark.to - mark.from >= 2) &&
    !isSaid(sense, 'need', 'lost', 'worn', 'helpWord')
  )
}

/** "Kapor kokhon bodlabo": when shall I change it; the plan is what is asked about. */
function asksOfPlan(sense: Sense): boolean {
  const isPlanOnly = !isSaid(sense, 'notYet', 'forgot', 'day') && isSaid(sense, 'future')
  return isSaid(sense, 'ask') && isPlanOnly
}

function needPart(sense: Sense): Answer | null {
  const things = [...said(sense, 'piece', 'cloth', 'container'), ...denied(sense, 'piece', 'cloth')]
  const all = [...things, ...said(sense, 'filter')]
  const pieces = things.filter((mark) => mark.concept !== 'container')
  const wants = [
    ...said(sense, 'need', 'lack').filter((mark) => areBeside(sense, [mark], all, 5)),
    // "The syringe? Nowhere. I want one."
    ...(said(sense, 'tool').length > 0 ? said(sense, 'need') : []),
    // Who has lost the bottle cannot measure; no part is owed for it.
    ...said(sense, 'lost').filter((mark) =>
      areBeside(sense, [mark], sense.asked === 'flow' ? pieces : things, 5),
    ),
    ...said(sense, 'worn').filter((mark) => areBeside(sense, [mark], pieces, 6)),
  ]
  if (wants.length > 0) {
    const lacksFilter = things.length === 0 && !isSaid(sense, 'need', 'lost')
    return { kind: 'need-part', sure: lacksFilter ? 0.5 : sureOf(0.8, wants) }
  }
  const missing = denied(sense, 'piece', 'cloth')
  return missing.length > 0 && sense.words <= 5 ? { kind: 'need-part', sure: 0.65 } : null
}

function notYet(sense: Sense): Answer | null {
  const undone = denied(sense, 'done', 'wash', 'change')
  const isPlace = sense.asked === 'flow' && sense.unknownWords <= 1
  const planned = said(sense, 'future').filter(
    () => isPlace || isNamed(sense, 'wash', 'change', 'done') || sense.words <= 3,
  )
  const isCare = sense.asked === 'wash' || sense.asked === 'change'
  const unable = isCare ? denied(sense, 'can', 'be') : []
  const unsent = sense.asked === 'change' ? denied(sense, 'receive') : []
  const days = isSaid(sense, 'done') ? [] : said(sense, 'day')
  // Bengali "pore" is "later" and "falls": "valo pore" runs well.
  const isFall = (mark: Mark): boolean =>
    isSaid(sense, 'good', 'better', 'water', 'done') &&
    said(sense, 'flow').some((flow) => flow.from === mark.from)
  const marks = [
    ...said(sense, 'notYet', 'forgot').filter((mark) => !isFall(mark)),
    ...days,
    ...undone,
    ...unable,
    ...unsent,
    ...timeless(sense),
    ...planned,
    ...promised(sense),
  ]
  return marks.length > 0 ? { kind: 'not-yet', sure: sureOf(0.85, marks) } : null
}

/** "Haven't found time". */
function timeless(sense: Sense): Mark[] {
  const denials = sense.marks.filter((mark) =>
    ['not', 'notNext', 'notAround', 'notPlus', 'notBack', 'lack'].includes(mark.concept),
  )
  return said(sense, 'time').filter((mark) => areBeside(sense, [mark], denials, 3))
}

function moved(sense: Sense): Answer | null {
  // "Sold it": a word of giving at the head of a text is of the filter.
  const given = said(sense, 'gave').filter(
    (mark) =>
      mark.from <= 2 || areBeside(sense, [mark], said(sense, 'filter', 'person', 'child'), 4),
  )
  const marks = [...said(sense, 'moved'), ...given]
  return marks.length > 0 ? { kind: 'moved', sure: sureOf(0.85, marks) } : null
}

function ask(sense: Sense): Answer | null {
  const isQuestion = sense.text.includes('?')
  const marks = said(sense, 'ask').filter((mark) => isQuestion || !isJoining(sense, mark))
  const isStrange = sense.unknownWords > 0 && !isNamed(sense, ...topics)
  if (marks.length > 0) {
    const sure = isQuestion ? 0.85 : 0.75
    return { kind: 'ask', sure: isStrange && sense.words > 3 ? 0.5 : sureOf(sure, marks) }
  }
  const where = said(sense, 'where').some((mark) => isQuestion || mark.from <= 1)
  if (where) return { kind: 'ask', sure: 0.7 }
  // "Either wet or dry": two ways are put to the desk.
  const isNeither = isSaid(sense, 'not')
  const isChoice = isSaid(sense, 'or') && !isNeither && sense.marks.every((mark) => !mark.denied)
  if (isChoice && sense.words >= 5) return { kind: 'ask', sure: 0.62 }
  if (!isQuestion || sense.words <= 2) return null
  // "Will you watch the match?" asks nothing of the desk.
  return { kind: 'ask', sure: isStrange ? 0.5 : 0.65 }
}

/** "As you advised", "when we left": within a sentence such a word joins, it does not ask. */
function isJoining(sense: Sense, mark: Mark): boolean {
  const text = sense.tokens[mark.from]?.text ?? ''
  const before = sense.tokens[mark.from - 1]
  if (before?.kind !== 'word' || mark.to - mark.from > 1) return false
  if (askers.has(before.text)) return false
  if (text === 'como' || likeWords.has(before.text)) return true
  return whens.has(text) && mark.from >= 2
}

const whens = new Set('when wen whn cuando kuando quand kan'.split(' '))
const likeWords = new Set(['as', 'like', 'como', 'comme'])

/** After these "when" and "how" do ask. */
const askers = new Set(
  'y and et pero but mais saber sabe know savoir sais tell me digame dites please about'.split(' '),
)

/** What a question to the desk is about. */
const topics: Concept[] = [
  ...(['water', 'filter', 'piece', 'cloth', 'container', 'flow', 'fill', 'drink'] as const),
  ...([
    'wash',
    'change',
    'need',
    'you',
    'where',
    'helpWord',
    'good',
    'yes',
    'slow',
    'substance',
  ] as const),
]

function done(sense: Sense): Answer | null {
  const marks = [...said(sense, 'done', 'better'), ...denied(sense, 'slow', 'blocked')]
  if (marks.length > 0) return { kind: 'done', sure: sureOf(doneSureness(sense, marks), marks) }
  // "All is well with the filter and with us".
  const isOfWater = isSaid(sense, 'filter', 'water', 'flow') && !isSaid(sense, 'not')
  if (sense.asked === 'none' && isSaid(sense, 'yes') && isOfWater) {
    return { kind: 'done', sure: 0.65 }
  }
  if (isOver(sense)) return { kind: 'done', sure: 0.75 }
  // "Works well, nobody ill".
  const isAllWell = isSaid(sense, 'good') && isDenied(sense, ...dangers)
  if (isAllWell && sense.asked === 'none') return { kind: 'done', sure: 0.7 }
  const isSound = areBeside(sense, said(sense, 'filter'), said(sense, 'good'), 4)
  if (isSound && !isSaid(sense, 'not', 'ask', 'if')) return { kind: 'done', sure: 0.7 }
  const runsWell = areBeside(sense, said(sense, 'flow'), said(sense, 'good', 'fast'), 3)
  const isWashOk = isSaid(sense, 'wash') && isSaid(sense, 'yes', 'good') && sense.words <= 3
  const isCleaned = sense.asked === 'wash' && isSaid(sense, 'clean')
  const isWellNow = isSaid(sense, 'good') && isSaid(sense, 'now') && sense.asked !== 'none'
  return runsWell || isWellNow || isCleaned || (sense.asked === 'wash' && isWashOk)
    ? { kind: 'done', sure: 0.7 }
    : null
}

/** Bengali "has become" is said of a wash as of a noise. */
const becomings = new Set(
  'হইছে হয়েছে হলো গেছে গেসে hoise hoyeche hoiche hoise holo gese geche'.split(' '),
)

/** What follows a "but" without a meaning here may be anything: a person reads it. */
function doneSureness(sense: Sense, marks: readonly Mark[]): number {
  const isVague = marks.every((mark) => becomings.has(sense.tokens[mark.to - 1]?.text ?? ''))
  if (isVague && (sense.unknownWords > 0 || isSaid(sense, 'notBack'))) return 0.5
  const settled: Concept[] = ['good', 'better', 'yes', 'done', 'fast', 'now', 'clean', 'past', 'no']
  const but = said(sense, 'but').at(-1)
  if (but === undefined) return 0.85
  const after = sense.marks.filter((mark) => mark.from >= but.to)
  const isSettled = after.some((mark) => mark.denied || settled.includes(mark.concept))
  const isFollowed = sense.tokens.length - but.to >= 2
  return isFollowed && !isSettled ? 0.5 : 0.85
}

function keywords(sense: Sense): Answer | null {
  const starts = said(sense, 'startWord')
  if (starts.length > 0) return { kind: 'start', sure: sureOf(0.8, starts) }
  // "Thank you for your help" asks for none.
  const helps = isSaid(sense, 'thanks') ? [] : said(sense, 'helpWord')
  return helps.length > 0 ? { kind: 'help', sure: sureOf(0.8, helps) } : null
}

function thanksOnly(sense: Sense): Answer | null {
  const marks = said(sense, 'thanks')
  if (marks.length === 0 || isDenied(sense, 'good')) return null
  if (sense.asked === 'step' && isSaid(sense, 'yes', 'no')) return null
  return { kind: 'thanks', sure: sureOf(sense.unknownWords > 3 ? 0.5 : 0.85, marks) }
}

/** Words of danger: when a text denies them and says nothing else, it answers no. */
const dangers: Concept[] = [
  'broken',
  'leak',
  'fall',
  'frozen',
  'odd',
  'smell',
  'oddSmell',
  'taste',
  'ill',
  'vomit',
  'pain',
  'blood',
]

/** "I looked, no crack": the answer to what a step asks, whatever was done for it. */
function soundParts(sense: Sense): Answer | null {
  if (sense.asked !== 'step' || isSaid(sense, 'better', 'ask')) return null
  // "No, all is tight".
  const first = said(sense, 'no').filter((mark) => mark.from === 0)
  if (first.length > 0 && isSaid(sense, 'done', 'yes')) return { kind: 'no', sure: 0.7 }
  if (isSaid(sense, 'yes') || (isSaid(sense, 'done') && isSaid(sense, 'good'))) return null
  const safe = denied(sense, 'broken', 'leak', 'fall', 'frozen')
  return safe.length > 0 ? { kind: 'no', sure: sureOf(0.75, safe) } : null
}

function yesNo(sense: Sense): Answer | null {
  const yes = said(sense, 'yes')
  const no = said(sense, 'no')
  const safe = denied(
    sense,
    ...dangers,
    ...(sense.asked === 'step' ? (['bad', 'drip'] as const) : []),
  )
  if (safe.length > 0) return { kind: 'no', sure: sureOf(0.75, safe) }
  if (yes.length > 0 && no.length > 0) return null
  // "Ok?" asks whether all is well.
  const isOfPart = sense.unknownWords > 0 && isNamed(sense, 'piece', 'edge', 'container', 'filter')
  const isQuery = sense.text.includes('?') && sense.words <= 2
  const isDoubted = sense.unknownWords > 3 || isQuery || isOfPart
  if (yes.length > 0) return { kind: 'yes', sure: sureOf(isDoubted ? 0.5 : 0.85, yes) }
  if (no.length > 0) return { kind: 'no', sure: noSureness(sense) }
  const isPlainNo = isSaid(sense, 'not') && !isDenied(sense, 'drip', 'texts', 'phone')
  if (isPlainNo && sense.words <= 3 && sense.unknownWords === 0) return { kind: 'no', sure: 0.65 }
  const strangers = sense.asked === 'none' ? 0 : 2
  return isSaid(sense, 'good') && sense.unknownWords <= strangers
    ? { kind: 'yes', sure: 0.62 }
    : null
}

function noSureness(sense: Sense): number {
  if (sense.words <= 4) return 0.85
  const isFirst = said(sense, 'no').some((mark) => mark.from === 0)
  return isFirst && sense.words <= 8 && sense.unknownWords <= 1 ? 0.65 : 0.5
}
