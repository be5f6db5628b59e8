import type { Carrier } from './carrier'
import { phoneHtml } from './page-phone'
import { shelfHtml } from './page-shelf'
import { escapeHtml, phoneTime, spacedNumber } from './page-text'
import type { PageView } from './page-view'

const troublesShown = 5

export function pageHtml(carrier: Carrier, view: PageView): string {
  const sender = spacedNumber(carrier.settings.senders[0] ?? '')
  const phones = view.open.map((number) => phoneHtml(carrier, number, view.open)).join('')
  return `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><title>Practice phones · Rillpost</title>
<meta name="viewport" content="width=device-width, initial-scale=1">
<meta name="color-scheme" content="light dark">
<link rel="icon" href="/icon.svg" type="image/svg+xml"><link rel="stylesheet" href="/style.css"><script src="/script.js" defer></script></head>
<body data-version="${carrier.version}"><header><p class="mark">Rillpost</p><p class="where">practice only: nothing reaches a real phone</p></header>
<main${view.open.length > 0 ? ' class="taken"' : ''}><div class="fall" aria-hidden="true"></div>
${shelfHtml(carrier, view)}
<section class="bench" aria-labelledby="bench-name"><h1 id="bench-name">Practice phones</h1>
<p class="lead">Read and answer as a household would. The desk texts from <span class="mono">${sender}</span>.</p>
<div id="phones" data-list data-keep>${phones}</div>
<p class="hint" id="hint"${view.open.length > 0 ? ' hidden' : ''}>Take a phone from the shelf to see what the desk sent it.</p>
${troubleHtml(carrier)}</section></main></body></html>`
}

/** What went wrong between the carrier and the desk: the carrier's own debugger, newest first. */
function troubleHtml(carrier: Carrier): string {
  const entries = carrier.state.debuggerLog.slice(-troublesShown).reverse()
  const rows = entries.map((entry) => {
    const { day, hour } = phoneTime(entry.at, '')
    const words = `${day} ${hour} · ${entry.code}, ${entry.text}. ${entry.detail}`
    return `<li data-key="${entry.at}-${entry.code}-${entry.sid ?? ''}">${escapeHtml(words)}</li>`
  })
  const hidden = rows.length === 0 ? ' hidden' : ''
  return `<section class="trouble" id="trouble"${hidden} aria-labelledby="trouble-name"><h2 id="trouble-name">Between carrier and desk</h2><ul data-list id="troubles">${rows.join('')}</ul></section>`
}
