import { expect } from '@playwright/test'

type Seen = { way: 'received' | 'written'; body: string; byCarrier: boolean; at: string }

/** A household's phone on the practice shelf, held as the family holds it: read, and answered. */
export type Phone = {
  number: string
  /** Everything on it, oldest first. */
  texts(): Promise<Seen[]>
  /** Sends a text and waits for the desk's webhook to have it. */
  write(body: string): Promise<void>
  /** Waits for the next text that holds these words, after `count` received ones. */
  receives(words: RegExp, after?: number): Promise<Seen>
  received(): Promise<Seen[]>
}

export function phoneOf(phones: string, number: string): Phone {
  const texts = async () => {
    const response = await fetch(`${phones}/practice/phones/${encodeURIComponent(number)}`)
    return ((await response.json()) as { texts: Seen[] }).texts
  }
  const received = async () => (await texts()).filter(({ way }) => way === 'received')
  return {
    number,
    texts,
    received,
    async write(body) {
      const response = await fetch(`${phones}/practice/inbound`, {
        method: 'POST',
        headers: { 'content-type': 'application/json' },
        body: JSON.stringify({ from: number, body, wait: true }),
      })
      expect(response.ok).toBe(true)
    },
    async receives(words, after = 0) {
      let found: Seen | undefined
      await expect
        .poll(
          async () => {
            found = (await received()).slice(after).find(({ body }) => words.test(body))
            return (
              found?.body ??
              `${(await received())
                .slice(after)
                .map(({ body }) => body)
                .join(' | ')}`
            )
          },
          { timeout: 30_000 },
        )
        .toMatch(words)
      if (!found) throw new Error(`No text on ${number} has ${words}.`)
      return found
    },
  }
}
