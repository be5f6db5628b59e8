import { refusal } from './error-catalogue'
import type { Answer, Outcome } from './exchange'
import type { Fault } from './faults'
import { refusalAnswer } from './resources'

/** A page as a proxy in front of the carrier would send it: no JSON, no code. */
const htmlUnavailable: Answer = {
  status: 503,
  headers: { 'Content-Type': 'text/html' },
  body: '<html><body><h1>503 Service Unavailable</h1></body></html>',
}

/**
 * Answers a call wrongly. The kinds that end in `-after` do the call first, so that something is stored
 * although the client hears of a failure: the case that a desk must not answer with a second text.
 */
export async function withRestFault(fault: Fault, answer: () => Answer): Promise<Outcome> {
  switch (fault.kind) {
    case 'too-many':
      return refusalAnswer(refusal(20429), { 'Retry-After': String(fault.retryAfterSeconds) })
    case 'error-500-before':
      return refusalAnswer(refusal(20500))
    case 'error-500-after':
      answer()
      return refusalAnswer(refusal(20500))
    case 'unavailable-503-before':
      return htmlUnavailable
    case 'unavailable-503-after':
      answer()
      return htmlUnavailable
    case 'hang-before':
      return 'hang'
    case 'hang-after':
      answer()
      return 'hang'
    case 'reset-before':
      return 'reset'
    case 'reset-after':
      answer()
      return 'reset'
    case 'slow': {
      const late = answer()
      await new Promise((resolve) => {
        setTimeout(resolve, fault.delayMilliseconds)
      })
      return late
    }
    default:
      return answer()
  }
}
