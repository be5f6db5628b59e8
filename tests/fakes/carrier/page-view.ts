import type { Carrier } from './carrier'
import { isPossibleNumber } from './create-checks'
import { pageAddress } from './page-text'
import type { ShelfPhone } from './phones-file'

/** What the address of the page asks to see. */
export type PageView = {
  open: string[]
  find: string
  /** Something typed as a number that no phone can have; empty when there was none. */
  refused: string
}

const mostOpen = 12

export function readView(query: URLSearchParams): PageView {
  // An unescaped + in an address arrives as a space.
  const asked = query
    .getAll('open')
    .map((text) => text.trim())
    .filter((text) => text !== '')
  const numbers = asked.map(plainNumber)
  const open = [...new Set(numbers.filter(isPossibleNumber))].slice(0, mostOpen)
  const refused = asked.find((_text, index) => !isPossibleNumber(numbers[index] ?? '')) ?? ''
  return { open, find: query.get('find') ?? '', refused }
}

/** Ten digits without a country are a number of the programme's own, which are all under +1 in practice. */
function plainNumber(text: string): string {
  const digits = text.replace(/\D/g, '')
  return digits.length === 10 && !text.startsWith('+') ? `+1${digits}` : `+${digits}`
}

/** The one address of a view, when it was asked for by another; null when it was asked for by that one. */
export function tidyAddress(query: URLSearchParams, view: PageView): string | null {
  const asked = query.getAll('open')
  const tidy = view.refused !== '' || asked.join() === view.open.join()
  return tidy ? null : pageAddress(view.open)
}

/** The phone as the shelf knows it, or a nameless one for a number that was typed. */
export function phoneOf(carrier: Carrier, number: string): ShelfPhone {
  const known = carrier.shelf().find((phone) => phone.number === number)
  return known ?? { number, label: number, language: '', timeZone: '' }
}
