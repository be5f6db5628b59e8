import type { Carrier } from '@/lib/gateways/carrier'
import type { Random } from './random'

export type Carried = { sid: string; to: string; body: string; attemptId: string }

/**
 * A carrier without a network for building the demo: takes every text and hands each on to `carried`,
 * where its receipt and the family's answer come from.
 */
export function virtualCarrier(random: Random, carried: (text: Carried) => void): Carrier {
  return {
    send({ to, body, receiptUrl }) {
      const hex = () => random.whole(0, 0xffff).toString(16).padStart(4, '0')
      const sid = `SM${Array.from({ length: 8 }, hex).join('')}`
      carried({ sid, to, body, attemptId: new URL(receiptUrl).searchParams.get('a') ?? '' })
      return Promise.resolve({ kind: 'accepted', sid, status: 'queued' })
    },
    list: () => Promise.resolve([]),
  }
}
