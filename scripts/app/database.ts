import { join } from 'node:path'
import type { Environment } from '../services/environment'
import { relativeToProject, type DataFolder } from '../services/folders'
import { Problem } from '../services/Problem'
import { nodeWithTsx, runToEnd, type RunResult } from '../services/runToEnd'

/** Brings the tables up to date. `env` names the database and a user who may change tables. */
export async function migrate(folder: DataFolder, env: Environment, signal?: AbortSignal): Promise<void> {
  const logFile = join(folder.logs, 'migrate.log')
  const knex = nodeWithTsx('node_modules/knex/bin/cli.js', '--knexfile', 'knexfile.ts', 'migrate:latest')
  const result = await runToEnd({ ...knex, env, logFile, signal })
  if (result.code !== 0 && !signal?.aborted)
    throw failed('The database could not be migrated', result, logFile)
}

/** Fills in the demonstration observatory; does nothing where it is there already. */
export async function seed(folder: DataFolder, env: Environment, signal?: AbortSignal): Promise<void> {
  const logFile = join(folder.logs, 'seed.log')
  const result = await runToEnd({ ...nodeWithTsx('scripts/seed.ts'), env, logFile, signal })
  if (result.code !== 0 && !signal?.aborted)
    throw failed('The demo data could not be written', result, logFile)
}

function failed(what: string, { output }: RunResult, logFile: string): Problem {
  return new Problem(
    `${what}.`,
    `The lines above say why (all of it: ${relativeToProject(logFile)}). If the data are of an older or unfinished ` +
      'version and may be lost, delete the folder .data and run again.',
    output.trim().split('\n').slice(-15),
  )
}
