import { existsSync, readFileSync } from 'node:fs'
import type { RunResult } from '../services/runToEnd'
import { bad, type Outcome } from './outcome'

interface Report {
  stats: { expected: number; unexpected: number; flaky: number; skipped: number }
  errors: { message?: string }[]
}

/** Counts from Playwright's JSON report. Skipped tests count as failures; one that passed at its second try is named. */
export function readPlaywrightReport(file: string, { code, output }: RunResult): Outcome {
  if (!existsSync(file)) return bad(output)
  const { stats, errors }: Report = JSON.parse(readFileSync(file, 'utf8'))
  const failed = stats.unexpected + stats.skipped
  const passed = stats.expected + stats.flaky
  const total = failed + passed
  const counted = failed === 0 && (code !== 0 || errors.length > 0 || total === 0) ? 1 : failed
  const note = stats.skipped > 0 ? `\n${stats.skipped} tests were skipped or never ran.` : ''
  const second = stats.flaky > 0 ? `${stats.flaky} tests passed only at the second try.` : ''
  return { passed, failed: counted, report: counted > 0 ? output + note : second }
}
