/** A letter as it arrived; `text` and `html` are decoded. */
export type Letter = {
  id: number
  receivedAt: string
  messageId: string
  from: string
  /** The envelope's recipients: who it really went to. */
  to: string[]
  subject: string
  text: string
  html: string
}

export type Mailbox = { letters: Letter[]; nextId: number }

/** A long practice run must not fill the memory. */
const keptLetters = 500

export function createMailbox(): Mailbox {
  return { letters: [], nextId: 1 }
}

export function keepLetter(mailbox: Mailbox, letter: Omit<Letter, 'id'>): void {
  mailbox.letters.push({ id: mailbox.nextId++, ...letter })
  if (mailbox.letters.length > keptLetters) mailbox.letters.shift()
}
