import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import type { Environment } from '../services/environment'
import { projectRoot, relativeToProject, type DataFolder } from '../services/folders'
import { Problem } from '../services/Problem'
import { addressOfRunning } from '../services/runningNote'
import { runToEnd } from '../services/runToEnd'
import { sourceHash } from './sourceHash'

const stamp = join(projectRoot, '.next', 'sources.sha256')
const next = join(projectRoot, 'node_modules', 'next', 'dist', 'bin', 'next')

/** Whether the build that is there was made from the sources as they are now. */
export function buildIsCurrent(env: Environment): boolean {
  return existsSync(stamp) && readFileSync(stamp, 'utf8') === hashFor(env)
}

/** Builds the application; the stamp is written last, so a broken build is never taken for a good one. */
export async function build(folder: DataFolder, env: Environment, signal?: AbortSignal): Promise<void> {
  refuseUnderRunningServer(folder)
  const hash = hashFor(env)
  rmSync(stamp, { force: true })
  const logFile = join(folder.logs, 'build.log')
  const { code, output } = await runToEnd({
    command: process.execPath,
    args: [next, 'build'],
    env: { ...env, NODE_ENV: 'production', NO_COLOR: '1', FORCE_COLOR: undefined },
    logFile,
    signal,
  })
  if (signal?.aborted) return
  if (code !== 0) {
    throw new Problem(
      'The application could not be built.',
      `The lines above say why (all of it: ${relativeToProject(logFile)}). Put it right and run again.`,
      output
        .trim()
        .split('\n')
        .filter((line) => !/^\s*at <unknown>/.test(line))
        .slice(-25),
    )
  }
  writeFileSync(stamp, hash)
}

function hashFor(env: Environment): string {
  return sourceHash(env.NEXT_SERVER_ACTIONS_ENCRYPTION_KEY ?? '')
}

/** A server whose files are replaced under it serves broken pages. */
function refuseUnderRunningServer(folder: DataFolder): void {
  for (const mode of ['demo', 'production']) {
    if (mode === folder.mode) continue
    const address = addressOfRunning(mode)
    if (!address) continue
    throw new Problem(
      `The sources have changed, and ${address} still serves the build from before.`,
      'Stop it with Ctrl-C in its terminal, then run again: one folder holds one build.',
    )
  }
}
