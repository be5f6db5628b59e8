import Link from 'next/link'
import { HeadWords, type Word } from './head-words'
import { SignOut } from './sign-out'

type HeadProps = {
  /** The pages this person may open, in order. */
  words: readonly Word[]
  person: { name: string; languages: readonly string[] } | null
  /** Where the wordmark leads. */
  home?: string
}

/** The head of every staff page: wordmark with the fall line below it, words, person. */
export function Head({ words, person, home = '/' }: HeadProps) {
  return (
    <header className="relative border-b border-rule print:hidden">
      <a
        href="#sheet"
        className="absolute top-2 left-lead z-10 -translate-y-20 bg-sheet px-4 py-3 text-ink focus:translate-y-0"
      >
        Skip to the sheet
      </a>
      <div className="flex flex-wrap items-baseline gap-x-8 pt-4 pr-edge pl-[calc(var(--fall-x)-0.75rem)] md:pt-5 lg:flex-nowrap">
        <Link
          href={home}
          className="-my-1 py-1 font-title text-xl font-semibold tracking-[-0.01em] no-underline"
        >
          Rillpost
        </Link>
        <HeadWords words={words} />
        {person && (
          <div className="ml-auto flex items-baseline gap-4 text-right text-sm text-faint md:text-base">
            <span className="max-lg:hidden">
              {[person.name, person.languages.join(', ')].filter(Boolean).join(' · ')}
            </span>
            <span className="lg:hidden">{person.name}</span>
            <SignOut />
          </div>
        )}
      </div>
      <span
        aria-hidden
        className="absolute -bottom-px left-fall -ml-px h-[calc(100%-3rem)] w-0.5 bg-water"
      />
    </header>
  )
}
