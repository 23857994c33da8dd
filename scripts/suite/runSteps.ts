import { stripVTControlCharacters } from 'node:util'
import { Problem } from '../services/Problem'
import { bad, type Outcome, type Step, type StepGroup } from './outcome'

export interface Tally {
  passed: number
  failed: number
}

const minutesPerStep = 15

// Two cores: what uses one runs beside another of its kind; the suites that use both run alone.
const phases: readonly (readonly StepGroup[])[] = [
  ['static', 'types'],
  ['unit'],
  ['components'],
  ['integration', 'build'],
  ['e2e'],
]

/** Runs the steps phase by phase, says of each how it went, shows the output of those that failed. */
export async function runSteps(steps: readonly Step[], stop: AbortSignal): Promise<Tally> {
  const tally: Tally = { passed: 0, failed: 0 }
  const width = Math.max(...steps.map((step) => step.name.length))
  const run = async (step: Step) => {
    const started = Date.now()
    const outcome = await attempt(step, AbortSignal.any([stop, AbortSignal.timeout(minutesPerStep * 60_000)]))
    tally.passed += outcome.passed
    tally.failed += outcome.failed
    const seconds = ((Date.now() - started) / 1000).toFixed(1).padStart(6)
    const verdict = outcome.failed > 0 ? 'FAILED' : 'passed'
    const counts = `${outcome.passed} passed, ${outcome.failed} failed`
    console.log(`${verdict}  ${step.name.padEnd(width)}  ${seconds} s  ${counts}`)
    if (outcome.failed > 0) console.log(indent(outcome.report))
  }
  for (const phase of phases) {
    const waiting = steps.filter(({ group }) => phase.includes(group))
    const worker = async () => {
      for (let step = waiting.shift(); step && !stop.aborted; step = waiting.shift()) await run(step)
    }
    await Promise.all([worker(), worker()])
  }
  return tally
}

async function attempt(step: Step, signal: AbortSignal): Promise<Outcome> {
  try {
    const outcome = await step.run(signal)
    if (!signal.aborted) return outcome
    return bad(`Interrupted, or not done within ${minutesPerStep} minutes.\n${outcome.report}`)
  } catch (error) {
    if (error instanceof Problem) return bad([error.message, ...error.details, error.remedy].join('\n'))
    return bad(error instanceof Error ? (error.stack ?? error.message) : String(error))
  }
}

/** The end of an output holds its findings; more than this nobody reads on a terminal. */
function indent(report: string): string {
  const lines = stripVTControlCharacters(report).trimEnd().split('\n')
  const shown = lines.length > 160 ? ['...', ...lines.slice(-160)] : lines
  return shown.map((line) => `        ${line}`.trimEnd()).join('\n')
}
