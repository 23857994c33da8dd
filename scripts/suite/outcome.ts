/** What a step found. A static check counts as one test. */
export interface Outcome {
  passed: number
  failed: number
  /** What a reader needs to see when something failed. */
  report: string
}

export type StepGroup = 'static' | 'types' | 'unit' | 'components' | 'integration' | 'build' | 'e2e'

export interface Step {
  name: string
  group: StepGroup
  run: (signal: AbortSignal) => Promise<Outcome>
}

export const good: Outcome = { passed: 1, failed: 0, report: '' }

export function bad(report: string): Outcome {
  return { passed: 0, failed: 1, report }
}
