import { spawnSync } from 'node:child_process'

const PYTHON = '/usr/bin/python3'

/** Seconds that a piece of Python measured for itself and printed, by name; null where it cannot run. */
export function independentTimes(script: string): Record<string, number> | null {
  const run = spawnSync(PYTHON, ['-W', 'ignore', '-c', script], { encoding: 'utf8' })
  if (run.status !== 0) return null
  return JSON.parse(run.stdout) as Record<string, number>
}
