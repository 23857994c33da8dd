import { spawnSync } from 'node:child_process'

export const PYTHON = '/usr/bin/python3'

function run(args: readonly string[]): Record<string, number> | null {
  const { status, stdout } = spawnSync(PYTHON, ['-W', 'ignore', ...args], { encoding: 'utf8' })
  return status === 0 ? (JSON.parse(stdout) as Record<string, number>) : null
}

/** Seconds that a piece of Python measured for itself and printed, by name; null where it cannot run. */
export function independentTimes(script: string): Record<string, number> | null {
  return run(['-c', script])
}

/** The same of a file beside this one, with arguments. */
export function timesOfFile(name: string, ...args: readonly string[]): Record<string, number> | null {
  return run([new URL(name, import.meta.url).pathname, ...args])
}
