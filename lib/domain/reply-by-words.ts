import { isHelpKeyword, isStartKeyword } from './consent'
import { findAnswer } from './reply-answers'
import { findDanger } from './reply-danger'
import { figureOf, isMostlyFigure, worsenedTo } from './reply-figure'
import { isDoubtful } from './reply-doubt'
import { sureEnough, type ReplyReading } from './reply-kind'
import { optOutSureness } from './reply-opt-out'
import { isDenied, isNamed, isSaid, isSupposed, said, type Sense } from './reply-sense'
import { noFlowSureness, slowSureness } from './reply-trouble'
import { wrongNumberSureness } from './reply-wrong-number'

/** What the word lists and their rules make of a text: opt-out, danger, wrong number, what was asked, the rest. */
export function readByWords(sense: Sense): ReplyReading {
  const reading = readUrgent(sense) ?? readTrouble(sense) ?? readRest(sense)
  const isUnsure = reading.sure < sureEnough || isDoubtful(sense, reading.kind)
  return isUnsure ? { ...reading, kind: 'unclear', sure: Math.min(reading.sure, 0.55) } : reading
}

function readUrgent(sense: Sense): ReplyReading | null {
  const optOut = optOutSureness(sense)
  if (optOut > 0) return { kind: 'stop', sure: optOut }
  if (isStartKeyword(sense.text)) return { kind: 'start', sure: 1 }
  if (isHelpKeyword(sense.text)) return { kind: 'help', sure: 1 }
  const danger = findDanger(sense)
  if (danger) return slowSureness(sense) >= sureEnough ? { ...danger, alsoSlow: true } : danger
  const wrong = wrongNumberSureness(sense)
  return wrong > 0 ? { kind: 'wrong-number', sure: wrong } : null
}

/** "It stopped", "water stop", "stopped dripping": it could be the texts, a leak or the water. */
function isStopOrStopped(sense: Sense): boolean {
  // "Tightened it and it no longer drips": the drip was the leak.
  const isMended = sense.asked === 'step' && isSaid(sense, 'done') && isNamed(sense, 'drip')
  if (isReasonNotToStart(sense) || isMended) return false
  if (isSaid(sense, 'itStopped')) return true
  if (isSaid(sense, 'notYet')) return false
  return (
    isSaid(sense, 'ceased', 'stopWord') &&
    !isDenied(sense, 'flow', 'water', 'piece', 'cloth', 'slow', 'good', 'fast')
  )
}

/** Figures and trouble: the figure answers when one was asked for. */
function readTrouble(sense: Sense): ReplyReading | null {
  if (isSupposed(sense)) return null
  const noFlow = isReasonNotToStart(sense) ? 0 : noFlowSureness(sense)
  const slow = slowSureness(sense)
  const isAsked = sense.asked === 'flow' || sense.asked === 'step'
  const figure = figureOf(sense)
  if (figure && (figure.hasUnit || isMostlyFigure(sense))) {
    // "Is 12 minutes ok?"
    if (!isAsked && sense.text.includes('?') && isSaid(sense, 'ask', 'where', 'yes', 'good'))
      return null
    const worse = isAsked ? null : worsenedTo(sense)
    if (worse !== null) return { kind: 'slow', minutes: worse, sure: 0.8 }
    // "Strong for one minute, then a dribble": nobody calls a minute slow.
    if (slow > 0 && figure.minutes <= 1 && sense.asked !== 'flow')
      return { kind: 'slow', sure: slow }
    if (slow > 0 && !isAsked) return { kind: 'slow', minutes: figure.minutes, sure: slow }
    return readFigure(sense, figure, slow >= sureEnough)
  }
  if (noFlow >= slow && noFlow > 0) return { kind: 'no-flow', sure: noFlow }
  if (slow > 0) return { kind: 'slow', sure: slow }
  return isStopOrStopped(sense) ? { kind: 'unclear', sure: 0.5 } : null
}

/** "Not yet, the pump has no water", "no water to wash it with": it is not the filter that gives none. */
function isReasonNotToStart(sense: Sense): boolean {
  const isCare = sense.asked === 'wash' || sense.asked === 'change'
  if (!isCare || isNamed(sense, 'filter', 'drip', 'outlet', 'done')) return false
  // Bengali "pore" is "later" and "falls".
  const first = said(sense, 'notYet').some(
    (mark) =>
      mark.from <= 1 &&
      !sense.marks.some((other) => other.concept === 'flow' && other.from === mark.from),
  )
  const isForWash =
    isNamed(sense, 'wash', 'notYet') && isSaid(sense, 'day', 'future', 'notYet', 'now')
  return first || (isForWash && !isNamed(sense, 'flow'))
}

function readFigure(
  sense: Sense,
  figure: { minutes: number; hasUnit: boolean },
  isSlow: boolean,
): ReplyReading {
  const also = isSlow ? { alsoSlow: true } : {}
  const isChoice =
    !figure.hasUnit && [1, 2, 3].includes(figure.minutes) && !['flow', 'none'].includes(sense.asked)
  if (isChoice) {
    return { kind: 'choice', choice: figure.minutes, minutes: figure.minutes, sure: 0.85, ...also }
  }
  return { kind: 'flow-figure', minutes: figure.minutes, sure: figure.hasUnit ? 0.9 : 0.8, ...also }
}

function readRest(sense: Sense): ReplyReading {
  return findAnswer(sense) ?? { kind: 'unclear', sure: 0.3 }
}
