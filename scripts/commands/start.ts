import { parseArgs } from 'node:util'
import { demoAccounts } from '../../db/seeds/accounts'
import { build, buildIsCurrent } from '../app/build'
import { migrate, seed } from '../app/database'
import { startServer } from '../app/server'
import { summary } from '../app/summary'
import { relativeToProject } from '../services/folders'
import { readPort } from '../services/ports'
import { startStack, type Stack } from '../services/stack'
import { usualPorts } from '../services/usualPorts'

/** The demo: everything on loopback, kept between starts, until Ctrl-C. `--dev` serves the sources as they change. */
export async function main(args: string[]): Promise<number> {
  const started = Date.now()
  const { values } = parseArgs({
    args,
    options: { dev: { type: 'boolean', default: false }, port: { type: 'string', default: '3000' } },
  })
  const appPort = readPort(values.port)
  const stack = await startStack({
    mode: values.dev ? 'dev' : 'demo',
    choosePorts: () => usualPorts(appPort),
  })
  const { supervisor } = stack
  try {
    await prepare(stack, values.dev)
    if (!supervisor.signal.aborted) {
      await supervisor.add(
        startServer({
          folder: stack.folder,
          env: stack.appEnv,
          host: '127.0.0.1',
          port: stack.ports.app,
          dev: values.dev,
        }),
      )
    }
  } catch (error) {
    const interrupted = supervisor.signal.aborted
    await supervisor.stopAll()
    if (interrupted) return 0
    throw error
  }
  if (!supervisor.signal.aborted) {
    supervisor.noteAddress(stack.appEnv.NEXTAUTH_URL ?? '')
    const seconds = (Date.now() - started) / 1000
    console.log(summary(stack.appEnv, demoAccounts, seconds, relativeToProject(stack.folder.logs)))
  }
  const { reason, failed } = await supervisor.stopAsked
  console.log(failed ? `\n  ${reason}\n` : reason)
  await supervisor.stopAll()
  return failed ? 1 : 0
}

/** The build and the data have nothing to do with each other, so they are made side by side. */
async function prepare(stack: Stack, dev: boolean): Promise<void> {
  const { folder, appEnv, ownerEnv, supervisor } = stack
  const data = async () => {
    await migrate(folder, ownerEnv, supervisor.signal)
    await seed(folder, ownerEnv, supervisor.signal)
  }
  const application = async () => {
    if (dev || buildIsCurrent(appEnv)) return
    console.log('Building the application (about a minute the first time) ...')
    await build(folder, appEnv, supervisor.signal)
  }
  const failed = (await Promise.allSettled([data(), application()])).find(
    ({ status }) => status === 'rejected',
  )
  if (failed?.status === 'rejected') throw failed.reason
}
