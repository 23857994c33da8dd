import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { setTimeout as sleep } from 'node:timers/promises'
import { join } from 'node:path'
import { projectRoot, relativeToProject, type DataFolder } from './folders'
import { Problem } from './Problem'

interface ProcessNote {
  pid: number
  /** When the kernel started it: tells it from a later process with the same number. */
  startedAt: string
  name: string
}

interface RunningNote {
  supervisor: ProcessNote
  children: ProcessNote[]
  address?: string
}

const noteFile = (folder: Pick<DataFolder, 'path'>) => join(folder.path, 'running.json')

/** Field 22 of /proc/pid/stat, counted after the bracketed name, which may hold spaces. */
function startTime(pid: number): string | undefined {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8')
    return stat.slice(stat.lastIndexOf(')') + 2).split(' ')[19]
  } catch {
    return undefined
  }
}

function isAlive(note: ProcessNote): boolean {
  return startTime(note.pid) === note.startedAt
}

function readNote(folder: Pick<DataFolder, 'path'>): RunningNote | undefined {
  if (!existsSync(noteFile(folder))) return undefined
  try {
    return JSON.parse(readFileSync(noteFile(folder), 'utf8'))
  } catch {
    return undefined
  }
}

/** Where the application of that mode is served from this project now, if it is. */
export function addressOfRunning(mode: string): string | undefined {
  const note = readNote({ path: join(projectRoot, '.data', mode) })
  return note && isAlive(note.supervisor) ? note.address : undefined
}

/** Refuses a second run on the same data; ends what a killed run left behind. */
export async function claimDataFolder(folder: DataFolder): Promise<void> {
  const note = readNote(folder)
  if (note && note.supervisor.pid !== process.pid && isAlive(note.supervisor)) {
    const where = note.address ? ` at ${note.address}` : ''
    throw new Problem(
      `Noctuary is running already${where}, with the data in ${relativeToProject(folder.path)}.`,
      `Use it there, or stop it first with Ctrl-C in its terminal (or \`kill ${note.supervisor.pid}\`).`,
    )
  }
  const left = note?.children.filter(isAlive) ?? []
  for (const child of left) process.kill(child.pid, 'SIGTERM')
  for (let waited = 0; waited < 150 && left.some(isAlive); waited += 1) await sleep(100)
  for (const child of left.filter(isAlive)) process.kill(child.pid, 'SIGKILL')
  noteRunning(folder, [])
}

export function noteRunning(
  folder: DataFolder,
  children: readonly { pid: number; name: string }[],
  address?: string,
): void {
  const describe = (pid: number, name: string): ProcessNote => ({
    pid,
    name,
    startedAt: startTime(pid) ?? '',
  })
  const note: RunningNote = {
    supervisor: describe(process.pid, 'supervisor'),
    children: children.map(({ pid, name }) => describe(pid, name)),
    address,
  }
  writeFileSync(noteFile(folder), JSON.stringify(note, null, 2), { mode: 0o600 })
}

export function forgetRunning(folder: DataFolder): void {
  rmSync(noteFile(folder), { force: true })
}
