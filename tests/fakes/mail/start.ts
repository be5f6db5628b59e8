import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http'
import type { AddressInfo } from 'node:net'
import { createMailbox, type Mailbox } from './mailbox'
import { mailPageHtml } from './page'
import type { MailSettings } from './settings'
import { createSmtp } from './smtp'

export type RunningMail = {
  mailbox: Mailbox
  smtpUrl: string
  origin: string
  close(): Promise<void>
}

/** Starts the mail fake on loopback; port 0 takes any free one. */
export async function startMail(settings: MailSettings): Promise<RunningMail> {
  const mailbox = createMailbox()
  const smtp = createSmtp(mailbox)
  const page = createServer((request, response) => answer(mailbox, request, response))
  // A client that breaks off is no reason to end the fake.
  smtp.on('error', () => {})
  await new Promise<void>((resolve, reject) => {
    smtp.server.once('error', reject)
    smtp.listen(settings.smtpPort, '127.0.0.1', () => resolve())
  })
  const pagePort = await listen(page, settings.pagePort)
  const smtpPort = (smtp.server.address() as AddressInfo).port
  return {
    mailbox,
    smtpUrl: `smtp://127.0.0.1:${smtpPort}`,
    origin: `http://127.0.0.1:${pagePort}`,
    async close() {
      await new Promise<void>((resolve) => {
        smtp.close(() => resolve())
      })
      await new Promise<void>((resolve) => {
        page.close(() => resolve())
        page.closeAllConnections()
      })
    },
  }
}

function listen(server: Server, port: number): Promise<number> {
  return new Promise((resolve, reject) => {
    server.once('error', reject)
    server.listen(port, '127.0.0.1', () => resolve((server.address() as AddressInfo).port))
  })
}

function answer(mailbox: Mailbox, request: IncomingMessage, response: ServerResponse): void {
  const { pathname } = new URL(request.url ?? '/', 'http://127.0.0.1')
  if (pathname === '/messages' && request.method === 'DELETE') {
    mailbox.letters.length = 0
    response.writeHead(204).end()
  } else if (pathname === '/messages') {
    response.writeHead(200, { 'Content-Type': 'application/json; charset=utf-8' })
    response.end(JSON.stringify({ messages: mailbox.letters }))
  } else if (pathname === '/') {
    response.writeHead(200, { 'Content-Type': 'text/html; charset=utf-8' })
    response.end(mailPageHtml(mailbox))
  } else {
    response.writeHead(404, { 'Content-Type': 'text/plain' }).end('no such page')
  }
}
