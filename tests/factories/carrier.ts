import type { Carrier, ListedText, SendOutcome } from '@/lib/gateways/carrier'

type Sent = { to: string; body: string; receiptUrl: string }

/** Stands in for the carrier at its own border: keeps what was sent and answers as told. */
export type RecordingCarrier = Carrier & {
  sent: Sent[]
  /** What `list` answers. */
  listed: ListedText[]
  /** The next `send` ends like this; later ones are accepted again. */
  answerNext(outcome: SendOutcome): void
}

export function recordingCarrier(): RecordingCarrier {
  const sent: Sent[] = []
  const listed: ListedText[] = []
  const answers: SendOutcome[] = []
  return {
    sent,
    listed,
    answerNext: (outcome) => answers.push(outcome),
    send(text) {
      sent.push(text)
      const sid = `SM${sent.length.toString(16).padStart(32, '0')}`
      return Promise.resolve(answers.shift() ?? { kind: 'accepted', sid, status: 'queued' })
    },
    list: ({ to, from, limit }) =>
      Promise.resolve(
        listed
          .filter((text) => (!to || text.to === to) && (!from || text.from === from))
          .slice(0, limit),
      ),
  }
}
