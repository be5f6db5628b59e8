import type { Answer } from './reply-answer-kind'
import { findQuestion, isQuestionFirst } from './reply-ask'
import { dangers, findDone } from './reply-done'
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

/** What is left when a text tells of neither danger nor trouble. */
export function findAnswer(sense: Sense): Answer | null {
  const question = findQuestion(sense)
  if (question && isQuestionFirst(sense)) return question
  const rules = [
    soundParts,
    needPart,
    notYet,
    moved,
    () => question,
    findDone,
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
      (mark.from <= 2 && !isSaid(sense, 'still')) ||
      areBeside(sense, [mark], said(sense, 'filter', 'person', 'child'), 4),
  )
  const marks = [...said(sense, 'moved'), ...given]
  return marks.length > 0 ? { kind: 'moved', sure: sureOf(0.85, marks) } : null
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
  // "Happy birthday"; "look well, there is a line in the joint".
  const isOfJoint = sense.words > 5 && isNamed(sense, 'edge', 'piece')
  const isBare = sense.asked === 'none' ? sense.words <= 2 : sense.unknownWords <= 2 && !isOfJoint
  return isSaid(sense, 'good') && isBare ? { kind: 'yes', sure: 0.62 } : null
}

function noSureness(sense: Sense): number {
  if (sense.words <= 4) return 0.85
  const isFirst = said(sense, 'no').some((mark) => mark.from === 0)
  return isFirst && sense.words <= 8 && sense.unknownWords <= 1 ? 0.65 : 0.5
}
