import { readSettings } from './settings'
import { startCarrier } from './start'

const running = await startCarrier(readSettings(process.env))
console.log(`carrier fake on ${running.origin}: practice phones at ${running.origin}/`)

let closing = false
for (const signal of ['SIGINT', 'SIGTERM'] as const) {
  process.on(signal, () => {
    if (closing) return
    closing = true
    void running.close().then(() => process.exit(0))
  })
}
