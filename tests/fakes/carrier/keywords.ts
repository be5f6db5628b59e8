import type { Carrier } from './carrier'
import { newSid } from './identifiers'
import { countSegments } from './segments'

export type Keyword = 'STOP' | 'START' | 'HELP'

// The carrier's published defaults. Only a message of one word counts: "stop please" does not.
const stopWords = ['STOP', 'UNSUBSCRIBE', 'END', 'QUIT', 'STOPALL', 'REVOKE', 'OPTOUT', 'CANCEL']
const startWords = ['START', 'YES', 'UNSTOP']
const helpWords = ['HELP', 'INFO']
// On a toll-free number the network itself answers: YES does not bring anybody back, and only STOP stops.
const tollFreeStopWords = ['STOP']
const tollFreeStartWords = ['START', 'UNSTOP']

export function isTollFree(sender: string): boolean {
  return /^\+18(00|33|44|55|66|77|88)\d{7}$/.test(sender)
}

export function keywordOf(body: string, sender: string): Keyword | null {
  const word = body.trim().toUpperCase()
  const tollFree = isTollFree(sender)
  if ((tollFree ? tollFreeStopWords : stopWords).includes(word)) return 'STOP'
  if ((tollFree ? tollFreeStartWords : startWords).includes(word)) return 'START'
  return helpWords.includes(word) ? 'HELP' : null
}

export function optedOut(carrier: Carrier, sender: string, phone: string): boolean {
  return carrier.state.optOuts[`${sender} ${phone}`] !== undefined
}

const answers: Record<Keyword, string> = {
  STOP: 'You are unsubscribed and will get no more texts from this number. Text START to begin again.',
  START: 'You are subscribed again to texts from this number. Text STOP to end them.',
  HELP: 'Text STOP to end texts from this number.',
}

/** Acts on a keyword as the carrier does by itself, before and apart from anything the desk does. */
export function obeyKeyword(
  carrier: Carrier,
  said: { keyword: Keyword; phone: string; sender: string },
): void {
  const { keyword, phone, sender } = said
  const pair = `${sender} ${phone}`
  const blocked = optedOut(carrier, sender, phone)
  if (keyword === 'STOP') carrier.state.optOuts[pair] ??= carrier.clock.now()
  if (keyword === 'START') delete carrier.state.optOuts[pair]
  carrier.changed()
  if (answersTo(keyword, blocked)) answerByCarrier(carrier, said)
}

/** A second STOP, a START nobody needed and a HELP from someone opted out get no answer. */
function answersTo(keyword: Keyword, blocked: boolean): boolean {
  return keyword === 'START' ? blocked : !blocked
}

function answerByCarrier(
  carrier: Carrier,
  said: { keyword: Keyword; phone: string; sender: string },
): void {
  const body = answers[said.keyword]
  carrier.state.handsetTexts.push({
    way: 'received',
    phone: said.phone,
    other: said.sender,
    sid: newSid('SM'),
    body,
    segments: countSegments(body),
    at: carrier.clock.now(),
    byCarrier: true,
    media: 0,
  })
}
