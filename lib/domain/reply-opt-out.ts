import { isStopKeyword } from './consent'
import { areBeside, denied, isNamed, isSaid, said, sureOf, type Sense } from './reply-sense'
import type { Mark } from './reply-marks'
import { slipsBetween } from './reply-slips'
import type { Concept } from './reply-words/concept'

/** Words that may stand beside a bare "stop" without changing what it asks. */
const manners: ReadonlySet<Concept> = new Set<Concept>([
  'please',
  'thanks',
  'greeting',
  'stopWord',
  'me',
  'you',
  'now',
  'very',
  'texts',
  'again',
  'no',
  'yes',
  'all',
  'need',
  'can',
])

/** How sure the text asks to end the texts; 0 when it does not. Read before anything else. */
export function optOutSureness(sense: Sense): number {
  if (isStopKeyword(sense.text)) return 1
  if (hasBareSentence(sense.text)) return 0.9
  if (isAskedToGoOn(sense)) return 0
  const asks = said(sense, 'stopAsk')
  if (asks.length > 0 && !isSaid(sense, 'if')) return sureOf(0.9, asks)
  if (asks.length > 0) return 0.5
  // "I did not see your message" refuses nothing.
  const isUnread = isNamed(sense, 'receive', 'see')
  const refused = denied(sense, 'texts')
  if (refused.length > 0 && !isUnread && !isSaid(sense, 'ask')) return sureOf(0.85, refused)
  if (hasOrderOfItsOwn(sense) || endsInOrder(sense)) return 0.85
  const ends = said(sense, 'end').filter((mark) => mark.likeness !== 'guessed')
  if (areBeside(sense, ends, said(sense, 'texts', 'phone'), 3) && !isSaid(sense, 'ask')) return 0.85
  if (isUnwanted(sense) || isTired(sense)) return 0.8
  const stops = said(sense, 'stopWord').filter((mark) => mark.likeness !== 'guessed')
  if (stops.length > 0 && areBeside(sense, stops, said(sense, 'texts'), 3))
    // "Hold the reminders, first help me: no water": a person reads what is to stop.
    return isSaid(sense, 'helpWord', 'dry', 'slow') ? 0.5 : sureOf(0.9, stops)
  if (stops.length > 0 && isBareStop(sense)) return sureOf(0.9, stops)
  if (isStopOfSomethingStrange(sense)) return 0.7
  return isMistypedStop(sense) ? 0.7 : 0
}

/** "Don't stop the texts", "n'arrêtez pas", "bondho koiren na": the stop itself is denied. */
function isAskedToGoOn(sense: Sense): boolean {
  const isDeniedAt = (concepts: readonly Concept[], isNear: (mark: Mark) => boolean): boolean =>
    sense.marks.some((mark) => concepts.includes(mark.concept) && isNear(mark))
  const hasBreak = (from: number, to: number): boolean =>
    sense.tokens.slice(from, to).some(({ kind }) => kind === 'break')
  return sense.marks
    .filter(({ concept }) => concept === 'stopAsk' || concept === 'stopWord')
    .some(
      ({ from, to }) =>
        isDeniedAt(
          ['not', 'ne'],
          (mark) => from - mark.to >= 0 && from - mark.to <= 1 && !hasBreak(mark.to, from),
        ) ||
        isDeniedAt(
          ['notBack'],
          (mark) => mark.from - to >= 0 && mark.from - to <= 1 && !hasBreak(to, mark.from),
        ),
    )
}

/** "Stop this nonsense": an order of two words or more, and nothing beside it that the desk knows. */
function isStopOfSomethingStrange(sense: Sense): boolean {
  const isOrder = said(sense, 'stopWord').some((mark) => mark.to - mark.from >= 2)
  const isOnlyManners = sense.marks.every((mark) => manners.has(mark.concept))
  return isOrder && isOnlyManners && sense.words <= 6 && !sense.text.includes('?')
}

/** "Why do you keep texting me? Stop it": the order is a sentence by itself, of the texts named before. */
function hasOrderOfItsOwn(sense: Sense): boolean {
  const isBreak = (at: number): boolean => (sense.tokens[at]?.kind ?? 'break') === 'break'
  const isOnlyManners = (at: number): boolean =>
    isBreak(at) ||
    sense.marks.some((mark) => mark.from <= at && at < mark.to && manners.has(mark.concept))
  return (
    isSaid(sense, 'texts') &&
    said(sense, 'stopWord').some((stop) => {
      if (stop.likeness === 'guessed' || !isBreak(stop.from - 1)) return false
      return sense.tokens.slice(stop.from).every((_, at) => isOnlyManners(stop.from + at))
    })
  )
}

/** "Your texts wake the baby, stop them": the order comes last. */
function endsInOrder(sense: Sense): boolean {
  if (isSaid(sense, 'ask', 'receive', 'helpWord')) return false
  const orders = said(sense, 'stopWord', 'end').filter((mark) => mark.likeness !== 'guessed')
  return isSaid(sense, 'texts') && orders.some((mark) => sense.tokens.length - mark.to <= 1)
}

/** "STOP. Wrong number": the keyword is a sentence by itself. */
function hasBareSentence(text: string): boolean {
  const sentences = text.split(/[.!\n]+/)
  return sentences.length > 1 && sentences.some((sentence) => isStopKeyword(sentence))
}

/** "I don't want ... messages": the wish is denied, the messages stand beside it. */
function isUnwanted(sense: Sense): boolean {
  const wishes = denied(sense, 'need')
  // "You may send one": of a part, not of a text.
  const texts = said(sense, 'texts').filter(
    (text) => !sense.marks.some((mark) => mark.concept === 'need' && mark.from === text.from),
  )
  return areBeside(sense, wishes, texts, 5) && !isSaid(sense, 'ask')
}

/** "Message after message, leave us": no word of ending, yet nothing else is meant. */
function isTired(sense: Sense): boolean {
  const texts = said(sense, 'texts', 'phone')
  if (isSaid(sense, 'ask', 'receive')) return false
  const isWeary = areBeside(sense, said(sense, 'fedUp'), texts, 6)
  return isWeary || (isSaid(sense, 'leaveMe') && texts.length > 0)
}

/** "Please stop", "basta ya": nothing is said but the stop and good manners. */
function isBareStop(sense: Sense): boolean {
  if (sense.text.includes('?')) return false
  return sense.tokens.every((token, at) => {
    if (token.kind === 'break') return true
    return sense.marks.some((mark) => mark.from <= at && at < mark.to && manners.has(mark.concept))
  })
}

/**
 * One slip from STOP, alone in the text and no word of any language here: STOOP, STPO, SSTOP.
 * SHOP, STEP and SLOW are words, so they never are.
 */
function isMistypedStop(sense: Sense): boolean {
  const words = sense.tokens.filter((token) => token.kind !== 'break')
  const [only] = words
  if (words.length !== 1 || only?.kind !== 'word' || only.text.length < 4) return false
  if (sense.marks.some((mark) => mark.likeness !== 'guessed')) return false
  return sense.unknownWords + sense.marks.length > 0 && slipsBetween(only.text, 'stop') === 1
}
