/**
 * `npm test`: everything that CI runs, in order, to the end even after a failure. Needs nothing but Node beforehand.
 * The last line is `N passed, N failed`, summed from the runners' own reports.
 */
import { chmodSync, mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { ensureInstalled, ensureNode, root } from '../../lib/commands/prepare.mjs'
import { countReport, countStep, lastLine, sum, withCoverage } from './counts.mjs'
import { findBrowser, findPostgres } from './find-program.mjs'
import { startPostgres } from './postgres-server.mjs'
import { endAll, runProgram } from './run-step.mjs'
import {
  browserStep,
  buildStep,
  embeddedStep,
  postgresStep,
  staticSteps,
  unitStep,
} from './steps.mjs'

const atATime = 2
// The product's own settings, set in the caller's shell, must not reach a test.
const productSettings =
  /^(TWILIO_|NEXTAUTH_|SMTP_URL$|MAIL_FROM$|DATABASE_URL$|DATA_DIR$|PORT$|JOBS$)/

ensureNode()
process.chdir(root)
ensureInstalled()

const folder = mkdtempSync(path.join(tmpdir(), 'rillpost-test-'))
// PostgreSQL's own user must be able to pass through to its folder inside.
chmodSync(folder, 0o711)
let server = null
for (const signal of ['SIGINT', 'SIGTERM']) process.once(signal, () => void interrupted())

const results = []
await runSideBySide(staticSteps)
await runStep(unitStep)
await runStep(embeddedStep)
await runOnPostgres()
await runStep(buildStep)
await runInBrowser()

rmSync(folder, { recursive: true, force: true })
const total = sum(results)
console.log(lastLine(total))
process.exit(total.failed === 0 ? 0 : 1)

async function runSideBySide(steps) {
  const waiting = [...steps]
  const lane = async () => {
    for (let step = waiting.shift(); step; step = waiting.shift()) await runStep(step)
  }
  await Promise.all(Array.from({ length: atATime }, lane))
}

async function runStep(step) {
  const { name, command, parameters, limitSeconds } = step
  const environment = { ...cleanEnvironment(), ...step.environment }
  if (step.report) Object.assign(environment, { RESULTS_DIR: folder, RESULTS_NAME: step.report })
  const { succeeded, output, seconds } = await runProgram({
    command,
    parameters,
    environment,
    limitSeconds,
  })
  record({ name, counts: countsOf(step, succeeded), seconds, output })
}

function countsOf({ kind, report, covers }, succeeded) {
  if (!report) return countStep(succeeded)
  const counts = countReport({ kind, file: path.join(folder, `${report}.json`), succeeded })
  const file = path.join(folder, 'coverage', 'coverage-summary.json')
  return covers ? withCoverage(counts, { file, covers }) : counts
}

function record({ name, counts, seconds, output }) {
  results.push(counts)
  if (counts.failed > 0) console.log(`\n----- ${name} -----\n${output.trimEnd()}\n-----`)
  const note = counts.note ? ` (${counts.note})` : ''
  console.log(`${name}: ${lastLine(counts)}${note}, ${seconds.toFixed(1)} s`)
}

function recordMissing(name, problem) {
  record({ name, counts: countStep(false), seconds: 0, output: problem })
}

async function runOnPostgres() {
  const { name } = postgresStep('')
  const { found, missing } = findPostgres()
  if (!found) return recordMissing(name, missing)
  try {
    server = await startPostgres({ programs: found, folder: path.join(folder, 'postgres') })
  } catch (error) {
    return recordMissing(name, error.message)
  }
  await runStep(postgresStep(server.url))
  await server.stop()
  server = null
}

async function runInBrowser() {
  const { found, missing } = findBrowser()
  if (!found) return recordMissing(browserStep('').name, missing)
  await runStep(browserStep(found))
}

function cleanEnvironment() {
  const kept = Object.entries(process.env).filter(([name]) => !productSettings.test(name))
  return { ...Object.fromEntries(kept), CI: '1', NO_COLOR: '1', NEXT_TELEMETRY_DISABLED: '1' }
}

async function interrupted() {
  endAll()
  await server?.stop()
  rmSync(folder, { recursive: true, force: true })
  process.exit(1)
}
