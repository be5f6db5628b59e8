import type { Carrier } from './carrier'
import { json, type Answer } from './exchange'
import type { Message } from './message'
import { accountPath, messageResource } from './resources'

const defaultPageSize = 50
const largestPageSize = 1000

/** `GET …/Messages.json`: newest first, filtered, in pages that hold still while new messages come in. */
export function listMessages(carrier: Carrier, query: URLSearchParams): Answer {
  const size = pageSize(query)
  const page = Math.max(0, Math.trunc(Number(query.get('Page') ?? 0)) || 0)
  const newestFirst = [...carrier.state.messages].reverse()
  const matching = newestFirst.filter((message) => matches(message, query))
  const start = startOf(matching, { query, page, size })
  const shown = matching.slice(start, start + size)
  const last = shown.at(-1)
  const more = last !== undefined && start + size < matching.length
  const pageUri = (number: number, token: string | null) =>
    uri(carrier, query, { size, page: number, token })
  return json(200, {
    end: page * size + Math.max(0, shown.length - 1),
    first_page_uri: pageUri(0, null),
    next_page_uri: more ? pageUri(page + 1, `PA${last.sid}`) : null,
    page,
    page_size: size,
    previous_page_uri: page > 0 ? pageUri(page - 1, `PB${shown[0]?.sid ?? ''}`) : null,
    start: page * size,
    messages: shown.map((message) => messageResource(carrier, message)),
    uri: pageUri(page, query.get('PageToken')),
  })
}

function pageSize(query: URLSearchParams): number {
  const asked = Math.trunc(Number(query.get('PageSize') ?? defaultPageSize))
  return Number.isFinite(asked) && asked > 0 ? Math.min(asked, largestPageSize) : defaultPageSize
}

/** A token names the message a page ended after (PA) or began with (PB); without one, pages are counted. */
function startOf(
  matching: readonly Message[],
  asked: { query: URLSearchParams; page: number; size: number },
): number {
  const token = asked.query.get('PageToken') ?? ''
  const index = matching.findIndex((message) => message.sid === token.slice(2))
  if (index < 0) return asked.page * asked.size
  return token.startsWith('PB') ? Math.max(0, index - asked.size) : index + 1
}

const dayMilliseconds = 86_400_000

function matches(message: Message, query: URLSearchParams): boolean {
  const to = query.get('To')
  const from = query.get('From')
  if (to && message.to !== to) return false
  if (from && message.from !== from) return false
  return sentInside(message.sentAt, query)
}

/** A date alone means its whole day in UTC. What was not sent yet has no date and matches no date filter. */
function sentInside(sentAt: number | null, query: URLSearchParams): boolean {
  const on = instant(query.get('DateSent'))
  const until = instant(query.get('DateSent<'))
  const since = instant(query.get('DateSent>'))
  if (!on && !until && !since) return true
  if (sentAt === null) return false
  if (on && (sentAt < on.from || sentAt >= on.from + dayMilliseconds)) return false
  if (until && sentAt > until.to) return false
  return !since || sentAt >= since.from
}

function instant(text: string | null): { from: number; to: number } | null {
  if (!text) return null
  const from = Date.parse(text)
  if (Number.isNaN(from)) return null
  const wholeDay = /^\d{4}-\d\d-\d\d$/.test(text)
  return { from, to: wholeDay ? from + dayMilliseconds - 1 : from }
}

function uri(
  carrier: Carrier,
  query: URLSearchParams,
  page: { size: number; page: number; token: string | null },
): string {
  const kept = new URLSearchParams()
  for (const name of ['To', 'From', 'DateSent', 'DateSent<', 'DateSent>']) {
    const value = query.get(name)
    if (value) kept.set(name, value)
  }
  kept.set('PageSize', String(page.size))
  kept.set('Page', String(page.page))
  if (page.token) kept.set('PageToken', page.token)
  return `${accountPath(carrier)}/Messages.json?${kept}`
}
