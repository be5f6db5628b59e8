import { spawn, type ChildProcess } from 'node:child_process'
import { mkdtempSync, rmSync } from 'node:fs'
import { createServer } from 'node:net'
import { tmpdir } from 'node:os'
import path from 'node:path'

/** A started product: what a newcomer has after `npm start`, on free ports and in a folder of its own. */
export type Programme = {
  desk: string
  phones: string
  mail: string
  folder: string
  stop(): Promise<void>
}

function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const server = createServer()
    server.once('error', reject)
    server.listen(0, '127.0.0.1', () => {
      const address = server.address()
      server.close(() =>
        typeof address === 'object' && address
          ? resolve(address.port)
          : reject(new Error('no port')),
      )
    })
  })
}

export async function freePorts<const N extends readonly string[]>(names: N) {
  const ports = {} as Record<N[number], number>
  for (const name of names) ports[name as N[number]] = await freePort()
  return ports
}

/** A new folder under the system's temporary one. */
export function temporaryFolder(): string {
  return mkdtempSync(path.join(tmpdir(), 'rillpost-e2e-'))
}

/** Waits until the address answers, or throws when the program has ended or the time is over. */
export async function answers(
  address: string,
  program: ChildProcess,
  withinSeconds = 120,
): Promise<void> {
  const deadline = Date.now() + withinSeconds * 1000
  for (;;) {
    const response = await fetch(address).catch(() => null)
    await response?.body?.cancel()
    if (response?.ok) return
    if (program.exitCode !== null) throw new Error(`The program ended before ${address} answered.`)
    if (Date.now() > deadline) throw new Error(`${address} did not answer in time.`)
    await new Promise((resolve) => setTimeout(resolve, 250))
  }
}

/** Ends a program with a signal and waits for its end. */
export async function ended(
  program: ChildProcess,
  signal: NodeJS.Signals = 'SIGTERM',
): Promise<void> {
  if (program.exitCode !== null || program.signalCode !== null) return
  const end = new Promise<void>((resolve) => program.once('exit', () => resolve()))
  program.kill(signal)
  await end
}

/** Starts everything as `npm start` does, demo world and all. */
export async function startProgramme(): Promise<Programme> {
  const ports = await freePorts(['desk', 'carrier', 'smtp', 'mail'] as const)
  const folder = temporaryFolder()
  const program = spawn(process.execPath, ['lib/commands/start.mjs'], {
    env: {
      ...process.env,
      PORT: String(ports.desk),
      PRACTICE_CARRIER_PORT: String(ports.carrier),
      PRACTICE_SMTP_PORT: String(ports.smtp),
      PRACTICE_MAIL_PORT: String(ports.mail),
      DATA_DIR: folder,
    },
    stdio: ['ignore', 'ignore', 'inherit'],
  })
  const desk = `http://127.0.0.1:${ports.desk}`
  await answers(`${desk}/api/health`, program, 420)
  return {
    desk,
    phones: `http://127.0.0.1:${ports.carrier}`,
    mail: `http://127.0.0.1:${ports.mail}`,
    folder,
    async stop() {
      await ended(program)
      rmSync(folder, { recursive: true, force: true })
    },
  }
}
