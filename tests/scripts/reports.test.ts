import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, afterEach, describe, expect, it, vi } from 'vitest'
import { readPlaywrightReport } from '@/scripts/suite/playwrightReport'
import { runSteps } from '@/scripts/suite/runSteps'
import { readVitestReport } from '@/scripts/suite/vitestReport'

const folder = mkdtempSync(join(tmpdir(), 'reports-'))
const file = join(folder, 'report.json')

afterEach(() => rmSync(file, { force: true }))
afterAll(() => rmSync(folder, { recursive: true }))

function vitest(passed: number, failed: number, total: number, code: number) {
  const report = {
    numPassedTests: passed,
    numFailedTests: failed,
    numTotalTests: total,
    numFailedTestSuites: 0,
  }
  writeFileSync(file, JSON.stringify(report))
  return readVitestReport(file, { code, output: 'what was said' })
}

function playwright(stats: object, code: number) {
  const all = { expected: 0, unexpected: 0, flaky: 0, skipped: 0, ...stats }
  writeFileSync(file, JSON.stringify({ stats: all, errors: [] }))
  return readPlaywrightReport(file, { code, output: 'what was said' })
}

// Seen to fail with the exit code ignored (a file that does not load passed) and with skipped tests left out.
describe('counting tests', () => {
  it.each([
    ['all pass', vitest.bind(null, 5, 0, 5, 0), 5, 0],
    ['one fails', vitest.bind(null, 4, 1, 5, 1), 4, 1],
    ['one is skipped', vitest.bind(null, 4, 0, 5, 0), 4, 1],
    ['a file does not load', vitest.bind(null, 5, 0, 5, 1), 5, 1],
    ['there is no test', vitest.bind(null, 0, 0, 0, 0), 0, 1],
    ['all journeys pass', playwright.bind(null, { expected: 3 }, 0), 3, 0],
    ['a journey fails', playwright.bind(null, { expected: 2, unexpected: 1 }, 1), 2, 1],
    ['a journey passed at its second try', playwright.bind(null, { expected: 2, flaky: 1 }, 0), 3, 0],
    ['a journey never ran', playwright.bind(null, { expected: 2, skipped: 1 }, 0), 2, 1],
    ['no journey exists', playwright.bind(null, {}, 0), 0, 1],
  ])('when %s', (_case, read, passed, failed) => {
    expect(read()).toMatchObject({ passed, failed })
  })

  it('counts a run that left no report as one failure and shows what it said', () => {
    expect(readVitestReport(file, { code: 1, output: 'out of memory' })).toEqual({
      passed: 0,
      failed: 1,
      report: 'out of memory',
    })
  })
})

describe('running the steps', () => {
  it('goes on after a failure, adds up, and turns an exception into a failure', async () => {
    const log = vi.spyOn(console, 'log').mockImplementation(() => undefined)
    const step = (name: string, run: () => Promise<{ passed: number; failed: number; report: string }>) =>
      ({ name, group: 'unit', run }) as const
    const tally = await runSteps(
      [
        step('first', async () => ({ passed: 3, failed: 0, report: '' })),
        step('second', () => Promise.reject(new Error('the database is gone'))),
        step('third', async () => ({ passed: 1, failed: 2, report: 'expected 2 to be 3' })),
      ],
      new AbortController().signal,
    )
    const said = log.mock.calls.flat().join('\n')
    log.mockRestore()
    expect(tally).toEqual({ passed: 4, failed: 3 })
    expect(said).toContain('the database is gone')
    expect(said).toContain('expected 2 to be 3')
  })

  it('stops before the next step when interrupted', async () => {
    const log = vi.spyOn(console, 'log').mockImplementation(() => undefined)
    const stop = new AbortController()
    stop.abort()
    const run = vi.fn()
    const tally = await runSteps([{ name: 'first', group: 'unit', run }], stop.signal)
    log.mockRestore()
    expect(run).not.toHaveBeenCalled()
    expect(tally).toEqual({ passed: 0, failed: 0 })
  })
})
