/**
 * `npm run web`: the desk alone, with the settings of the environment and of `.env`. What is wrong with them is told
 * by the desk itself as it starts (`instrumentation.ts`).
 */
import './with-settings.mjs'
import path from 'node:path'
import { pathToFileURL } from 'node:url'
import { takenPorts } from './ports.mjs'
import { ensureBuilt, ensureInstalled, ensureNode, fail, root } from './prepare.mjs'

ensureNode()

const port = process.env.PORT || '3000'
const host = process.env.BIND_ADDRESS || '127.0.0.1'
const taken = await takenPorts([{ what: 'the desk', port: Number(port), variable: 'PORT' }], host)
if (taken.length > 0) fail(taken.join('\n'))

ensureInstalled()
ensureBuilt()

process.env.NODE_ENV = 'production'
process.env.NEXT_TELEMETRY_DISABLED = '1'
// Next would exit at once on SIGTERM; the desk first finishes its jobs and closes the database.
process.env.NEXT_MANUAL_SIG_HANDLE = 'true'
// Whether the session's cookie is kept to https follows from the public address.
if (!process.env.NEXTAUTH_URL && process.env.PUBLIC_BASE_URL) {
  process.env.NEXTAUTH_URL = process.env.PUBLIC_BASE_URL
}

// In this process, not a child: a signal or a kill meant for the desk meets the desk.
const next = path.join(root, 'node_modules', 'next', 'dist', 'bin', 'next')
process.argv = [process.execPath, next, 'start', '--hostname', host, '--port', port]
await import(pathToFileURL(next).href)
