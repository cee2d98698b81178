import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { closingLine, playwrightCounts, sumOf, vitestCounts } from '../../../scripts/setup/test-counts.mjs'

let folder
beforeAll(() => (folder = mkdtempSync(path.join(tmpdir(), 'turnrow-counts-'))))
afterAll(() => rmSync(folder, { recursive: true }))

const reported = (content) => {
  const file = path.join(folder, 'report.json')
  writeFileSync(file, JSON.stringify(content))
  return file
}
const vitest = (more) => reported({ numPassedTests: 3, numFailedTests: 0, testResults: [], ...more })
const playwright = (more) =>
  reported({ errors: [], stats: { expected: 2, unexpected: 0, flaky: 0, skipped: 0, ...more } })

describe('what a run of vitest counts as', () => {
  it('is its passed and failed tests', () => {
    expect(vitestCounts(vitest({}), 0)).toEqual({ passed: 3, failed: 0 })
    expect(vitestCounts(vitest({ numFailedTests: 2 }), 1)).toEqual({ passed: 3, failed: 2 })
  })

  it('counts what was skipped or left to do as failed', () => {
    expect(vitestCounts(vitest({ numPendingTests: 1, numTodoTests: 1 }), 0).failed).toBe(2)
  })

  it('counts a file that could not be loaded as failed', () => {
    const testResults = [{ status: 'failed', assertionResults: [] }]
    expect(vitestCounts(vitest({ testResults }), 1).failed).toBe(1)
  })

  it('fails a run that ended badly, found nothing or left no report', () => {
    expect(vitestCounts(vitest({}), 1)).toEqual({ passed: 3, failed: 1 })
    expect(vitestCounts(vitest({ numPassedTests: 0 }), 0)).toEqual({ passed: 0, failed: 1 })
    expect(vitestCounts(path.join(folder, 'none.json'), 0)).toEqual({ passed: 0, failed: 1 })
  })
})

describe('what a run in the browser counts as', () => {
  it('takes flaky, skipped and stray errors for failures', () => {
    expect(playwrightCounts(playwright({}), 0)).toEqual({ passed: 2, failed: 0 })
    expect(playwrightCounts(playwright({ flaky: 1, skipped: 1, unexpected: 1 }), 1)).toEqual({ passed: 2, failed: 3 })
    expect(
      playwrightCounts(reported({ errors: [{}], stats: { expected: 0, unexpected: 0, flaky: 0, skipped: 0 } }), 1)
        .failed,
    ).toBe(1)
  })
})

it('closes with the sum in one line', () => {
  expect(
    closingLine(
      sumOf([
        { passed: 3, failed: 0 },
        { passed: 1, failed: 2 },
      ]),
    ),
  ).toBe('4 passed, 2 failed')
  expect(closingLine(sumOf([]))).toBe('0 passed, 0 failed')
})
