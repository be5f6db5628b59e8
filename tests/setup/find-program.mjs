import { spawnSync } from 'node:child_process'
import { accessSync, constants, readdirSync } from 'node:fs'
import path from 'node:path'

const oldestPostgres = 15
const browserNames = ['chromium', 'chromium-browser', 'google-chrome-stable', 'google-chrome']

/** The browser for the tests in one, found or installed; null with a reason where neither is possible. */
export function findBrowser() {
  return findOrInstall({
    find: () => process.env.CHROMIUM_PATH ?? findInPath(browserNames),
    debianPackage: 'chromium',
    missing: 'No Chromium was found. Install it, or set CHROMIUM_PATH to one.',
  })
}

/** The folder of PostgreSQL's server programs (15 or newer), found or installed. */
export function findPostgres() {
  return findOrInstall({
    find: findPostgresFolder,
    debianPackage: 'postgresql-15',
    missing: `No PostgreSQL server, ${oldestPostgres} or newer, was found. Install one, or put its programs (initdb, postgres) in PATH.`,
  })
}

function findOrInstall({ find, debianPackage, missing }) {
  const found = find()
  if (found) return { found }
  if (process.getuid?.() === 0 && findInPath(['apt-get'])) {
    console.log(`Installing ${debianPackage} …`)
    const installed = aptInstall(debianPackage) && find()
    if (installed) return { found: installed }
  }
  return { found: null, missing }
}

function aptInstall(name) {
  const quiet = { stdio: ['ignore', 'ignore', 'inherit'], timeout: 300_000 }
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' }
  const update = spawnSync('apt-get', ['update', '-q'], { ...quiet, env })
  if (update.status !== 0) return false
  const install = ['install', '-q', '-y', '--no-install-recommends', name]
  return spawnSync('apt-get', install, { ...quiet, env }).status === 0
}

/** Debian keeps the server's programs out of PATH, in a folder for each version. */
function findPostgresFolder() {
  const base = '/usr/lib/postgresql'
  const folders = namesIn(base)
    .sort()
    .map((version) => path.join(base, version, 'bin'))
  const inPath = findInPath(['initdb'])
  return [...folders, ...(inPath ? [path.dirname(inPath)] : [])].find(isRecentPostgres)
}

function isRecentPostgres(folder) {
  const { stdout } = spawnSync(path.join(folder, 'postgres'), ['--version'], { encoding: 'utf8' })
  return Number(/(\d+)/.exec(stdout ?? '')?.[1] ?? 0) >= oldestPostgres
}

function findInPath(names) {
  const folders = (process.env.PATH ?? '').split(path.delimiter)
  return names
    .flatMap((name) => folders.map((folder) => path.join(folder, name)))
    .find((file) => isProgram(file))
}

function namesIn(folder) {
  try {
    return readdirSync(folder)
  } catch {
    return []
  }
}

function isProgram(file) {
  try {
    accessSync(file, constants.X_OK)
    return true
  } catch {
    return false
  }
}
