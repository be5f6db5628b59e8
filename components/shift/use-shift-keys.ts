'use client'

import { useEffect, type RefObject } from 'react'

const rowLinks = 'a[data-shift-row]'

function move(within: HTMLElement | null, by: 1 | -1): void {
  const links = [...(within?.querySelectorAll<HTMLAnchorElement>(rowLinks) ?? [])]
  const at = links.findIndex((link) => link === document.activeElement)
  const next = at < 0 ? (by === 1 ? 0 : links.length - 1) : at + by
  links[next]?.focus()
}

function isWriting(target: EventTarget | null): boolean {
  return target instanceof HTMLElement && target.matches('input, textarea, select')
}

/** j and k go down and up the rows, t takes the next, / goes to the field that finds. */
export function useShiftKeys({
  rows,
  find,
  takeNext,
  enabled,
}: {
  rows: RefObject<HTMLElement | null>
  find: RefObject<HTMLInputElement | null>
  takeNext: () => void
  /** Single letters are in the way of who speaks to the computer: they can be turned off. */
  enabled: boolean
}): void {
  useEffect(() => {
    if (!enabled) return
    const onKey = (event: KeyboardEvent) => {
      if (event.ctrlKey || event.metaKey || event.altKey || isWriting(event.target)) return
      if (event.key === 'j') move(rows.current, 1)
      else if (event.key === 'k') move(rows.current, -1)
      else if (event.key === 't') takeNext()
      else if (event.key === '/') find.current?.focus()
      else return
      event.preventDefault()
    }
    window.addEventListener('keydown', onKey)
    return () => window.removeEventListener('keydown', onKey)
  }, [rows, find, takeNext, enabled])
}
