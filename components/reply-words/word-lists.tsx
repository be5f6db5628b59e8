import type { ReplyWords } from '@/lib/schemas/reply-words'

type WordListsProps = Pick<ReplyWords, 'language' | 'groups'>
type List = ReplyWords['groups'][number]['lists'][number]

/** A list longer than this is folded behind its first words. */
const shownAtFirst = 12

/** Every word that came with the desk, by what it is taken for; each heading opens its lists. */
export function WordLists({ language, groups }: WordListsProps) {
  return (
    <div className="mt-3 border-t border-ink">
      {groups.map(({ name, lists }) => (
        <details key={name} className="border-b border-rule open:border-ink">
          <summary className="py-2.5">
            <h3 className="inline font-semibold">{name}</h3>{' '}
            <span className="text-sm text-faint">{countOf(lists)}</span>
          </summary>
          <dl className="mb-4 border-t border-rule">
            {lists.map((list) => (
              <ListRow key={list.name} list={list} language={language} />
            ))}
          </dl>
        </details>
      ))}
    </div>
  )
}

function countOf(lists: readonly List[]): string {
  const words = lists.reduce((sum, list) => sum + list.words.length + list.more, 0)
  return `${words.toLocaleString('en')} ${words === 1 ? 'word' : 'words'}`
}

function ListRow({ list, language }: { list: List; language: ReplyWords['language'] }) {
  const first = list.words.slice(0, shownAtFirst)
  const rest = list.words.slice(shownAtFirst)
  return (
    <div className="grid gap-x-4 border-b border-rule py-2 last:border-0 md:grid-cols-[13rem_minmax(0,1fr)]">
      <dt className="text-sm font-semibold">{list.name}</dt>
      <dd lang={language} className="min-w-0 font-mono text-sm">
        {first.join(', ')}
        {rest.length > 0 && (
          <details>
            <summary lang="en" className="py-1 font-sans text-faint pointer-coarse:py-2.5">
              {rest.length} more
            </summary>
            {rest.join(', ')}
            {list.more > 0 && (
              <span lang="en" className="font-sans text-faint">
                {' '}
                and {list.more} that are not listed
              </span>
            )}
          </details>
        )}
      </dd>
    </div>
  )
}
