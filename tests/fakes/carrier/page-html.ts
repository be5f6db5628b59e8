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

/** What went wrong between the carrier and the desk: the carrier's own debugger, newest first, repeats counted. */
function troubleHtml(carrier: Carrier): string {
  const troubles = new Map<string, { words: string; lastAt: number; times: number }>()
  for (const entry of carrier.state.debuggerLog) {
    const words = `${entry.code}, ${entry.text}. ${entry.detail}`
    const times = (troubles.get(words)?.times ?? 0) + 1
    troubles.set(words, { words, lastAt: entry.at, times })
  }
  const latest = [...troubles.values()].sort((a, b) => b.lastAt - a.lastAt).slice(0, troublesShown)
  const rows = latest.map(({ words, lastAt, times }) => {
    const { day, hour } = phoneTime(lastAt, '')
    const often = times === 1 ? '' : `, ${times} times`
    const line = `${day} ${hour}${often}: ${words}`
    return `<li data-key="${escapeHtml(words)}">${escapeHtml(line)}</li>`
  })
  const hidden = rows.length === 0 ? ' hidden' : ''
  return `<section class="trouble" id="trouble"${hidden} aria-labelledby="trouble-name"><h2 id="trouble-name">Between carrier and desk</h2><ul data-list id="troubles">${rows.join('')}</ul></section>`
}
