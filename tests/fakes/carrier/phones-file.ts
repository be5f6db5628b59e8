import { readFileSync, statSync } from 'node:fs'

/** A phone on the shelf, as FAKE_PHONES_FILE lists them. */
export type ShelfPhone = {
  number: string
  label: string
  language: string
  /** Zone the phone shows its times in; the machine's own when empty. */
  timeZone: string
}

/** Reads the shelf again whenever its file changed; a missing or half-written file leaves the last one standing. */
export function createShelf(file: string): () => ShelfPhone[] {
  let phones: ShelfPhone[] = []
  let seen = ''
  return () => {
    if (file === '') return phones
    const stat = statSync(file, { throwIfNoEntry: false })
    const mark = stat ? `${stat.ino}:${stat.mtimeMs}:${stat.size}` : ''
    if (mark === '' || mark === seen) return phones
    const read = readPhones(file)
    if (read) {
      phones = read
      seen = mark
    }
    return phones
  }
}

function readPhones(file: string): ShelfPhone[] | null {
  try {
    const parsed: unknown = JSON.parse(readFileSync(file, 'utf8'))
    if (!Array.isArray(parsed)) return null
    return parsed.flatMap((one: Partial<ShelfPhone> | null) =>
      typeof one?.number === 'string'
        ? [
            {
              number: one.number,
              label: one.label ?? one.number,
              language: one.language ?? '',
              timeZone: one.timeZone ?? '',
            },
          ]
        : [],
    )
  } catch {
    return null
  }
}
