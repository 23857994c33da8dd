import { runSteps } from '../suite/runSteps'
import { staticSteps, typeStep } from '../suite/staticSteps'
import { runVitest } from '../suite/vitestStep'

/** What a developer wants to know within seconds, before a commit: no services, no browser. */
export async function main(): Promise<number> {
  const stop = new AbortController()
  for (const signal of ['SIGINT', 'SIGTERM'] as const) process.on(signal, () => stop.abort())
  const unit = {
    name: 'unit',
    group: 'unit',
    run: (signal: AbortSignal) => runVitest({ project: 'unit' }, signal),
  } as const
  const { passed, failed } = await runSteps([typeStep, ...staticSteps(true), unit], stop.signal)
  console.log(`\n${passed} passed, ${failed} failed`)
  return failed > 0 ? 1 : 0
}
