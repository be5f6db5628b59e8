import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { countReport, countStep, lastLine, sum, withCoverage } from '@/tests/setup/counts.mjs'

let folder = ''
beforeAll(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'rillpost-counts-'))
})
afterAll(() => rmSync(folder, { recursive: true }))

function reportOf(content: string | object): string {
  const file = path.join(folder, `${Math.random()}.json`)
  writeFileSync(file, typeof content === 'string' ? content : JSON.stringify(content))
  return file
}

const green = {
  numPassedTests: 7,
  numFailedTests: 0,
  numPendingTests: 1,
  numTodoTests: 1,
  testResults: [{ status: 'passed', assertionResults: [{ status: 'passed' }] }],
}

describe('a report of unit tests', () => {
  test('gives what passed, failed and was skipped', () => {
    const counts = countReport({ kind: 'vitest', file: reportOf(green), succeeded: true })
    expect(counts).toEqual({ passed: 7, failed: 0, skipped: 2 })
  })

  test('with a file that could not be loaded has a failure', () => {
    const broken = { ...green, testResults: [{ status: 'failed', assertionResults: [] }] }
    const counts = countReport({ kind: 'vitest', file: reportOf(broken), succeeded: false })
    expect(counts).toMatchObject({ passed: 7, failed: 1 })
  })

  test('without a failure, from a runner that ended badly, has one', () => {
    const counts = countReport({ kind: 'vitest', file: reportOf(green), succeeded: false })
    expect(counts).toMatchObject({ passed: 7, failed: 1 })
  })
})

describe('a run that measures what it covers', () => {
  const passed = { passed: 7, failed: 0, skipped: 0 }
  const covers = 'lib/domain'
  const total = { lines: { total: 200, pct: 98.21 }, branches: { total: 90, pct: 96 } }
  const words = '98.2 % of lines and 96.0 % of branches of lib/domain'

  test('says so beside its counts, and beside what else is to be said', () => {
    const file = reportOf({ total })
    expect(withCoverage(passed, { file, covers })).toEqual({ ...passed, note: words })
    const short = { ...passed, failed: 1, note: 'ended badly though no test failed' }
    expect(withCoverage(short, { file, covers }).note).toBe(`${short.note}; ${words}`)
  })

  test.each([
    ['left no summary', () => path.join(folder, 'nothing.json')],
    [
      'saw no line',
      () =>
        reportOf({ total: { lines: { total: 0, pct: 100 }, branches: { total: 0, pct: 100 } } }),
    ],
  ])('has a failure when it %s', (_title, file) => {
    expect(withCoverage(passed, { file: file(), covers })).toMatchObject({ failed: 1 })
    expect(withCoverage({ ...passed, failed: 2 }, { file: file(), covers }).failed).toBe(2)
  })
})

describe('a report of browser tests', () => {
  test('gives what passed, failed and was skipped', () => {
    const file = reportOf({
      stats: { expected: 3, unexpected: 1, flaky: 0, skipped: 2 },
      errors: [],
    })
    const counts = countReport({ kind: 'playwright', file, succeeded: false })
    expect(counts).toEqual({ passed: 3, failed: 1, skipped: 2 })
  })

  test('counts a test that passed only on another try as failed', () => {
    const file = reportOf({ stats: { expected: 3, unexpected: 0, flaky: 1, skipped: 0 } })
    expect(countReport({ kind: 'playwright', file, succeeded: true })).toMatchObject({ failed: 1 })
  })

  test('counts an error outside any test', () => {
    const stats = { expected: 3, unexpected: 0, flaky: 0, skipped: 0 }
    const file = reportOf({ stats, errors: [{ message: 'no browser' }] })
    expect(countReport({ kind: 'playwright', file, succeeded: false })).toMatchObject({ failed: 1 })
  })
})

describe.each(['vitest', 'playwright'])('from %s, silence is a failure:', (kind) => {
  test.each([
    ['no report', () => path.join(folder, 'nothing.json')],
    ['half a report', () => reportOf('{"numPassed')],
    ['a report of something else', () => reportOf({})],
    ['no test', () => reportOf({ ...green, numPassedTests: 0, stats: noTests })],
  ])('%s', (_title, file) => {
    const counts = countReport({ kind, file: file(), succeeded: true })
    expect(counts).toMatchObject({ passed: 0, failed: 1 })
  })
})

const noTests = { expected: 0, unexpected: 0, flaky: 0, skipped: 4 }

test('the last line sums every step and names skipped tests only when there are some', () => {
  const steps = [countStep(true), countStep(false), { passed: 5, failed: 0, skipped: 0 }]
  expect(lastLine(sum(steps))).toBe('6 passed, 1 failed')
  expect(lastLine({ passed: 6, failed: 0, skipped: 2 })).toBe('6 passed, 0 failed, 2 skipped')
})
