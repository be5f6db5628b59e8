import { spawnSync } from 'node:child_process'
import { createHash } from 'node:crypto'
import { existsSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs'
import path from 'node:path'

/** The root of the repository: every command runs there, wherever it was called from. */
export const root = path.resolve(import.meta.dirname, '..', '..')

// What `next build` reads. The commands, the demo's generator and the tests are not in the build.
const buildSources = [
  'app',
  'components',
  'db/queries',
  'db/schema',
  'jobs',
  'lib',
  'public',
  'instrumentation.ts',
  'next.config.mjs',
  'package-lock.json',
  'package.json',
  'proxy.ts',
]
const notInBuild = [path.join('lib', 'commands')]
const buildMark = path.join('.next', 'rillpost-sources')

/** Ends the command with one line for the person at the keyboard. */
export function fail(line) {
  console.error(line)
  process.exit(1)
}

/** Refuses a Node that is too old before anything fails in words nobody can read. */
export function ensureNode() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number)
  if (major > 20 || (major === 20 && minor >= 20)) return
  fail(`Rillpost needs Node 20.20 or newer; this is ${process.versions.node}.`)
}

/** Installs the packages of the lock file, unless exactly those are installed. */
export function ensureInstalled() {
  if (isInstalled()) return
  console.log('Installing packages (once; a minute or two) …')
  // CI installs what tests need too, so development packages are named even where NODE_ENV is production.
  run({
    command: 'npm',
    parameters: ['ci', '--include=dev', '--no-fund', '--no-audit'],
    problem: 'The packages could not be installed.',
  })
}

/** npm writes what it installed into node_modules/.package-lock.json, as its last act. */
function isInstalled() {
  const wanted = lockedPackages('package-lock.json')
  const found = lockedPackages(path.join('node_modules', '.package-lock.json'))
  if (!wanted || !found) return false
  return Object.entries(wanted).every(([name, entry]) => {
    if (name === '') return true
    const there = found[name]
    if (!there) return entry.optional === true || entry.devOptional === true
    return there.version === entry.version
  })
}

function lockedPackages(file) {
  const full = path.join(root, file)
  return existsSync(full) ? JSON.parse(readFileSync(full, 'utf8')).packages : null
}

/** Builds the desk, unless the build that is there came from the same sources. */
export function ensureBuilt() {
  if (markOfBuild() === hashOfSources()) return
  console.log('Building the desk (once; a minute or so) …')
  build()
}

/** Builds the desk and marks the build with the sources that it came from. */
export function build() {
  const sources = hashOfSources()
  const next = path.join('node_modules', 'next', 'dist', 'bin', 'next')
  run({
    command: process.execPath,
    parameters: [next, 'build'],
    problem: 'The desk could not be built.',
    environment: { NODE_ENV: 'production' },
  })
  writeFileSync(path.join(root, buildMark), sources)
}

function markOfBuild() {
  const mark = path.join(root, buildMark)
  const finished = existsSync(path.join(root, '.next', 'BUILD_ID')) && existsSync(mark)
  return finished ? readFileSync(mark, 'utf8') : null
}

function hashOfSources() {
  const hash = createHash('sha256').update(process.version)
  for (const file of buildSources.flatMap(filesUnder).sort(byText)) {
    hash.update(file).update(readFileSync(path.join(root, file)))
  }
  return hash.digest('hex')
}

// The same on every machine: a comparison by language would depend on its settings.
function byText(one, other) {
  return one < other ? -1 : 1
}

function filesUnder(name) {
  const full = path.join(root, name)
  if (!existsSync(full) || notInBuild.includes(name)) return []
  // Not told by a dot in the name: the folder of a route may be called `openapi.json`.
  if (!statSync(full).isDirectory()) return [name]
  return readdirSync(full).flatMap((entry) => filesUnder(path.join(name, entry)))
}

/** Runs a step to its end in sight of the person at the keyboard. */
function run({ command, parameters, problem, environment }) {
  const { status, error } = spawnSync(command, parameters, {
    cwd: root,
    stdio: 'inherit',
    env: { ...process.env, NEXT_TELEMETRY_DISABLED: '1', ...environment },
  })
  if (error) fail(`${problem} ${error.message}`)
  if (status !== 0) fail(problem)
}
