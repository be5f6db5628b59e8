'use client'

import Link from 'next/link'
import { usePathname } from 'next/navigation'

export type Word = {
  name: string
  href: string
  /** Other paths that belong to this word, as `/tickets` belongs to Shift. */
  also?: readonly string[]
}

function isUnder(pathname: string, href: string): boolean {
  return pathname === href || pathname.startsWith(`${href}/`)
}

/** The words of the head; on a phone one row of their own that scrolls sideways. */
export function HeadWords({ words }: { words: readonly Word[] }) {
  const pathname = usePathname()
  return (
    <nav
      aria-label="Pages"
      className="flex gap-x-5.5 self-end max-lg:order-last max-lg:-mr-edge max-lg:w-full max-lg:[scrollbar-width:none] max-lg:overflow-x-auto max-lg:pl-[calc(var(--lead-x)-var(--fall-x)+0.75rem)]"
    >
      {words.map((word) => {
        const here = [word.href, ...(word.also ?? [])].some((href) => isUnder(pathname, href))
        return (
          <Link
            key={word.href}
            href={word.href}
            aria-current={here ? 'page' : undefined}
            className={`-mb-px border-b-2 pt-2.5 pb-2.5 whitespace-nowrap no-underline -outline-offset-3 ${
              here
                ? 'border-water font-semibold text-ink'
                : 'border-transparent text-faint hover:text-ink'
            }`}
          >
            {word.name}
          </Link>
        )
      })}
    </nav>
  )
}
