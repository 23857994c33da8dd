import { spawn } from 'node:child_process'
import { existsSync, openSync, closeSync, renameSync } from 'node:fs'
import { setTimeout as sleep } from 'node:timers/promises'
import { relativeToProject, tailOf } from './folders'
import { Problem } from './Problem'

export interface ChildPlan {
  name: string
  command: string
  args: readonly string[]
  env?: Record<string, string | undefined>
  cwd?: string
  logFile: string
}

export interface Ending {
  code: number | null
  signal: NodeJS.Signals | null
}

/** One service as a process of its own, in its own process group. */
export interface Child {
  name: string
  pid: number
  logFile: string
  ended: Promise<Ending>
  hasEnded: () => boolean
  stop: (graceMs?: number) => Promise<void>
}

const setpriv = ['/usr/bin/setpriv', '/bin/setpriv'].find((path) => existsSync(path))

/** Starts a service; its output goes to its log, the log of the run before is kept as `.1`. */
export function startChild(plan: ChildPlan): Child {
  if (existsSync(plan.logFile)) renameSync(plan.logFile, `${plan.logFile}.1`)
  const log = openSync(plan.logFile, 'a', 0o600)
  // Should this process be killed outright, the kernel ends the service too: no orphan holds a port or a data folder.
  const [command, args] = setpriv
    ? [setpriv, ['--pdeathsig', 'TERM', '--', plan.command, ...plan.args]]
    : [plan.command, [...plan.args]]
  const process_ = spawn(command, args, {
    cwd: plan.cwd,
    env: { ...process.env, ...plan.env },
    stdio: ['ignore', log, log],
    detached: true,
  })
  closeSync(log)
  let over = false
  const ended = new Promise<Ending>((resolve) => {
    process_.once('error', () => resolve({ code: 127, signal: null }))
    process_.once('exit', (code, signal) => resolve({ code, signal }))
  }).then((ending) => {
    over = true
    return ending
  })
  const pid = process_.pid ?? 0
  return {
    name: plan.name,
    pid,
    logFile: plan.logFile,
    ended,
    hasEnded: () => over,
    stop: async (graceMs = 15_000) => {
      signalGroup(pid, 'SIGTERM')
      const gone = await Promise.race([ended.then(() => true), sleep(graceMs, false, { ref: false })])
      if (!gone) signalGroup(pid, 'SIGKILL')
      await ended
      signalGroup(pid, 'SIGKILL')
    },
  }
}

function signalGroup(pid: number, signal: NodeJS.Signals): void {
  if (pid === 0) return
  try {
    process.kill(-pid, signal)
  } catch {
    // The whole group has gone already.
  }
}

/** Waits until a service answers; one that ends before, or never answers, is put away and its log's end shown. */
export async function untilReady(
  child: Child,
  answers: () => Promise<boolean>,
  seconds: number,
): Promise<void> {
  const deadline = Date.now() + seconds * 1000
  while (Date.now() < deadline) {
    if (child.hasEnded()) throw childProblem(child, 'ended while starting')
    if (await answers().catch(() => false)) return
    await sleep(100)
  }
  const problem = childProblem(child, `did not answer within ${seconds} s`)
  await child.stop()
  throw problem
}

export function childProblem(child: Child, what: string): Problem {
  return new Problem(
    `${sentenceStart(child.name)} ${what}.`,
    `The reason is at the end of ${relativeToProject(child.logFile)} (shown above). Put it right and run again.`,
    tailOf(child.logFile),
  )
}

export function sentenceStart(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1)
}
