import type { PlannedStep } from './message'

/**
 * What becomes of a text is decided by the end of the number it goes to. Only `+1 … 555-01xx` numbers have a
 * fate of their own; 555-0100 to 555-0179 always work, so that a demo's households stay clean.
 */
export type Fate =
  | { kind: 'delivered' }
  | { kind: 'delivered late' }
  | { kind: 'sent only' }
  | { kind: 'undelivered'; errorCode: number }
  | { kind: 'failed'; errorCode: number }
  | { kind: 'delivered, then undelivered'; errorCode: number }
  | { kind: 'every other undelivered'; errorCode: number }

const fates: Record<string, Fate> = {
  '0190': { kind: 'undelivered', errorCode: 30003 },
  '0191': { kind: 'failed', errorCode: 30007 },
  '0192': { kind: 'sent only' },
  '0193': { kind: 'delivered late' },
  '0194': { kind: 'undelivered', errorCode: 30005 },
  '0195': { kind: 'delivered, then undelivered', errorCode: 30008 },
  '0197': { kind: 'undelivered', errorCode: 30006 },
  '0198': { kind: 'undelivered', errorCode: 30004 },
  '0199': { kind: 'every other undelivered', errorCode: 30003 },
}

/** 555-0196 is a landline that is refused at once (21614), before there is any fate. */
export function isFixedLine(number: string): boolean {
  return endingOf(number) === '0196'
}

export function fateOf(number: string): Fate {
  return fates[endingOf(number) ?? ''] ?? { kind: 'delivered' }
}

function endingOf(number: string): string | null {
  return /^\+1\d{3}555(01\d\d)$/.exec(number)?.[1] ?? null
}

export type Air = { sentAt: number; airMilliseconds: number; lateMilliseconds: number }

/** The steps from "sent" on. `earlier` is how many texts the number was sent before this one. */
export function stepsAfterSending(fate: Fate, air: Air, earlier: number): PlannedStep[] {
  const { sentAt, airMilliseconds } = air
  const sent: PlannedStep = { at: sentAt, to: 'sent' }
  const at = sentAt + airMilliseconds
  const delivered: PlannedStep = { at, to: 'delivered', landsOnHandset: true }
  switch (fate.kind) {
    case 'delivered':
      return [sent, delivered]
    case 'delivered late':
      return [sent, { ...delivered, at: sentAt + air.lateMilliseconds }]
    case 'sent only':
      return [{ ...sent, landsOnHandset: true }]
    case 'undelivered':
      return [sent, { at, to: 'undelivered', errorCode: fate.errorCode }]
    case 'failed':
      return [{ at: sentAt, to: 'failed', errorCode: fate.errorCode }]
    case 'delivered, then undelivered':
      return [
        sent,
        delivered,
        { at: at + airMilliseconds, to: 'undelivered', errorCode: fate.errorCode },
      ]
    case 'every other undelivered':
      return earlier % 2 === 1
        ? [sent, delivered]
        : [sent, { at, to: 'undelivered', errorCode: fate.errorCode }]
  }
}
