import { existsSync, readFileSync } from 'node:fs'

/**
 * What a runner's own report says. A report that is missing, unreadable or empty, and a runner that ended badly
 * though its report names no failure, are failures: silence is never counted as passing.
 */
export function countReport({ kind, file, succeeded }) {
  const report = readReport(file)
  if (!report) return oneFailure('left no report that can be read')
  const counts = kind === 'vitest' ? vitestCounts(report) : playwrightCounts(report)
  if (!Object.values(counts).every(Number.isInteger)) return oneFailure('left a strange report')
  if (counts.passed + counts.failed === 0) {
    return { ...oneFailure('ran no test'), skipped: counts.skipped }
  }
  if (!succeeded && counts.failed === 0) {
    return { ...counts, failed: 1, note: 'ended badly though no test failed' }
  }
  return counts
}

/**
 * The counts of a run with what of the code it went through, for its line: `98.2 % of lines and 96.0 % of branches of
 * lib/domain`. Whether that is enough is for the runner's own thresholds to say: it then ends badly. Not to have
 * measured at all is a failure.
 */
export function withCoverage(counts, { file, covers }) {
  const total = readReport(file)?.total
  if (total?.lines?.total > 0 && total.branches?.total > 0) {
    const share = ({ pct }) => `${pct.toFixed(1)} %`
    const words = `${share(total.lines)} of lines and ${share(total.branches)} of branches of ${covers}`
    return { ...counts, note: counts.note ? `${counts.note}; ${words}` : words }
  }
  return counts.failed > 0 ? counts : { ...counts, failed: 1, note: `did not measure ${covers}` }
}

/** A step that is not a test runner counts as one. */
export function countStep(succeeded) {
  return { passed: succeeded ? 1 : 0, failed: succeeded ? 0 : 1, skipped: 0 }
}

export function sum(list) {
  const total = { passed: 0, failed: 0, skipped: 0 }
  for (const { passed, failed, skipped } of list) {
    total.passed += passed
    total.failed += failed
    total.skipped += skipped
  }
  return total
}

/** The last line of a run. */
export function lastLine({ passed, failed, skipped }) {
  return `${passed} passed, ${failed} failed${skipped > 0 ? `, ${skipped} skipped` : ''}`
}

function oneFailure(note) {
  return { passed: 0, failed: 1, skipped: 0, note }
}

function readReport(file) {
  if (!existsSync(file)) return null
  try {
    return JSON.parse(readFileSync(file, 'utf8'))
  } catch {
    return null
  }
}

function vitestCounts(report) {
  // A file that could not be loaded has no test to fail, but it failed.
  const brokenFiles = (report.testResults ?? []).filter(
    (file) => file.status === 'failed' && file.assertionResults.every((t) => t.status !== 'failed'),
  ).length
  return {
    passed: report.numPassedTests,
    failed: report.numFailedTests + brokenFiles,
    skipped: report.numPendingTests + report.numTodoTests,
  }
}

function playwrightCounts({ stats, errors = [] }) {
  // A test that passed only when tried again is not a test that passes.
  return {
    passed: stats?.expected,
    failed: stats?.unexpected + stats?.flaky + errors.length,
    skipped: stats?.skipped,
  }
}
