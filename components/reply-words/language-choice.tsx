import Link from 'next/link'
import { languageNames, languages, type Language } from '@/lib/domain/language'

/** The languages of the desk as links, the open one marked. */
export function LanguageChoice({ language }: { language: Language }) {
  return (
    <nav aria-label="Languages" className="-my-1 flex flex-wrap gap-x-5 lg:block">
      {languages.map((one) => (
        <Link
          key={one}
          href={`/reply-words?language=${one}`}
          lang={one}
          aria-current={one === language ? 'page' : undefined}
          className={`block py-1 pointer-coarse:py-2.5 ${
            one === language
              ? 'font-semibold no-underline lg:-ml-3 lg:border-l-2 lg:border-water lg:pl-2.5'
              : 'plain-link decoration-rule'
          }`}
        >
          {languageNames[one]}
        </Link>
      ))}
    </nav>
  )
}
