import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import type { Carrier } from './carrier'
import { isPossibleNumber } from './create-checks'
import { empty, html, json, type Answer, type Asked } from './exchange'
import { receiveText } from './inbound'
import { pageHtml } from './page-html'
import { pageAddress } from './page-text'
import { readView, tidyAddress } from './page-view'

const packages = createRequire(import.meta.url)

const fonts: Record<string, string> = {
  'text.woff2':
    'atkinson-hyperlegible-next/files/atkinson-hyperlegible-next-latin-wght-normal.woff2',
  'text-extended.woff2':
    'atkinson-hyperlegible-next/files/atkinson-hyperlegible-next-latin-ext-wght-normal.woff2',
  'mono.woff2':
    'atkinson-hyperlegible-mono/files/atkinson-hyperlegible-mono-latin-wght-normal.woff2',
  'mono-extended.woff2':
    'atkinson-hyperlegible-mono/files/atkinson-hyperlegible-mono-latin-ext-wght-normal.woff2',
  'title.woff2': 'literata/files/literata-latin-opsz-normal.woff2',
  'bengali.woff2': 'noto-sans-bengali/files/noto-sans-bengali-bengali-wght-normal.woff2',
}

const styles = ['page-base.css', 'page-shelf.css', 'page-phone.css', 'page-narrow.css']

const icon =
  '<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 32 32"><rect width="32" height="32" fill="#f8f6f0"/><path d="M16 2v28" stroke="#11719f" stroke-width="3"/><circle cx="16" cy="16" r="6" fill="#f8f6f0" stroke="#11719f" stroke-width="3"/></svg>'

/** The page of the practice phones and what it needs; null for any other path. */
export function answerPage(carrier: Carrier, asked: Asked): Answer | null {
  const { path } = asked
  if (path === '/') return page(carrier, asked.query)
  if (path === '/style.css') return files(styles, 'text/css')
  if (path === '/script.js') return files(['page-script.js'], 'text/javascript')
  if (path === '/icon.svg') {
    return { status: 200, headers: { 'Content-Type': 'image/svg+xml' }, body: icon }
  }
  if (path === '/version') return json(200, { version: carrier.version })
  if (path === '/write' && asked.method === 'POST') return write(carrier, asked)
  return path.startsWith('/fonts/') ? font(path.slice('/fonts/'.length)) : null
}

function page(carrier: Carrier, query: URLSearchParams): Answer {
  const view = readView(query)
  const elsewhere = tidyAddress(query, view)
  return elsewhere === null ? html(pageHtml(carrier, view)) : empty(303, { Location: elsewhere })
}

/** Sending without a script: the text goes in and the same page comes back. */
function write(carrier: Carrier, asked: Asked): Answer {
  const from = asked.form.get('from') ?? ''
  const body = asked.form.get('body') ?? ''
  if (!isPossibleNumber(from) || body.trim() === '') return empty(400)
  receiveText(carrier, { from, body })
  const anchor = `#phone-${from.slice(1)}`
  return empty(303, { Location: pageAddress(asked.form.getAll('open')) + anchor })
}

function files(names: readonly string[], type: string): Answer {
  const read = (name: string) => readFileSync(new URL(name, import.meta.url), 'utf8')
  const body = names.map(read).join('\n')
  return { status: 200, headers: { 'Content-Type': `${type}; charset=utf-8` }, body }
}

function font(name: string): Answer {
  const path = fonts[name]
  if (!path) return empty(404)
  return {
    status: 200,
    headers: { 'Content-Type': 'font/woff2', 'Cache-Control': 'max-age=86400' },
    body: readFileSync(packages.resolve(`@fontsource-variable/${path}`)),
  }
}
