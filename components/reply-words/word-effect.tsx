import { languageNamesInEnglish, type Language } from '@/lib/domain/language'
import type { TriedReply } from '@/lib/schemas/reply-words'
import { Notice } from '../ui/notice'

type Effect = NonNullable<TriedReply['effect']>

function headOf({ looked, changed }: Effect, language: Language): string {
  const name = languageNamesInEnglish[language]
  if (looked === 0) return `There is no stored text in ${name} to try it on yet.`
  const texts = looked === 1 ? `the last text in ${name}` : `the last ${looked} texts in ${name}`
  if (changed === 0) return `None of ${texts} would be read otherwise.`
  return `Of ${texts}, ${changed} would be read otherwise.`
}

/** What the words on trial would have changed in texts that came before. */
export function WordEffect({ effect, language }: { effect: Effect; language: Language }) {
  const { changed, calmed, some } = effect
  return (
    <section aria-label="What it would change" className="mt-6 max-w-reading">
      <p className="font-semibold">{headOf(effect, language)}</p>
      {calmed > 0 && (
        <Notice tone="danger" title="A danger would no longer be seen" className="mt-2">
          {calmed === 1
            ? 'The text on top is read as a danger now.'
            : `The ${calmed} texts on top are read as a danger now.`}
        </Notice>
      )}
      <ul className="mt-1">
        {some.map(({ textId, body, before, after }) => (
          <li key={textId} className="border-b border-rule py-2">
            <p lang={language} className="font-mono">
              “{body}”
            </p>
            <p className="text-sm">
              <span className="text-faint">now {before};</span> then {after}
            </p>
          </li>
        ))}
      </ul>
      {changed > some.length && (
        <p className="mt-2 text-sm text-faint">And {changed - some.length} more.</p>
      )}
    </section>
  )
}
