import type { Answer } from './reply-answer-kind'
import type { Mark } from './reply-marks'
import { isNamed, isSaid, said, sureOf, type Sense } from './reply-sense'
import type { Concept } from './reply-words/concept'

/** The text is a question before it is anything else. */
export function isQuestionFirst(sense: Sense): boolean {
  return isOpenedByQuestion(sense) || asksOfPlan(sense) || isPlainQuestion(sense)
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
    !isSaid(sense, 'need', 'lost', 'worn', 'notYet', 'helpWord')
  )
}

/** "Kapor kokhon bodlabo": when shall I change it; the plan is what is asked about. */
function asksOfPlan(sense: Sense): boolean {
  const isPlanOnly = !isSaid(sense, 'notYet', 'forgot', 'day') && isSaid(sense, 'future')
  return isSaid(sense, 'ask') && isPlanOnly
}

/** A question to the desk, if the text asks one. */
export function findQuestion(sense: Sense): Answer | null {
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
    'edge',
    'substance',
  ] as const),
]
