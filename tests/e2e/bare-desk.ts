import { spawn, spawnSync, type ChildProcess } from 'node:child_process'
import path from 'node:path'
import { answers, ended, freePorts, temporaryFolder } from './programme'

const ACCOUNT = `AC${'0'.repeat(32)}`
const TOKEN = 'a-token-that-only-this-test-knows'
const PASSWORD = 'a long enough password'

/** A desk without the demo: an empty data folder, the carrier's settings given by hand. */
export type BareDesk = {
  address: string
  carrier: string
  start(): Promise<void>
  /** Kills the desk's process as a power switch would; the carrier goes on. */
  kill(): Promise<void>
  stop(): Promise<void>
}

export const bareCoordinator = { email: 'first@rillpost.example', password: PASSWORD }

export async function bareDesk(): Promise<BareDesk> {
  const ports = await freePorts(['desk', 'carrier'] as const)
  const folder = temporaryFolder()
  const address = `http://127.0.0.1:${ports.desk}`
  const carrier = `http://127.0.0.1:${ports.carrier}`
  const environment = {
    ...process.env,
    PORT: String(ports.desk),
    BIND_ADDRESS: '127.0.0.1',
    PUBLIC_BASE_URL: address,
    NEXTAUTH_URL: address,
    NEXTAUTH_SECRET: 'forty characters that nobody will guess!',
    DATA_DIR: folder,
    TWILIO_ACCOUNT_SID: ACCOUNT,
    TWILIO_AUTH_TOKEN: TOKEN,
    TWILIO_FROM: '+15005550006',
    TWILIO_API_BASE_URL: carrier,
    PRACTICE_CLOCK: 'on',
  }
  const fake = spawn(process.execPath, ['--import', 'tsx', 'tests/fakes/carrier/main.ts'], {
    env: {
      ...environment,
      FAKE_PORT: String(ports.carrier),
      FAKE_ACCOUNT_SID: ACCOUNT,
      FAKE_AUTH_TOKEN: TOKEN,
      FAKE_FROM: '+15005550006',
      FAKE_INBOUND_URL: `${address}/api/sms/inbound#rc=5&rp=all`,
      FAKE_CLOCK_FILE: path.join(folder, 'practice-clock.json'),
    },
    stdio: ['ignore', 'ignore', 'inherit'],
  })
  await answers(`${carrier}/`, fake)
  const added = spawnSync(
    'npm',
    [
      'run',
      '--silent',
      'staff:add',
      '--',
      '--email',
      bareCoordinator.email,
      '--name',
      'First Person',
      '--role',
      'coordinator',
      '--languages',
      'en,es',
    ],
    { env: environment, input: `${PASSWORD}\n`, encoding: 'utf8', timeout: 120_000 },
  )
  if (added.status !== 0) throw new Error(`staff:add failed: ${added.stderr}`)
  let desk: ChildProcess | null = null
  return {
    address,
    carrier,
    async start() {
      desk = spawn(process.execPath, ['lib/commands/web.mjs'], {
        env: environment,
        stdio: ['ignore', 'ignore', 'inherit'],
        detached: true,
      })
      await answers(`${address}/api/health`, desk)
    },
    async kill() {
      if (!desk?.pid) return
      const gone = new Promise<void>((resolve) => desk?.once('exit', () => resolve()))
      // The whole group: the command and the server it runs.
      process.kill(-desk.pid, 'SIGKILL')
      await gone
    },
    async stop() {
      if (desk) await ended(desk)
      await ended(fake)
    },
  }
}
