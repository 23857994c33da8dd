import { existsSync, renameSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { createConnection } from 'mysql2/promise'
import { startChild, untilReady, type Child } from './child'
import { findCommand, programs } from './debian'
import { openToThisUser, relativeToProject, socketFolder, tailOf, type DataFolder } from './folders'
import { accountStatements, databaseUrl } from './mariadbAccounts'
import { Problem } from './Problem'
import { runToEnd } from './runToEnd'
import type { Secrets } from './secrets'

export interface MariadbPlan {
  folder: DataFolder
  port: number
  secrets: Secrets
  databases: readonly string[]
  /** Test runs trade safety on power loss for speed. */
  forgetful: boolean
}

/** Starts our own MariaDB on loopback, making its data folder the first time. */
export async function startMariadb(plan: MariadbPlan): Promise<Child> {
  const server = findCommand(programs.mariadb.commands)
  if (!server) throw new Problem('MariaDB is not installed.', 'Run `npm start`, which installs it.')
  const { folder } = plan
  if (!existsSync(join(folder.mariadb, 'mysql'))) await makeDataFolder(folder)
  openToThisUser(folder.mariadb)

  const setup = join(folder.path, 'accounts.sql')
  writeFileSync(setup, `${accountStatements(plan.secrets, plan.databases).join('\n')}\n`, { mode: 0o600 })
  const child = startChild({
    name: 'MariaDB',
    command: server,
    args: [...serverOptions(plan), `--init-file=${setup}`],
    logFile: join(folder.logs, 'mariadb.log'),
  })
  const uri = databaseUrl('owner', plan.secrets, plan.port, plan.databases[0] ?? '')
  // Crash recovery after a power cut can take a while; a healthy start takes a second.
  await untilReady(child, () => answers(uri), 90)
  return child
}

function serverOptions({ folder, port, forgetful }: MariadbPlan): string[] {
  const safety = forgetful
    ? ['--innodb-flush-log-at-trx-commit=0', '--innodb-flush-method=nosync', '--skip-innodb-doublewrite']
    : ['--innodb-flush-log-at-trx-commit=1']
  return [
    '--no-defaults',
    ...asRoot(),
    `--datadir=${folder.mariadb}`,
    `--socket=${join(socketFolder(folder), 'db.sock')}`,
    `--pid-file=${join(folder.path, 'mariadb.pid')}`,
    `--port=${port}`,
    '--bind-address=127.0.0.1',
    '--skip-name-resolve',
    '--default-time-zone=+00:00',
    '--character-set-server=utf8mb4',
    '--collation-server=utf8mb4_unicode_ci',
    '--innodb-snapshot-isolation=1',
    '--innodb-buffer-pool-size=192M',
    '--max-allowed-packet=32M',
    '--local-infile=0',
    ...safety,
  ]
}

/** Made aside and renamed when complete, so an interrupted first start leaves nothing half made. */
async function makeDataFolder(folder: DataFolder): Promise<void> {
  const installer = findCommand(['mariadb-install-db'])
  if (!installer) {
    throw new Problem(
      'mariadb-install-db is missing, so no database can be made.',
      'Install it with `sudo apt-get install mariadb-server-core mariadb-client-core`, then run again.',
    )
  }
  const unfinished = `${folder.mariadb}.unfinished`
  rmSync(unfinished, { recursive: true, force: true })
  rmSync(folder.mariadb, { recursive: true, force: true })
  const log = join(folder.logs, 'mariadb-install.log')
  const args = [
    '--no-defaults',
    ...asRoot(),
    `--datadir=${unfinished}`,
    '--auth-root-authentication-method=normal',
    '--skip-test-db',
    '--skip-name-resolve',
  ]
  const { code } = await runToEnd({ command: installer, args, logFile: log })
  if (code !== 0) {
    throw new Problem(
      'MariaDB could not make its data folder.',
      `Look at the lines above (all of them: ${relativeToProject(log)}); a full disk and a read-only folder are the usual reasons.`,
      tailOf(log),
    )
  }
  renameSync(unfinished, folder.mariadb)
}

function asRoot(): string[] {
  return process.getuid?.() === 0 ? ['--user=root'] : []
}

async function answers(uri: string): Promise<boolean> {
  const connection = await createConnection({ uri, connectTimeout: 2000 })
  await connection.query('SELECT 1')
  await connection.end()
  return true
}
