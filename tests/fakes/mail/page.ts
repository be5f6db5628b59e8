import type { Letter, Mailbox } from './mailbox'

const escapes: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
}

function escapeHtml(text: string): string {
  return text.replace(/[&<>"']/g, (letter) => escapes[letter] ?? letter)
}

/** Addresses become links, so that a sign-in letter can be followed; only those of this machine. */
function withLinks(text: string): string {
  return escapeHtml(text).replace(
    /http:\/\/(?:127\.0\.0\.1|localhost)(?::\d+)?\/[^\s<]*/g,
    (address) => `<a href="${address}">${address}</a>`,
  )
}

function letterHtml(letter: Letter): string {
  const words = letter.text || letter.html.replace(/<[^>]*>/g, ' ')
  return `<li><h2>${escapeHtml(letter.subject || 'no subject')}</h2>
<p class="who">to ${escapeHtml(letter.to.join(', '))} · from ${escapeHtml(letter.from)} · ${escapeHtml(letter.receivedAt)}</p>
<pre>${withLinks(words.trim())}</pre></li>`
}

const style = `:root{color-scheme:light dark;--paper:oklch(0.975 0.008 95);--sheet:oklch(0.995 0.004 95);--rule:oklch(0.88 0.014 95);--ink:oklch(0.25 0.03 255);--faint:oklch(0.48 0.02 255);--water:oklch(0.52 0.11 235)}
@media (prefers-color-scheme:dark){:root{--paper:oklch(0.19 0.025 255);--sheet:oklch(0.225 0.027 255);--rule:oklch(0.34 0.03 255);--ink:oklch(0.93 0.012 95);--faint:oklch(0.72 0.02 255);--water:oklch(0.74 0.1 230)}}
body{margin:0;padding:24px;max-width:76ch;background:var(--paper);color:var(--ink);font:16px/1.5 ui-sans-serif,sans-serif}
h1{font-size:28px;margin:0 0 4px}p{margin:0 0 20px;color:var(--faint)}a{color:var(--water)}
ol{list-style:none;margin:0;padding:0 0 0 22px;border-left:2px solid var(--water)}
li{margin:0 0 22px}h2{font-size:17px;margin:0}.who{font-size:14px;margin:0 0 6px;overflow-wrap:anywhere}
pre{margin:0;padding:10px 12px;background:var(--sheet);border:1px solid var(--rule);font:15px/1.5 ui-monospace,monospace;white-space:pre-wrap;overflow-wrap:anywhere}`

/** What came, newest first. It reloads by itself, without a script. */
export function mailPageHtml(mailbox: Mailbox): string {
  const letters = [...mailbox.letters].reverse()
  const list = letters.length === 0 ? '' : `<ol>${letters.map(letterHtml).join('')}</ol>`
  const count = letters.length === 1 ? '1 letter' : `${letters.length} letters`
  return `<!doctype html><html lang="en"><head><meta charset="utf-8"><title>Practice mail · Rillpost</title>
<meta name="viewport" content="width=device-width, initial-scale=1"><meta http-equiv="refresh" content="5"><link rel="icon" href="data:,"><style>${style}</style></head>
<body><main><h1>Practice mail</h1><p>${count}. Nothing here was sent to anybody.</p>${list}</main></body></html>`
}
