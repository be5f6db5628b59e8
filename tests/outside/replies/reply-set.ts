import type { Language } from '@/lib/domain/language'
import type { Asked, ReplyKind } from '@/lib/domain/reply'

/** One text and what a person at the desk would take it to mean. */
export type LabelledReply = {
  text: string
  language: Language
  asked: Asked
  kind: ReplyKind
  minutes?: number
  dangerSign?: boolean
}

/**
 * Reads a set written as rows `[what was asked, kind, texts]`. Texts are parted by `|`; a figure
 * stands after `=>`, and `†` at the end of a text marks a general danger sign of illness.
 */
export function labelled(
  language: Language,
  rows: readonly (readonly [Asked, ReplyKind, string])[],
): LabelledReply[] {
  return rows.flatMap(([asked, kind, texts]) =>
    texts
      .split('|')
      .map((text) => text.trim().replace(/\s*\n\s*/g, ' '))
      .filter((text) => text !== '')
      .map((written) => {
        const [said = '', minutes] = written.split('=>').map((part) => part.trim())
        const isSign = said.endsWith('†')
        return {
          text: isSign ? said.slice(0, -1) : said,
          language,
          asked,
          kind,
          ...(minutes === undefined ? {} : { minutes: Number(minutes) }),
          ...(isSign ? { dangerSign: true } : {}),
        }
      }),
  )
}
