import { existsSync, readFileSync } from 'node:fs'
import type { RunResult } from '../services/runToEnd'
import { bad, type Outcome } from './outcome'

interface Report {
  numPassedTests: number
  numFailedTests: number
  numTotalTests: number
  numFailedTestSuites: number
}

/** Counts from Vitest's JSON report. Skipped tests, and runs without any test, count as failures. */
export function readVitestReport(file: string, { code, output }: RunResult): Outcome {
  if (!existsSync(file)) return bad(output)
  const report: Report = JSON.parse(readFileSync(file, 'utf8'))
  const skipped = report.numTotalTests - report.numPassedTests - report.numFailedTests
  let failed = report.numFailedTests + skipped
  // A file that does not even load, or an error outside every test, fails the run without failing a test.
  if (failed === 0 && (code !== 0 || report.numTotalTests === 0)) failed = 1
  const note = skipped > 0 ? `\n${skipped} tests were skipped; a test that does not run proves nothing.` : ''
  return { passed: report.numPassedTests, failed, report: failed > 0 ? output + note : '' }
}
