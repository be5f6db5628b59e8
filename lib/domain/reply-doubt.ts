import type { ReplyKind } from './reply-kind'
import { isNamed, isSaid, said, type Sense } from './reply-sense'

/** Readings after which the desk does nothing, or only what it does every day. */
const harmless: ReadonlySet<ReplyKind> = new Set<ReplyKind>([
  'done',
  'not-yet',
  'flow-figure',
  'choice',
  'thanks',
  'yes',
  'no',
  'slow',
])

/**
 * True where a text read as harmless holds something of which the rules made nothing, and which may be a
 * danger, an opt-out or a stranger: a person reads it then.
 */
export function isDoubtful(sense: Sense, kind: ReplyKind): boolean {
  if (!harmless.has(kind)) return false
  return (
    hasStrangeBody(sense) ||
    hasStrangePart(sense, kind) ||
    hasStrangeRefusal(sense) ||
    (kind === 'yes' && isSaid(sense, 'but') && sense.words > 4)
  )
}

/** A child or a body is spoken of in words that nobody here knows. */
function hasStrangeBody(sense: Sense): boolean {
  const isOfBody = isNamed(sense, 'child', 'body', 'belly', 'stool', 'breast')
  const isAccounted = isSaid(sense, 'recovered') || sense.marks.some((mark) => mark.denied)
  return isOfBody && sense.unknownWords > 0 && !isAccounted
}

/** The texts are named, something is denied or ended, and nothing is told of reading them. */
function hasStrangeRefusal(sense: Sense): boolean {
  const isRefused = isNamed(sense, 'not', 'notPlus', 'notBack', 'ceased', 'fedUp', 'leaveMe')
  const isAboutReading = isNamed(sense, 'receive', 'see', 'wash', 'change', 'forgot')
  return isNamed(sense, 'texts') && isRefused && !isAboutReading
}

/** "Yes" and "done" with a part or a joint, and a strange word about it. */
function hasStrangePart(sense: Sense, kind: ReplyKind): boolean {
  if (kind !== 'yes' && kind !== 'done') return false
  const parts = said(sense, 'piece', 'edge', 'container')
  return parts.length > 0 && sense.unknownWords > 1 && sense.words > 5
}
