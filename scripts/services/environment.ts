import { writeFileSync } from 'node:fs'
import { join } from 'node:path'
import type { DataFolder } from './folders'
import { databaseUrl } from './mariadbAccounts'
import { bucketName } from './objectStore'
import type { Secrets } from './secrets'

export interface ServicePorts {
  app: number
  database: number
  objects: number
  payments: number
  smtp: number
  inbox: number
}

export const databases = { main: 'noctuary', test: 'noctuary_test' } as const

export type Environment = Record<string, string>

/** Keeps notices that are not about us out of the logs. */
export const quiet: Environment = {
  NEXT_TELEMETRY_DISABLED: '1',
  AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED: 'true',
}

/** What the application reads, for the services of one data folder. */
export function appEnvironment(folder: DataFolder, secrets: Secrets, ports: ServicePorts): Environment {
  return {
    NOCTUARY_MODE: folder.mode === 'test' ? 'test' : 'demo',
    DATABASE_URL: databaseUrl('app', secrets, ports.database, databases.main),
    S3_ENDPOINT: `http://127.0.0.1:${ports.objects}`,
    S3_REGION: 'us-east-1',
    S3_BUCKET: bucketName,
    S3_ACCESS_KEY_ID: 'S3RVER',
    S3_SECRET_ACCESS_KEY: 'S3RVER',
    STRIPE_SECRET_KEY: 'sk_test_demo',
    STRIPE_WEBHOOK_SECRET: secrets.webhook,
    STRIPE_API_BASE: `http://127.0.0.1:${ports.payments}`,
    SMTP_URL: `smtp://127.0.0.1:${ports.smtp}`,
    MAIL_FROM: 'Quillon Ridge Observatory <proposals@quillonridge.example>',
    NEXTAUTH_URL: `http://127.0.0.1:${ports.app}`,
    NEXTAUTH_SECRET: secrets.sessions,
    NEXT_SERVER_ACTIONS_ENCRYPTION_KEY: secrets.serverActions,
    INBOX_URL: `http://127.0.0.1:${ports.inbox}`,
    PAYMENT_MOCK_URL: `http://127.0.0.1:${ports.payments}`,
    LOG_LEVEL: 'info',
    LETTER_RELAY_SECONDS: folder.mode === 'test' ? '1' : '3',
    ...quiet,
  }
}

/** The same, for programs that change tables: migrations, the seed, tests of the database. */
export function ownerEnvironment(
  folder: DataFolder,
  secrets: Secrets,
  ports: ServicePorts,
  database: string = databases.main,
): Environment {
  const url = databaseUrl('owner', secrets, ports.database, database)
  return { ...appEnvironment(folder, secrets, ports), DATABASE_URL: url, MIGRATION_DATABASE_URL: url }
}

/** Leaves the settings where developers' own runs of the tests and tools find them. */
export function writeEnvironment(folder: DataFolder, secrets: Secrets, ports: ServicePorts): string {
  const file = join(folder.path, 'env.json')
  const content = {
    ...appEnvironment(folder, secrets, ports),
    MIGRATION_DATABASE_URL: databaseUrl('owner', secrets, ports.database, databases.main),
    TEST_DATABASE_URL: databaseUrl('owner', secrets, ports.database, databases.test),
  }
  writeFileSync(file, `${JSON.stringify(content, null, 2)}\n`, { mode: 0o600 })
  return file
}
