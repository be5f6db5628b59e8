import { spawn } from 'node:child_process'

const graceMilliseconds = 10_000
const keptCharacters = 60_000

/** Children that are running now, so that an interrupted run can end them. */
const running = new Set()

/**
 * Runs one program to its end or its time limit. It has a process group of its own, so that a limit ends whatever the
 * program started too. Output is kept, not shown: the caller shows it when something failed.
 *
 * @param {{ command: string, parameters?: string[], environment?: NodeJS.ProcessEnv, limitSeconds: number }} program
 * @returns {Promise<{ succeeded: boolean, output: string, seconds: number }>}
 */
export function runProgram({ command, parameters = [], environment = process.env, limitSeconds }) {
  return new Promise((resolve) => {
    const began = Date.now()
    const child = spawn(command, parameters, {
      env: environment,
      stdio: ['ignore', 'pipe', 'pipe'],
      detached: true,
    })
    running.add(child)
    let output = ''
    let timedOut = false
    const keep = (chunk) => {
      output = (output + chunk).slice(-keptCharacters)
    }
    child.stdout.on('data', keep)
    child.stderr.on('data', keep)
    const limit = setTimeout(() => {
      timedOut = true
      endGroup(child)
    }, limitSeconds * 1000)
    child.once('error', (error) => keep(`${command} could not be run: ${error.message}\n`))
    child.once('close', (code) => {
      clearTimeout(limit)
      running.delete(child)
      if (timedOut) keep(`\nStopped: it took longer than ${limitSeconds} seconds.\n`)
      const seconds = (Date.now() - began) / 1000
      resolve({ succeeded: code === 0 && !timedOut, output, seconds })
    })
  })
}

/** Ends every program that still runs. */
export function endAll() {
  for (const child of running) endGroup(child)
}

function endGroup(child) {
  signalGroup(child, 'SIGTERM')
  setTimeout(() => signalGroup(child, 'SIGKILL'), graceMilliseconds).unref()
}

function signalGroup(child, signal) {
  try {
    if (child.pid !== undefined) process.kill(-child.pid, signal)
  } catch (error) {
    // Gone already.
    if (error.code !== 'ESRCH') throw error
  }
}
