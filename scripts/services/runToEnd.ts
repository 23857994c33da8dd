import { spawn } from 'node:child_process'
import { createWriteStream } from 'node:fs'
import { projectRoot } from './folders'

export interface RunPlan {
  command: string
  args: readonly string[]
  env?: Record<string, string | undefined>
  /** All output goes here too. */
  logFile?: string
  /** Ends the program, and whatever it started, when aborted. */
  signal?: AbortSignal
  /** Lends the terminal's input, for a password that sudo may ask. */
  lendTerminal?: boolean
}

export interface RunResult {
  code: number
  output: string
}

/** Runs a program to its end and collects what it says; never throws. */
export function runToEnd({ command, args, env, logFile, signal, lendTerminal }: RunPlan): Promise<RunResult> {
  return new Promise((resolve) => {
    const log = logFile ? createWriteStream(logFile, { mode: 0o600 }) : undefined
    const child = spawn(command, [...args], {
      cwd: projectRoot,
      env: { ...process.env, ...env },
      stdio: [lendTerminal ? 'inherit' : 'ignore', 'pipe', 'pipe'],
      // What we can end gets a group of its own, so that all of it ends; the rest hears Ctrl-C itself.
      detached: signal !== undefined,
    })
    let output = ''
    const collect = (chunk: Buffer) => {
      output += chunk.toString()
      log?.write(chunk)
    }
    const end = () => {
      try {
        if (child.pid !== undefined) process.kill(-child.pid, 'SIGTERM')
      } catch {
        // It ended by itself at the same moment.
      }
    }
    const finish = (code: number) => {
      signal?.removeEventListener('abort', end)
      log?.end()
      resolve({ code, output })
    }
    child.stdout?.on('data', collect)
    child.stderr?.on('data', collect)
    child.once('error', (error) => {
      output += `${error.message}\n`
      finish(127)
    })
    child.once('close', (code) => finish(code ?? 1))
    if (signal?.aborted) end()
    signal?.addEventListener('abort', end, { once: true })
  })
}

/** Runs one of our own TypeScript programs, or a package's, with Node and tsx. */
export function nodeWithTsx(script: string, ...args: string[]): Pick<RunPlan, 'command' | 'args'> {
  return { command: process.execPath, args: ['--import', 'tsx', script, ...args] }
}
