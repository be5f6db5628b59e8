import { spawn } from 'node:child_process'
import { closeSync, openSync, readFileSync } from 'node:fs'
import path from 'node:path'
import { pathToFileURL } from 'node:url'
import { root } from './prepare.mjs'

const withParent = pathToFileURL(path.join(import.meta.dirname, 'with-parent.mjs')).href
const linesToldOnDeath = 20

/**
 * The programs that run beside each other under one command. They are stopped in the reverse order of their start,
 * each given time to finish; when one ends by itself, the rest are stopped and `onDeath` is called.
 */
export function childGroup({ logFolder, graceMilliseconds = 20_000, onDeath }) {
  const children = []
  let stopping = null

  function start({ name, parameters, environment }) {
    const logFile = path.join(logFolder, `${name}.log`)
    const log = openSync(logFile, 'w', 0o600)
    const child = spawn(process.execPath, ['--import', withParent, ...parameters], {
      cwd: root,
      env: environment,
      stdio: ['ignore', log, log, 'ipc'],
      // A group of its own: Ctrl-C in the terminal reaches only us, and we stop them in order.
      detached: true,
    })
    closeSync(log)
    const ended = new Promise((resolve) => child.once('close', resolve))
    children.push({ name, child, ended })
    child.once('exit', (code, signal) => {
      if (!stopping)
        onDeath({ name, how: signal ?? `code ${code}`, lastLines: lastLinesOf(logFile) })
    })
    return child
  }

  async function stopOne({ child, ended }) {
    if (child.exitCode !== null || child.signalCode !== null) return
    child.kill('SIGTERM')
    const patience = setTimeout(() => child.kill('SIGKILL'), graceMilliseconds)
    await ended
    clearTimeout(patience)
  }

  function stop() {
    stopping ??= (async () => {
      for (const entry of children.toReversed()) await stopOne(entry)
    })()
    return stopping
  }

  function killAll() {
    for (const { child } of children) child.kill('SIGKILL')
  }

  return { start, stop, killAll }
}

function lastLinesOf(file) {
  return readFileSync(file, 'utf8').trimEnd().split('\n').slice(-linesToldOnDeath).join('\n')
}
