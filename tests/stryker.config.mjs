import { readdirSync } from 'node:fs'
import path from 'node:path'

/*
 * Mutation testing of the core. Seven groups of files, each of which must reach `leastPercent` by itself
 * (tests/setup/mutation.mjs counts them). Left out, since a change in them is another datum or another word and no
 * broken rule; outside tests and `npm run test:constants` hold what they say:
 * - ticket-types.ts: types only
 * - cycle-words.ts, round-words.ts, ticket-words.ts, harm-phrases/: wording for staff
 * - what runs once when a file is loaded (`ignoreStatic`): tables of steps, odds, causes, key words and limits
 */
const core = path.resolve(import.meta.dirname, '../lib/domain')
const leftOut = ['cycle-words', 'round-words', 'ticket-types', 'ticket-words']

/** The files of these names and those that go on from them with a hyphen. */
function filesOf(...names) {
  return readdirSync(core)
    .filter((file) => file.endsWith('.ts'))
    .map((file) => file.slice(0, -'.ts'.length))
    .filter((file) => names.some((name) => file === name || file.startsWith(`${name}-`)))
    .filter((file) => !leftOut.includes(file))
    .map((file) => `lib/domain/${file}.ts`)
}

export const mutatedGroups = {
  flow: filesOf('flow'),
  cycle: filesOf('cycle', 'day'),
  round: filesOf('round'),
  ticket: filesOf('ticket'),
  walk: filesOf('walk'),
  harm: filesOf('harm'),
  consent: filesOf('consent'),
}

export const leastPercent = 80
export const reportFile = 'tests/.results/mutation.json'

export default {
  testRunner: 'vitest',
  plugins: ['@stryker-mutator/vitest-runner'],
  vitest: { configFile: 'tests/vitest-mutation.config.ts', related: false },
  coverageAnalysis: 'perTest',
  ignoreStatic: true,
  mutate: Object.values(mutatedGroups).flat(),
  thresholds: { high: 95, low: leastPercent, break: leastPercent },
  concurrency: 1,
  // Endless loops are told by their count; a slow machine must not pass for a change that was noticed.
  timeoutMS: 60_000,
  dryRunTimeoutMinutes: 60,
  // The tests are checked by the compiler before; here each mutant would only be slower.
  disableTypeChecks: false,
  incrementalFile: 'tests/.results/mutation-incremental.json',
  tempDirName: 'tests/.results/mutation',
  cleanTempDir: 'always',
  ignorePatterns: ['/.next', '/.data', '/app', '/coverage', '/public'],
  reporters: ['json', 'progress-append-only'],
  jsonReporter: { fileName: reportFile },
  allowConsoleColors: false,
}
