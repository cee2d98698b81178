import { existsSync, readFileSync } from 'node:fs'

/** A step without tests of its own (lint, types) counts as one. */
export const stepCounts = (ok) => ({ passed: ok ? 1 : 0, failed: ok ? 0 : 1 })

const read = (file) => (existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : null)

/**
 * Counts of vitest's JSON report. What was skipped could not show anything and counts as failed;
 * so does a file that could not be loaded, and a run that ended badly although every test passed (an unhandled error).
 */
export function vitestCounts(file, status) {
  const report = read(file)
  if (!report) return stepCounts(false)
  const { numPassedTests: passed, numFailedTests, numPendingTests = 0, numTodoTests = 0, testResults = [] } = report
  const unloaded = testResults.filter(
    (result) => result.status === 'failed' && result.assertionResults.length === 0,
  ).length
  return atLeastOneFailure(passed, numFailedTests + numPendingTests + numTodoTests + unloaded, status)
}

/** Counts of Playwright's JSON report; skipped and flaky count as failed, errors outside a test too. */
export function playwrightCounts(file, status) {
  const report = read(file)
  if (!report) return stepCounts(false)
  const { expected, unexpected, flaky, skipped } = report.stats
  return atLeastOneFailure(expected, unexpected + flaky + skipped + report.errors.length, status)
}

const atLeastOneFailure = (passed, failed, status) => ({
  passed,
  failed: failed === 0 && (status !== 0 || passed === 0) ? 1 : failed,
})

/** The sum over all parts. */
export const sumOf = (counts) =>
  counts.reduce((sum, { passed, failed }) => ({ passed: sum.passed + passed, failed: sum.failed + failed }), {
    passed: 0,
    failed: 0,
  })

/** The closing line, in the one form that machines look for. */
export const closingLine = ({ passed, failed }) => `${passed} passed, ${failed} failed`
