import { readSettings } from './settings'
import { startCarrier } from './start'

const settings = readSettings(process.env)
const running = await startCarrier(settings).catch((error: NodeJS.ErrnoException) => {
  if (error.code !== 'EADDRINUSE') throw error
  console.error(`carrier fake: port ${settings.port} is taken; set FAKE_PORT to another one`)
  process.exit(1)
})
console.log(`carrier fake on ${running.origin}: practice phones at ${running.origin}/`)

let closing = false
for (const signal of ['SIGINT', 'SIGTERM'] as const) {
  process.on(signal, () => {
    if (closing) return
    closing = true
    void running.close().then(() => process.exit(0))
  })
}
