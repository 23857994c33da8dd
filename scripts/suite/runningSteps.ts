import { rmSync } from 'node:fs'
import { join } from 'node:path'
import { build, buildIsCurrent } from '../app/build'
import { openDataFolder } from '../services/folders'
import { bad, good, type Outcome, type Step } from './outcome'
import { readPlaywrightReport } from './playwrightReport'
import type { TestStack } from './TestStack'
import { runTool } from './tool'
import { runVitest } from './vitestStep'

/** The suites that run the code; the later ones need services, a build and a browser. */
export function runningSteps(stack: TestStack, pattern?: string): Step[] {
  return [
    { name: 'unit', group: 'unit', run: (signal) => runVitest({ project: 'unit', pattern }, signal) },
    {
      name: 'components',
      group: 'components',
      run: (signal) => runVitest({ project: 'components', pattern }, signal),
    },
    {
      name: 'integration',
      group: 'integration',
      run: async (signal) => {
        const env = await stack.integrationEnvironment(signal)
        return runVitest({ project: 'integration', pattern, env }, signal)
      },
    },
    { name: 'build', group: 'build', run: (signal) => makeBuild(stack, signal) },
    { name: 'end to end', group: 'e2e', run: (signal) => endToEnd(stack, signal, pattern) },
  ]
}

async function makeBuild(stack: TestStack, signal: AbortSignal): Promise<Outcome> {
  const { stack: services, env } = await stack.buildEnvironment()
  if (!buildIsCurrent(env)) await build(services.folder, env, signal)
  return good
}

async function endToEnd(stack: TestStack, signal: AbortSignal, pattern?: string): Promise<Outcome> {
  const { env: buildEnv } = await stack.buildEnvironment()
  if (!buildIsCurrent(buildEnv)) return bad('No journey ran: there is no build of these sources.')
  const env = await stack.serve(signal)
  const reportFile = join(openDataFolder('test').logs, 'playwright.json')
  rmSync(reportFile, { force: true })
  const args = ['test', '--reporter=list,json', ...(pattern ? [pattern] : [])]
  const result = await runTool('playwright', args, signal, {
    ...env,
    PLAYWRIGHT_JSON_OUTPUT_FILE: reportFile,
  })
  return readPlaywrightReport(reportFile, result)
}
