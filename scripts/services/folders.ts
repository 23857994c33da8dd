import { createHash } from 'node:crypto'
import { accessSync, chmodSync, constants, mkdirSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { dirname, join, relative } from 'node:path'
import { fileURLToPath } from 'node:url'
import { Problem } from './Problem'

export const projectRoot = join(dirname(fileURLToPath(import.meta.url)), '..', '..')

/** Everything one set of services keeps: databases, files, letters, payments, secrets, logs. */
export interface DataFolder {
  mode: string
  path: string
  mariadb: string
  objects: string
  mail: string
  payments: string
  logs: string
}

export function openDataFolder(mode: string): DataFolder {
  const path = join(projectRoot, '.data', mode)
  const folder: DataFolder = {
    mode,
    path,
    mariadb: join(path, 'mariadb'),
    objects: join(path, 'objects'),
    mail: join(path, 'mail'),
    payments: join(path, 'payments'),
    logs: join(path, 'logs'),
  }
  makeFolder(path)
  openToThisUser(path)
  chmodSync(path, 0o700)
  for (const each of [folder.objects, folder.mail, folder.payments, folder.logs]) makeFolder(each)
  return folder
}

/** Throws away what the services kept; secrets and logs stay. */
export function emptyDataFolder(folder: DataFolder): void {
  for (const each of [folder.mariadb, folder.objects, folder.mail, folder.payments]) {
    rmSync(each, { recursive: true, force: true })
  }
  for (const each of [folder.objects, folder.mail, folder.payments]) makeFolder(each)
}

function makeFolder(path: string): void {
  try {
    mkdirSync(path, { recursive: true })
  } catch (error) {
    throw notOurs(path, error)
  }
}

/** Refuses early, and in words, what root made and an ordinary user may not touch. */
export function openToThisUser(path: string): void {
  try {
    accessSync(path, constants.R_OK | constants.W_OK | constants.X_OK)
  } catch (error) {
    throw notOurs(path, error)
  }
}

function notOurs(path: string, error: unknown): Problem {
  const reason = error instanceof Error ? error.message : String(error)
  return new Problem(
    `The folder ${relativeToProject(path)} cannot be used (${reason}).`,
    'Run as the user who ran Noctuary here before, or give the folder to yourself with `sudo chown -R "$USER" .data`.',
  )
}

/** A short path outside the project: socket names are limited to 107 bytes, and style scanners trip over sockets. */
export function socketFolder(folder: DataFolder): string {
  const name = `noctuary-${createHash('sha256').update(folder.path).digest('hex').slice(0, 10)}`
  const base = tmpdir().length > 60 ? '/tmp' : tmpdir()
  const path = join(base, name)
  mkdirSync(path, { recursive: true, mode: 0o700 })
  return path
}

export function relativeToProject(path: string): string {
  return relative(projectRoot, path)
}

/** The last lines of a log, for messages about why a service ended. */
export function tailOf(file: string, lines = 12): string[] {
  try {
    return readFileSync(file, 'utf8').trimEnd().split('\n').slice(-lines)
  } catch {
    return []
  }
}
