import { parseArgs } from 'node:util'
import { build, buildIsCurrent } from '../app/build'
import { migrate } from '../app/database'
import { readHealth, startServer } from '../app/server'
import { checkEnvironment } from '../production/checkEnvironment'
import { demoSecrets, refuseDemoDatabase } from '../production/demoTraces'
import { quiet, type Environment } from '../services/environment'
import { openDataFolder } from '../services/folders'
import { Problem } from '../services/Problem'
import { Supervisor } from '../services/Supervisor'

/** Serves the real thing: settings from the environment, no fakes, no demo accounts, tables changed only with --migrate. */
export async function main(args: string[]): Promise<number> {
  const { values } = parseArgs({ args, options: { migrate: { type: 'boolean', default: false } } })
  const { faults, warnings } = checkEnvironment(process.env, demoSecrets())
  if (faults.length > 0) {
    throw new Problem(
      `Production does not start: ${faults.length} of its settings are not right.`,
      'Set them in the environment of this command (`npm start` runs the demo, which needs none), then run again.',
      faults,
    )
  }
  for (const warning of warnings) console.warn(warning)

  const folder = openDataFolder('production')
  const supervisor = await Supervisor.claim(folder)
  const env = settings()
  try {
    if (values.migrate) await migrate(folder, env, supervisor.signal)
    await refuseDemoDatabase(env.DATABASE_URL ?? '')
    if (!buildIsCurrent(env)) {
      console.log('Building the application ...')
      await build(folder, env, supervisor.signal)
    }
    const host = process.env.HOST || '127.0.0.1'
    const port = Number(process.env.PORT || 3000)
    await supervisor.add(startServer({ folder, env, host, port, evenIfParted: true }))
    supervisor.noteAddress(`${host}:${port}`)
    const { up, parts } = await readHealth(host, port)
    if (!up) console.warn(`It serves, but not everything it leans on is up: ${parts}`)
    console.log(`Noctuary serves on ${host}:${port} for ${env.NEXTAUTH_URL}.`)
  } catch (error) {
    await supervisor.stopAll()
    throw error
  }
  const { reason, failed } = await supervisor.stopAsked
  console.log(reason)
  await supervisor.stopAll()
  return failed ? 1 : 0
}

function settings(): Environment {
  const given = Object.entries(process.env).filter(
    (entry): entry is [string, string] => entry[1] !== undefined,
  )
  return { ...Object.fromEntries(given), NOCTUARY_MODE: 'production', ...quiet }
}
