import type { Carrier } from './carrier'
import { errorMessage } from './error-catalogue'
import { phoneLedger, type PhoneLedger } from './handset'
import { optedOut } from './keywords'
import { escapeHtml, pageAddress, phoneTime, spacedNumber } from './page-text'
import { phoneOf } from './page-view'
import type { ShelfPhone } from './phones-file'

/** A phone remembers this many texts; older ones are left out of the page, not of the ledger. */
const shownTexts = 80

/** One open phone: earpiece, screen with the texts, a line to write, keys. */
export function phoneHtml(carrier: Carrier, number: string, open: readonly string[]): string {
  const phone = phoneOf(carrier, number)
  const ledger = phoneLedger(carrier, number)
  const id = `phone-${number.slice(1)}`
  const label = escapeHtml(phone.label)
  const others = open.filter((other) => other !== number)
  const under = phone.label === number ? '' : `<span class="mono">${spacedNumber(number)}</span>`
  return `<article class="phone" id="${id}" data-key="${number}" aria-labelledby="${id}-name">
<div class="above"><h2 id="${id}-name">${phone.label === number ? spacedNumber(number) : label}</h2>${under}
<a class="back" data-go href="${escapeHtml(pageAddress(others))}" aria-label="Put back ${label}">Put back</a></div>
<div class="body">${earpiece}
<div class="screen" role="log" tabindex="0" aria-label="Texts on ${label}"><ol${languageOf(phone)} data-list>${threadHtml(ledger, phone)}</ol></div>
<form class="write" method="post" action="/write" data-write>
<input type="hidden" name="from" value="${number}">${hiddenOpen(open)}
<label for="${id}-text">Text from ${label}</label>
<textarea id="${id}-text" name="body" rows="2" maxlength="1600"${languageOf(phone)} required></textarea>
<button>Send</button></form>${keypad}</div>
<ul class="notes" data-list>${notesHtml(carrier, ledger)}</ul></article>`
}

export function hiddenOpen(open: readonly string[]): string {
  return open.map((number) => `<input type="hidden" name="open" value="${number}">`).join('')
}

function languageOf(phone: ShelfPhone): string {
  return phone.language === '' ? '' : ` lang="${escapeHtml(phone.language)}"`
}

function threadHtml(ledger: PhoneLedger, phone: ShelfPhone): string {
  const texts = ledger.texts.slice(-shownTexts)
  if (texts.length === 0) return '<li class="none" data-key="none" lang="en">No texts yet.</li>'
  let day = ''
  return texts
    .map((text) => {
      const time = phoneTime(text.at, phone.timeZone)
      const first = time.day === day ? '' : dayHtml(time.day)
      day = time.day
      const who = text.way === 'written' ? 'written here' : text.byCarrier ? 'the carrier' : 'desk'
      const kind = text.way === 'written' ? 'written' : text.byCarrier ? 'carrier' : 'received'
      const pictures = text.media > 0 ? `<em lang="en">with ${text.media} picture</em>` : ''
      return `${first}<li class="text ${kind}" data-key="${text.sid}"><span class="when" lang="en">${who} ${time.hour}</span><p>${escapeHtml(text.body)}</p>${pictures}</li>`
    })
    .join('')
}

function dayHtml(day: string): string {
  return `<li class="day" data-key="${day}" lang="en">${day}</li>`
}

/** What the phone itself cannot show: texts that did not reach it, and a stop the carrier keeps. */
function notesHtml(carrier: Carrier, ledger: PhoneLedger): string {
  const notes: string[] = []
  const senders = carrier.settings.senders
  if (senders.some((sender) => optedOut(carrier, sender, ledger.number))) {
    notes.push('The carrier blocks texts to this phone since it wrote STOP.')
  }
  const lost = ledger.notArrived.filter((text) => text.errorCode !== null)
  const last = lost.at(-1)
  if (last) {
    const what = lost.length === 1 ? '1 text did' : `${lost.length} texts did`
    const why = (errorMessage(last.errorCode) ?? '').toLowerCase()
    notes.push(`${what} not arrive; the last for ${last.errorCode}, ${why}.`)
  }
  return notes.map((note) => `<li data-key="${escapeHtml(note)}">${escapeHtml(note)}</li>`).join('')
}

const earpiece =
  '<svg class="ear" viewBox="0 0 120 16" width="120" height="16" aria-hidden="true" focusable="false"><path d="M48 5h24M44 9h32M48 13h24"/></svg>'

const keys = ['1', '2abc', '3def', '4ghi', '5jkl', '6mno', '7pqrs', '8tuv', '9wxyz', '*', '0', '#']

/** Drawn, not pressed: the texts are typed on one's own keyboard. */
const keypad = `<svg class="keys" viewBox="0 0 264 132" aria-hidden="true" focusable="false">${keys
  .map((key, index) => {
    const x = 1 + (index % 3) * 90
    const y = 1 + Math.floor(index / 3) * 33
    const letters = key.slice(1)
    const name = `<text class="digit" x="${x + (letters ? 18 : 41)}" y="${y + 18}" text-anchor="middle">${key[0]}</text>`
    const small = letters
      ? `<text class="letters" x="${x + 34}" y="${y + 18}">${letters}</text>`
      : ''
    return `<rect x="${x}" y="${y}" width="82" height="26" rx="2"/>${name}${small}`
  })
  .join('')}</svg>`
