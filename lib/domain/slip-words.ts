import type { ReplyKind } from './reply'

type Bead = 'ring' | 'half' | 'full' | 'broken'
type Receipt = { receipt: Bead; receiptWords: string }

type TextState =
  | 'queued'
  | 'sending'
  | 'in doubt'
  | 'sent'
  | 'delivered'
  | 'failed'
  | 'dropped'
  | 'not confirmed'
  | 'received'
  | 'read'

function because(words: string, why: string): string {
  return why ? `${words}: ${why}` : words
}

/** What is known of a text's way, as a bead and in words. `going` is its hour as printed, while it waits. */
export function receiptOf(
  state: TextState,
  { why, going }: { why: string; going: string },
): Receipt {
  switch (state) {
    case 'queued':
      return { receipt: 'ring', receiptWords: because('goes', going) }
    case 'sending':
    case 'sent':
      return { receipt: 'half', receiptWords: 'on its way' }
    case 'in doubt':
      return { receipt: 'half', receiptWords: 'not known whether it went' }
    case 'delivered':
      return { receipt: 'full', receiptWords: 'arrived' }
    case 'failed':
      return { receipt: 'broken', receiptWords: because('failed', why) }
    case 'dropped':
      return { receipt: 'broken', receiptWords: because('not sent', why) }
    case 'not confirmed':
      return { receipt: 'broken', receiptWords: 'never confirmed' }
    case 'received':
      return { receipt: 'half', receiptWords: 'not read yet' }
    case 'read':
      return { receipt: 'full', receiptWords: 'read' }
  }
}

/** What a reply can be taken to mean, in words for staff. */
export const replyKindWords: Record<ReplyKind, string> = {
  done: 'done',
  'not-yet': 'not yet',
  slow: 'slow water',
  'no-flow': 'no water',
  'flow-figure': 'a bottle-fill time',
  broken: 'something broken',
  'odd-water': 'odd water',
  unwell: 'someone unwell',
  'need-part': 'a part is wanted',
  ask: 'a question',
  thanks: 'thanks',
  yes: 'yes',
  no: 'no',
  choice: 'a choice',
  stop: 'no more texts',
  start: 'texts again',
  help: 'help',
  'wrong-number': 'a wrong number',
  moved: 'the family moved',
  unclear: 'not clear: for a person to read',
}

/** `12 minutes`, to a tenth. */
export function spanWords(minutes: number): string {
  const rounded = Math.round(minutes * 10) / 10
  return `${rounded} ${rounded === 1 ? 'minute' : 'minutes'}`
}

/** What a reply was taken to mean, in words for staff: `read as: 12 minutes a bottle`. */
export function readingWords(reading: {
  kind: ReplyKind
  minutes: number | null
  choice: number | null
}): string {
  if (reading.minutes !== null) return `read as: ${spanWords(reading.minutes)} a bottle`
  if (reading.choice !== null) return `read as: choice ${reading.choice}`
  return `read as: ${replyKindWords[reading.kind]}`
}

export const replyKinds = Object.keys(replyKindWords) as readonly ReplyKind[]
