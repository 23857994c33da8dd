import { randomBytes } from 'node:crypto'
import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { projectRoot, type DataFolder } from './folders'

/** Made once for each data folder; never leaves it, never printed. */
export interface Secrets {
  databaseRoot: string
  databaseOwner: string
  databaseApp: string
  sessions: string
  /** Built into the application, so one for all the folders that share a build. */
  serverActions: string
  webhook: string
}

const makers: { [Name in keyof Omit<Secrets, 'serverActions'>]: () => string } = {
  databaseRoot: () => randomBytes(24).toString('hex'),
  databaseOwner: () => randomBytes(24).toString('hex'),
  databaseApp: () => randomBytes(24).toString('hex'),
  sessions: () => randomBytes(32).toString('base64url'),
  webhook: () => `whsec_${randomBytes(24).toString('hex')}`,
}

/** Reads the folder's secrets, making those that are missing. */
export function loadSecrets(folder: DataFolder): Secrets {
  const file = join(folder.path, 'secrets.json')
  const stored: Partial<Secrets> = existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : {}
  const kept = (name: keyof typeof makers) => stored[name] ?? makers[name]()
  const secrets: Secrets = {
    databaseRoot: kept('databaseRoot'),
    databaseOwner: kept('databaseOwner'),
    databaseApp: kept('databaseApp'),
    sessions: kept('sessions'),
    serverActions: sharedKey(),
    webhook: kept('webhook'),
  }
  writeFileSync(file, `${JSON.stringify(secrets, null, 2)}\n`, { mode: 0o600 })
  return secrets
}

function sharedKey(): string {
  const file = join(projectRoot, '.data', 'server-actions.key')
  if (!existsSync(file)) writeFileSync(file, randomBytes(32).toString('base64'), { mode: 0o600 })
  return readFileSync(file, 'utf8').trim()
}
