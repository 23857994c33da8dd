import { join } from 'node:path'
import { projectRoot } from '../services/folders'
import { runToEnd, type RunResult } from '../services/runToEnd'
import { bad, good, type Outcome } from './outcome'

/** Runs a program of node_modules/.bin, without colours and questions. */
export function runTool(
  name: string,
  args: readonly string[],
  signal: AbortSignal,
  env: Record<string, string | undefined> = {},
): Promise<RunResult> {
  return runToEnd({
    command: join(projectRoot, 'node_modules', '.bin', name),
    args,
    env: { NO_COLOR: '1', FORCE_COLOR: undefined, CI: 'true', NEXT_TELEMETRY_DISABLED: '1', ...env },
    signal,
  })
}

/** A check that either passes or says why not. */
export async function checkWith(
  name: string,
  args: readonly string[],
  signal: AbortSignal,
): Promise<Outcome> {
  const { code, output } = await runTool(name, args, signal)
  return code === 0 ? good : bad(output)
}
