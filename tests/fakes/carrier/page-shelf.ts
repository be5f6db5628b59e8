import type { Carrier } from './carrier'
import { phoneSummaries, type PhoneSummary } from './handset'
import { hiddenOpen } from './page-phone'
import { escapeHtml, languageNames, pageAddress, phoneTime, spacedNumber } from './page-text'
import { phoneOf, type PageView } from './page-view'
import type { ShelfPhone } from './phones-file'

const latelyShown = 4

/** The shelf: phones that rang lately, a way to find one, all of them, and any other number. */
export function shelfHtml(carrier: Carrier, view: PageView): string {
  const summaries = phoneSummaries(carrier)
  const known = new Map(summaries.map((summary) => [summary.number, summary]))
  const wanted = view.find.trim().toLowerCase()
  const phones = carrier.shelf().filter((phone) => searchText(phone).includes(wanted))
  const item = (phone: ShelfPhone) => itemHtml(phone, known.get(phone.number) ?? null, view)
  const lately = summaries.slice(0, latelyShown).map((one) => item(phoneOf(carrier, one.number)))
  return `<section class="shelf" aria-labelledby="shelf-name">
<h2 id="shelf-name">The shelf</h2>
<div class="lately" id="lately-part"${lately.length === 0 ? ' hidden' : ''}><h3>Used lately</h3><ul id="lately" data-list>${lately.join('')}</ul></div>
<form class="find" role="search" method="get" action="/">${hiddenOpen(view.open)}
<label for="find">Find a phone</label><input id="find" name="find" type="search" autocomplete="off" value="${escapeHtml(view.find)}"></form>
<p class="count" id="found" role="status">${countText(phones.length)}</p>
<ul id="all" data-list>${phones.map(item).join('')}</ul>
<form class="any" method="get" action="/" data-any>${hiddenOpen(view.open)}
<label for="any">Any other number</label><div class="side"><input id="any" name="open" type="tel" autocomplete="off" placeholder="+12125550123"${view.refused ? ' aria-invalid="true" aria-describedby="refused"' : ''}>
<button class="line">Open</button></div>
${view.refused ? `<p class="wrong" id="refused">No phone can have the number ${escapeHtml(view.refused)}. Write it with + and the country.</p>` : ''}</form>
</section>`
}

export function countText(count: number): string {
  return count === 1 ? '1 phone' : `${count} phones`
}

function searchText(phone: ShelfPhone): string {
  const language = languageNames[phone.language] ?? phone.language
  return `${phone.label} ${phone.number} ${spacedNumber(phone.number)} ${language}`.toLowerCase()
}

function itemHtml(phone: ShelfPhone, summary: PhoneSummary | null, view: PageView): string {
  const isOpen = view.open.includes(phone.number)
  const address = isOpen
    ? `#phone-${phone.number.slice(1)}`
    : `${pageAddress([...view.open, phone.number])}#phone-${phone.number.slice(1)}`
  const named = phone.label !== phone.number
  const name = escapeHtml(named ? phone.label : spacedNumber(phone.number))
  const language = languageNames[phone.language] ?? phone.language
  const facts = [language, named ? spacedNumber(phone.number) : ''].filter((fact) => fact !== '')
  const lines = [facts.join(' · '), trafficText(phone, summary)].filter((line) => line !== '')
  const below = lines.map((line) => `<span>${escapeHtml(line)}</span>`).join('')
  return `<li data-key="${phone.number}" data-find="${escapeHtml(searchText(phone))}"><a data-go href="${escapeHtml(address)}"${isOpen ? ' aria-current="true"' : ''}><b>${name}</b>${isOpen ? ' <i>open</i>' : ''}${below}</a></li>`
}

function trafficText(phone: ShelfPhone, summary: PhoneSummary | null): string {
  if (!summary) return ''
  const { day, hour } = phoneTime(summary.lastAt, phone.timeZone)
  return `${summary.received} in, ${summary.written} out · ${day} ${hour}`
}
