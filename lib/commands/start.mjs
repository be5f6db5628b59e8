/**
 * `npm start`: the whole desk on one machine with invented data. Plain Node, so that it runs on a bare clone; it
 * installs and builds what is missing, then starts the practice carrier, the practice mail server and the desk.
 */
import { existsSync, readFileSync, rmSync } from 'node:fs'
import path from 'node:path'
import { childGroup } from './children.mjs'
import { ensureDemo } from './demo.mjs'
import { takenPorts } from './ports.mjs'
import {
  carrierEnvironment,
  deskEnvironment,
  mailEnvironment,
  practiceKeys,
  practicePorts,
  privateFolder,
} from './practice.mjs'
import { ensureBuilt, ensureInstalled, ensureNode, fail, root } from './prepare.mjs'

const readyWithinMilliseconds = 120_000

ensureNode()
const ports = practicePorts()
await refuseTakenPorts()
ensureInstalled()
ensureBuilt()

const dataFolder = privateFolder(path.resolve(root, process.env.DATA_DIR || '.data'))
const keys = practiceKeys(dataFolder)
const demoFolder = await ensureDemo({
  dataFolder,
  environment: (folder) => deskEnvironment({ dataFolder: folder, ports, keys }),
})
const logFolder = privateFolder(path.join(dataFolder, 'logs'))

const programs = childGroup({ logFolder, onDeath: stopForDeath })
process.on('SIGINT', () => void stopForSignal())
process.on('SIGTERM', () => void stopForSignal())

startPrograms()
await waitUntilReady()
await fillPhones()
tellAddresses()

async function refuseTakenPorts() {
  const lines = await takenPorts([
    { what: 'the desk', port: ports.desk, variable: 'PORT' },
    { what: 'the practice phones', port: ports.carrier, variable: 'PRACTICE_CARRIER_PORT' },
    { what: 'the practice mail server', port: ports.smtp, variable: 'PRACTICE_SMTP_PORT' },
    { what: 'the practice mail page', port: ports.mail, variable: 'PRACTICE_MAIL_PORT' },
  ])
  if (lines.length > 0) fail(lines.join('\n'))
}

function startPrograms() {
  const settings = { dataFolder: demoFolder, ports, keys }
  const fake = (name) => ['--import', 'tsx', path.join('tests', 'fakes', name, 'main.ts')]
  programs.start({
    name: 'mail',
    parameters: fake('mail'),
    environment: mailEnvironment(settings),
  })
  programs.start({
    name: 'carrier',
    parameters: fake('carrier'),
    environment: carrierEnvironment(settings),
  })
  // Last started, first stopped: its texts under way still find the carrier.
  programs.start({
    name: 'desk',
    parameters: [path.join('lib', 'commands', 'web.mjs')],
    environment: deskEnvironment(settings),
  })
}

async function waitUntilReady() {
  const addresses = [
    `http://127.0.0.1:${ports.mail}/`,
    `http://127.0.0.1:${ports.carrier}/`,
    `http://127.0.0.1:${ports.desk}/api/health`,
  ]
  const deadline = Date.now() + readyWithinMilliseconds
  for (const address of addresses) {
    while (!(await answers(address))) {
      if (Date.now() > deadline)
        await giveUp(`${address} did not answer in time. Logs: ${logFolder}`)
      await new Promise((resolve) => setTimeout(resolve, 250))
    }
  }
}

/** Once: the phones get what the demo's history has brought them. The carrier keeps it from then on. */
async function fillPhones() {
  const file = path.join(demoFolder, 'phone-history.json')
  if (!existsSync(file)) return
  const response = await fetch(`http://127.0.0.1:${ports.carrier}/practice/history`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: readFileSync(file),
    signal: AbortSignal.timeout(20_000),
  })
  if (!response.ok)
    return giveUp(`The practice phones did not take their history. Logs: ${logFolder}`)
  rmSync(file)
}

async function answers(address) {
  try {
    const response = await fetch(address, { signal: AbortSignal.timeout(5000) })
    await response.body?.cancel()
    return response.ok
  } catch {
    return false
  }
}

function tellAddresses() {
  console.log(`
Rillpost is up, with an invented programme.

  The desk             http://127.0.0.1:${ports.desk}
  The practice phones  http://127.0.0.1:${ports.carrier}
  The practice mail    http://127.0.0.1:${ports.mail}

  Sign in as           ana@rillpost.example     agent
                       tomas@rillpost.example   coordinator
                       vera@rillpost.example    visitor
                       ines@rillpost.example    coordinator (a second one, to approve)
  Password             water runs downhill

Ctrl-C stops it. Logs are in ${path.relative(root, logFolder) || logFolder}.`)
}

// Asked twice, it does not wait for anything.
async function stopForSignal() {
  if (stopForSignal.asked) {
    programs.killAll()
    process.exit(1)
  }
  stopForSignal.asked = true
  console.log('\nStopping …')
  await programs.stop()
  process.exit(0)
}

async function stopForDeath({ name, how, lastLines }) {
  await giveUp(`${lastLines}\n\nThe ${name} ended by itself (${how}), so the rest is stopped too.`)
}

async function giveUp(line) {
  console.error(line)
  await programs.stop()
  process.exit(1)
}
