import { rmSync } from 'node:fs'
import { join } from 'node:path'
import { openDataFolder } from '../services/folders'
import { bad, type Outcome } from './outcome'
import { runTool } from './tool'
import { readVitestReport } from './vitestReport'

export interface VitestPlan {
  project: 'unit' | 'components' | 'integration'
  /** Narrows to test files whose path holds this. */
  pattern?: string
  env?: Record<string, string>
}

/** Runs one of Vitest's projects and counts its tests. */
export async function runVitest(
  { project, pattern, env }: VitestPlan,
  signal: AbortSignal,
): Promise<Outcome> {
  const reportFile = join(openDataFolder('test').logs, `vitest-${project}.json`)
  rmSync(reportFile, { force: true })
  const args = [
    'run',
    ...['--project', project],
    ...['--reporter=dot', '--reporter=json', `--outputFile.json=${reportFile}`],
    ...(pattern ? ['--passWithNoTests', pattern] : []),
  ]
  const result = await runTool('vitest', args, signal, env)
  if (signal.aborted) return bad(result.output)
  return readVitestReport(reportFile, result)
}
