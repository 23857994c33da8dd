import { join } from 'node:path'
import { migrate, seed } from '../app/database'
import { startServer } from '../app/server'
import { ensurePrograms, findCommand, programs } from '../services/debian'
import { databases, ownerEnvironment, type Environment } from '../services/environment'
import { openDataFolder } from '../services/folders'
import { anyFreePorts } from '../services/ports'
import { startStack, type Stack } from '../services/stack'

/** The services of a test run: on ports nobody uses, with data thrown away at the next run. Started when first needed. */
export class TestStack {
  #starting: Promise<Stack> | undefined

  start(): Promise<Stack> {
    this.#starting ??= (async () => {
      const folder = openDataFolder('test')
      // The browser and the PDF reader are fetched together with the database: one wait instead of three.
      await ensurePrograms(Object.values(programs), join(folder.logs, 'apt-get.log'))
      return startStack({ mode: 'test', choosePorts, fresh: true })
    })()
    // Whoever awaits it hears of a failure; until then it must not end the process.
    this.#starting.catch(() => undefined)
    return this.#starting
  }

  /** An empty, migrated database for the integration tests, and a user who may change it. */
  async integrationEnvironment(signal: AbortSignal): Promise<Environment> {
    const { folder, secrets, ports } = await this.start()
    const env = ownerEnvironment(folder, secrets, ports, databases.test)
    await migrate(folder, env, signal)
    return env
  }

  /** What the build needs to know; the same in every mode, so one build serves demo and tests. */
  async buildEnvironment(): Promise<{ stack: Stack; env: Environment }> {
    const stack = await this.start()
    return { stack, env: stack.appEnv }
  }

  /** The built application with the demo data, served for the browser. */
  async serve(signal: AbortSignal): Promise<Environment> {
    const { folder, ownerEnv, appEnv, ports, supervisor } = await this.start()
    await migrate(folder, ownerEnv, signal)
    await seed(folder, ownerEnv, signal)
    await supervisor.add(startServer({ folder, env: appEnv, host: '127.0.0.1', port: ports.app }))
    return {
      ...appEnv,
      MIGRATION_DATABASE_URL: ownerEnv.DATABASE_URL ?? '',
      CHROMIUM_PATH: findCommand(programs.chromium.commands) ?? '',
    }
  }

  async stop(): Promise<void> {
    const stack = await this.#starting?.catch(() => undefined)
    await stack?.supervisor.stopAll()
  }
}

async function choosePorts() {
  const [app = 0, database = 0, objects = 0, payments = 0, smtp = 0, inbox = 0] = await anyFreePorts(6)
  return { app, database, objects, payments, smtp, inbox }
}
