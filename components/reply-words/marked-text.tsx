import type { Language } from '@/lib/domain/language'
import type { TriedReply } from '@/lib/schemas/reply-words'

type Mark = TriedReply['found'][number]
type Stretch = { from: number; to: number; marks: Mark[] }
type MarkedTextProps = { tried: Pick<TriedReply, 'words' | 'found'>; language: Language }

/** The words of a text in stretches: each that means something by itself, every other word alone. */
function stretchesOf({ words, found }: MarkedTextProps['tried']): Stretch[] {
  const stretches: Stretch[] = []
  let at = 0
  while (at < words.length) {
    const from = at
    const marks = found.filter((mark) => mark.from === from)
    at = Math.max(from + 1, ...marks.map(({ to }) => to))
    stretches.push({ from, to: at, marks })
  }
  return stretches
}

/** A text as the desk sees it, with what it takes each word for written underneath. */
export function MarkedText({ tried, language }: MarkedTextProps) {
  return (
    <p
      lang={language}
      className="flex flex-wrap gap-x-3 gap-y-3 border border-rule bg-sheet px-3 py-3 font-mono"
    >
      {stretchesOf(tried).map(({ from, to, marks }) => {
        const words = tried.words.slice(from, to)
        return (
          <StretchOf key={from} text={words.map(({ text }) => text).join(' ')} marks={marks}>
            {words.some(({ known, kind }) => kind === 'word' && !known)}
          </StretchOf>
        )
      })}
    </p>
  )
}

function StretchOf({ text, marks, children }: { text: string; marks: Mark[]; children: boolean }) {
  const isUnknown = children && marks.length === 0
  const isDenied = marks.length > 0 && marks.every(({ denied }) => denied)
  const line = isUnknown ? 'border-b-2 border-dotted border-clay' : ''
  return (
    <span className="inline-flex max-w-full flex-col">
      <span
        className={`self-start ${line} ${marks.length > 0 ? 'border-b-2 border-water font-semibold' : ''} ${
          isDenied ? 'line-through decoration-clay decoration-2' : ''
        }`}
      >
        {text}
      </span>
      {marks.map((mark) => (
        <span key={mark.meaning} lang="en" className="font-sans text-xs text-faint">
          {mark.denied && <strong className="font-semibold text-clay">denied: </strong>}
          {mark.meaning}
          {mark.guessed && ', guessed'}
          {mark.added && <em className="text-ink">, added</em>}
        </span>
      ))}
      {isUnknown && (
        <span lang="en" className="font-sans text-xs text-clay">
          not known
        </span>
      )}
    </span>
  )
}
