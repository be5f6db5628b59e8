/**
 * `npm run test:constants`: shows that the outside tests can fail. In a copy of the project it changes one constant
 * after another, runs the outside tests that must hold it, and prints which one broke. Ends badly if a change breaks
 * none, or if its constant is no longer where the table says.
 */
import { cpSync, mkdtempSync, readFileSync, rmSync, symlinkSync, writeFileSync } from 'node:fs'
import { spawnSync } from 'node:child_process'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { constants } from './table.mjs'

const root = path.resolve(import.meta.dirname, '../..')
const copied = ['components', 'db', 'jobs', 'lib', 'tests', 'package.json', 'tsconfig.json']
const copy = mkdtempSync(path.join(tmpdir(), 'rillpost-constants-'))
const report = path.join(copy, 'report.json')

for (const name of copied) cpSync(path.join(root, name), path.join(copy, name), { recursive: true })
symlinkSync(path.join(root, 'node_modules'), path.join(copy, 'node_modules'))

process.once('exit', () => rmSync(copy, { recursive: true, force: true }))
for (const signal of ['SIGINT', 'SIGTERM']) process.once(signal, () => process.exit(1))

const only = process.argv.slice(2)
const chosen = constants.filter((row) => only.length === 0 || only.includes(row.test))
const whole = firstFailure([...new Set(chosen.map(({ test }) => test))])
if (chosen.length === 0 || whole) {
  console.error(`The outside tests must pass before a change can break them: ${whole}`)
  process.exit(1)
}

const results = chosen.flatMap((row) => {
  console.log(`\n${row.what} (${row.file})`)
  return row.changes.map((change) => tryChange(row, change))
})
const unnoticed = results.filter((wasNoticed) => !wasNoticed).length
console.log(`\n${results.length} constants changed, ${unnoticed} of them unnoticed`)
process.exit(unnoticed === 0 ? 0 : 1)

function tryChange({ file, test }, [from, to]) {
  const place = path.join(copy, file)
  const source = readFileSync(place, 'utf8')
  const label = `  ${from.trim()} → ${to.trim()}`
  if (source.split(from).length !== 2) {
    console.log(`${label}: is not found once in the file`)
    return false
  }
  writeFileSync(
    place,
    source.replace(from, () => to),
  )
  const broke = firstFailure([test])
  writeFileSync(place, source)
  console.log(`${label}: ${broke ? `broke ${test}: ${broke}` : 'broke NOTHING'}`)
  return broke !== null
}

/** The name of the first outside test that fails; null when all pass. A run without tests counts as a failure. */
function firstFailure(tests) {
  rmSync(report, { force: true })
  const files = tests.map((test) => path.join('tests', 'outside', `${test}.test.ts`))
  const vitest = path.join(root, 'node_modules', 'vitest', 'vitest.mjs')
  const parameters = ['run', '--config', 'tests/vitest.config.ts', '--project', 'outside']
  const { status, stdout, stderr } = spawnSync(
    process.execPath,
    [vitest, ...parameters, '--bail=1', '--reporter=json', `--outputFile=${report}`, ...files],
    { cwd: copy, encoding: 'utf8', env: { ...process.env, TZ: 'Asia/Kathmandu' } },
  )
  if (status === 0) return null
  return nameOfFailure() ?? `the run ended badly: ${(stderr || stdout).trim().slice(0, 400)}`
}

function nameOfFailure() {
  try {
    const { testResults } = JSON.parse(readFileSync(report, 'utf8'))
    const failed = testResults
      .flatMap(({ assertionResults }) => assertionResults)
      .find((test) => test.status === 'failed')
    return failed?.fullName ?? null
  } catch {
    return null
  }
}
