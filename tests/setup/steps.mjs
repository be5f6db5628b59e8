import path from 'node:path'

const bin = (name) => path.join('node_modules', '.bin', name)
const script = (...parts) => [path.join(...parts)]

/** Checks that read the sources only. Two at a time are safe: none writes what another reads. */
export const staticSteps = [
  { name: 'format', command: bin('prettier'), parameters: ['--check', '.'], limitSeconds: 180 },
  { name: 'lint', command: bin('oxlint'), parameters: ['--format', 'unix'], limitSeconds: 180 },
  { name: 'types', command: 'npm', parameters: ['run', '--silent', 'types'], limitSeconds: 420 },
  {
    name: 'import rules',
    command: 'npm',
    parameters: ['run', '--silent', 'rules'],
    limitSeconds: 180,
  },
  { name: 'unused code', command: bin('knip'), parameters: [], limitSeconds: 180 },
  {
    name: 'file sizes',
    command: process.execPath,
    parameters: script('tests', 'setup', 'file-sizes.mjs'),
    limitSeconds: 60,
  },
]

export const buildStep = {
  name: 'build',
  command: process.execPath,
  parameters: script('lib', 'commands', 'build.mjs'),
  limitSeconds: 480,
}

const vitest = { command: bin('vitest'), kind: 'vitest' }
const vitestRun = ['run', '--config', path.join('tests', 'vitest.config.ts')]

export const unitStep = {
  ...vitest,
  name: 'unit and outside',
  report: 'unit',
  parameters: [...vitestRun, '--project', 'unit', '--project', 'outside', '--coverage'],
  environment: { TZ: 'Asia/Kathmandu' },
  covers: 'lib/domain',
  limitSeconds: 900,
}

export const embeddedStep = {
  ...vitest,
  name: 'integration on PGlite',
  report: 'integration-pglite',
  parameters: [...vitestRun, '--project', 'integration'],
  environment: {},
  limitSeconds: 600,
}

export function postgresStep(url) {
  return {
    ...vitest,
    name: 'integration on PostgreSQL',
    report: 'integration-postgres',
    parameters: [...vitestRun, '--project', 'integration'],
    environment: { TEST_DATABASE_URL: url },
    limitSeconds: 600,
  }
}

export function browserStep(browser) {
  return {
    name: 'end to end',
    kind: 'playwright',
    report: 'e2e',
    command: bin('playwright'),
    parameters: ['test', '--config', path.join('tests', 'playwright.config.ts')],
    environment: { CHROMIUM_PATH: browser },
    limitSeconds: 1080,
  }
}
