/** Refuses any file of source or prose over 250 lines. Generated migrations and the lock file do not count. */
import { execFileSync } from 'node:child_process'
import { existsSync, readFileSync } from 'node:fs'

const mostLines = 250
const measured = /\.(ts|tsx|mts|mjs|cjs|js|css|md|json|yml|yaml|sql)$/
const generated = /^(db\/migrations\/|package-lock\.json$)/

const listed = execFileSync('git', ['ls-files', '--cached', '--others', '--exclude-standard'], {
  encoding: 'utf8',
})
const files = listed.split('\n').filter((name) => measured.test(name) && !generated.test(name))
const tooLong = files
  .filter((name) => existsSync(name))
  .map((name) => ({ name, lines: readFileSync(name, 'utf8').trimEnd().split('\n').length }))
  .filter(({ lines }) => lines > mostLines)

for (const { name, lines } of tooLong)
  console.error(`${name} has ${lines} lines; ${mostLines} is the most.`)
if (files.length === 0) console.error('No file was found to measure.')
process.exit(tooLong.length > 0 || files.length === 0 ? 1 : 0)
