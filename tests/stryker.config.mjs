/*
 * Mutation testing of the core. Seven groups of files, each of which must reach `leastPercent` by itself
 * (tests/setup/mutation.mjs counts them). Left out, since a change in them is another datum or another word and no
 * broken rule; outside tests and `npm run test:constants` hold what they say:
 * - ticket-types.ts: types only
 * - ticket-words.ts, round-words.ts, harm-phrases/: wording for staff
 * - what runs once when a file is loaded (`ignoreStatic`): tables of steps, odds, causes, key words and limits
 */
const domain = (...names) => names.map((name) => `lib/domain/${name}.ts`)

export const mutatedGroups = {
  flow: domain('flow', 'flow-physics', 'flow-settings', 'flow-trend', 'flow-water'),
  cycle: domain('cycle', 'day'),
  round: domain(
    'round',
    'round-ahead',
    'round-going',
    'round-spread',
    'round-text',
    'round-window',
  ),
  ticket: domain('ticket', 'ticket-answer', 'ticket-moves', 'ticket-opening'),
  walk: domain(
    'walk',
    'walk-catalogue',
    'walk-check',
    'walk-odds',
    'walk-rules',
    'walk-search',
    'walk-suspects',
    'walk-trials',
  ),
  harm: domain('harm', 'harm-words'),
  consent: domain('consent'),
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
  timeoutMS: 10_000,
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
