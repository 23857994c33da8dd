import { existsSync, readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { createConnection, type RowDataPacket } from 'mysql2/promise'
import { projectRoot } from '../services/folders'
import { Problem } from '../services/Problem'

/** Every secret that demo and tests have made on this machine. */
export function demoSecrets(): Set<string> {
  const data = join(projectRoot, '.data')
  if (!existsSync(data)) return new Set()
  const files = readdirSync(data)
    .map((mode) => join(data, mode, 'secrets.json'))
    .filter((file) => existsSync(file))
  const key = join(data, 'server-actions.key')
  const secrets = files.flatMap((file) => Object.values(JSON.parse(readFileSync(file, 'utf8'))).map(String))
  return new Set(existsSync(key) ? [...secrets, readFileSync(key, 'utf8').trim()] : secrets)
}

/** Refuses a database that cannot be reached, was never migrated, or holds accounts whose passwords are published. */
export async function refuseDemoDatabase(url: string): Promise<void> {
  const connection = await createConnection({ uri: url, connectTimeout: 10_000 }).catch((error: Error) => {
    throw new Problem(
      `The database cannot be reached: ${error.message}.`,
      'Check DATABASE_URL and that the database server is running and lets this user in.',
    )
  })
  try {
    const [rows] = await connection.query<RowDataPacket[]>(
      'SELECT COUNT(*) AS found FROM people WHERE is_demo = 1',
    )
    const found = Number(rows[0]?.found ?? 0)
    if (found === 0) return
    throw new Problem(
      `The database holds ${found} accounts of the demo, whose passwords everyone knows.`,
      'Production begins with an empty database of its own: name another one in DATABASE_URL, then start with --migrate.',
    )
  } catch (error) {
    if (error instanceof Error && 'errno' in error && error.errno === 1146) {
      throw new Problem(
        'The database has no tables yet.',
        'Start once with `npm run start:production -- --migrate`.',
      )
    }
    throw error
  } finally {
    await connection.end()
  }
}
