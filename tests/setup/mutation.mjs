/**
 * `npm run test:mutation`: changes the core a little, thousands of times, and counts for each group of files how many
 * of the changes its unit and outside tests notice. Ends badly if a group is below the least. Takes the better part of
 * an hour; with names of groups only those, with `--incremental` only what changed since the last time.
 */
import { spawnSync } from 'node:child_process'
import { existsSync, readFileSync, rmSync } from 'node:fs'
import path from 'node:path'
import { leastPercent, mutatedGroups, reportFile } from '../stryker.config.mjs'

process.chdir(path.resolve(import.meta.dirname, '../..'))

const asked = process.argv.slice(2)
const options = asked.filter((word) => word.startsWith('--'))
const names = asked.filter((word) => !word.startsWith('--'))
const groups = names.length === 0 ? Object.keys(mutatedGroups) : names
const unknown = groups.filter((name) => !(name in mutatedGroups))
if (unknown.length > 0) throw new Error(`No such group: ${unknown.join(', ')}`)

const files = groups.flatMap((name) => mutatedGroups[name])
rmSync(reportFile, { force: true })
const { status } = spawnSync(
  path.join('node_modules', '.bin', 'stryker'),
  ['run', 'tests/stryker.config.mjs', '--mutate', files.join(','), ...options],
  // Set for the process, since a worker thread cannot change its zone.
  { stdio: 'inherit', env: { ...process.env, TZ: 'Asia/Kathmandu' } },
)

if (!existsSync(reportFile)) process.exit(status || 1)
const report = JSON.parse(readFileSync(reportFile, 'utf8'))
const shares = groups.map((name) => {
  const statuses = mutatedGroups[name]
    .flatMap((file) => report.files[file]?.mutants ?? [])
    .map((mutant) => mutant.status)
  const count = (...kinds) => statuses.filter((one) => kinds.includes(one)).length
  const noticed = count('Killed', 'Timeout')
  const all = noticed + count('Survived', 'NoCoverage')
  console.log(`${name}: ${noticed} of ${all} noticed, ${((100 * noticed) / all).toFixed(1)} %`)
  return all === 0 ? 0 : noticed / all
})
const isEnough = shares.every((share) => share * 100 >= leastPercent)
if (!isEnough) console.log(`Every group must reach ${leastPercent} %.`)
process.exit(status === 0 && isEnough ? 0 : 1)
