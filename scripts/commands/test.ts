import { parseArgs } from 'node:util'
import { Problem } from '../services/Problem'
import type { StepGroup } from '../suite/outcome'
import { runningSteps } from '../suite/runningSteps'
import { runSteps } from '../suite/runSteps'
import { staticSteps, typeStep } from '../suite/staticSteps'
import { TestStack } from '../suite/TestStack'

const groups: readonly StepGroup[] = ['static', 'types', 'unit', 'components', 'integration', 'build', 'e2e']
const needingServices: readonly StepGroup[] = ['integration', 'build', 'e2e']

/** Every check and every test. `--only=unit,e2e` narrows to groups, a last word to files of that name. */
export async function main(args: string[]): Promise<number> {
  const { values, positionals } = parseArgs({
    args,
    options: { only: { type: 'string' } },
    allowPositionals: true,
  })
  const wanted = readGroups(values.only)
  const started = Date.now()
  const stop = new AbortController()
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.on(signal, () => stop.abort())

  const stack = new TestStack()
  // Services come up while the checks that need none are running.
  if (wanted.some((group) => needingServices.includes(group))) void stack.start()
  const steps = [typeStep, ...staticSteps(), ...runningSteps(stack, positionals[0])]
  const tally = await runSteps(
    steps.filter(({ group }) => wanted.includes(group)),
    stop.signal,
  )
  await stack.stop()
  console.log(`\nAll of it took ${((Date.now() - started) / 1000).toFixed(0)} s.`)
  const nothingRan = tally.passed + tally.failed === 0
  if (nothingRan) console.log('No test ran.')
  console.log(`${tally.passed} passed, ${tally.failed} failed`)
  return tally.failed > 0 || nothingRan || stop.signal.aborted ? 1 : 0
}

function readGroups(only: string | undefined): StepGroup[] {
  if (only === undefined) return [...groups]
  const names = only.split(',').map((name) => name.trim())
  const unknown = names.filter((name) => !groups.some((group) => group === name))
  if (unknown.length > 0) {
    throw new Problem(
      `There is no group of tests called "${unknown.join(', ')}".`,
      `Choose from ${groups.join(', ')}.`,
    )
  }
  const chosen = groups.filter((group) => names.includes(group))
  // What the browser sees is the build.
  return chosen.includes('e2e') && !chosen.includes('build')
    ? groups.filter((g) => chosen.includes(g) || g === 'build')
    : chosen
}
