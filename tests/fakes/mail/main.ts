import { readMailSettings } from './settings'
import { startMail } from './start'

const settings = readMailSettings(process.env)
const running = await startMail(settings).catch((error: NodeJS.ErrnoException) => {
  if (error.code !== 'EADDRINUSE') throw error
  console.error(`mail fake: ${error.message}; set FAKE_SMTP_PORT or FAKE_PORT to another one`)
  process.exit(1)
})
console.log(`mail fake on ${running.smtpUrl}: what came is at ${running.origin}/`)

let closing = false
for (const signal of ['SIGINT', 'SIGTERM'] as const) {
  process.on(signal, () => {
    if (closing) return
    closing = true
    void running.close().then(() => process.exit(0))
  })
}
