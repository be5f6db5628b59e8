'use client'

import Link from 'next/link'
import { usePathname } from 'next/navigation'
import { useEffect, useRef } from 'react'

export type Word = {
  name: string
  href: string
  /** Other paths that belong to this word, as `/tickets` belongs to Shift. */
  also?: readonly string[]
}

function isUnder(pathname: string, href: string): boolean {
  return pathname === href || pathname.startsWith(`${href}/`)
}

/** Brings the word of this page into the row's middle, where the row is wider than the screen. */
function useHereInView(pathname: string) {
  const row = useRef<HTMLElement>(null)
  useEffect(() => {
    const here = row.current?.querySelector<HTMLElement>('[aria-current]')
    if (!row.current || !here) return
    row.current.scrollLeft = here.offsetLeft - (row.current.clientWidth - here.offsetWidth) / 2
  }, [pathname])
  return row
}

/** The words of the head; on a phone one row of their own that scrolls sideways and fades where it goes on. */
export function HeadWords({ words }: { words: readonly Word[] }) {
  const pathname = usePathname()
  const row = useHereInView(pathname)
  return (
    <nav
      ref={row}
      aria-label="Pages"
      className="relative flex gap-x-5.5 self-end max-lg:order-last max-lg:-mr-edge max-lg:w-full max-lg:[scrollbar-width:none] max-lg:overflow-x-auto max-lg:[mask-image:linear-gradient(to_right,transparent,black_1.5rem,black_calc(100%-2.5rem),transparent)] max-lg:pl-[calc(var(--lead-x)-var(--fall-x)+0.75rem)]"
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
