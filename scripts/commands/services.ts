import { parseArgs } from 'node:util'
import { relativeToProject } from '../services/folders'
import { startStack } from '../services/stack'
import { usualPorts } from '../services/usualPorts'

/** Keeps database, object store, mail and payments running for developers, until told to stop. */
export async function main(args: string[]): Promise<number> {
  const { values } = parseArgs({
    args,
    options: { mode: { type: 'string', default: 'dev' }, 'app-port': { type: 'string', default: '3000' } },
  })
  const appPort = Number(values['app-port'])
  const stack = await startStack({
    mode: values.mode,
    // The application is not started here, so its port may well be in use already: by it.
    choosePorts: async () => ({ ...(await usualPorts(appPort, () => undefined)), app: appPort }),
  })
  if (!stack.supervisor.signal.aborted) {
    console.log(`Services are up; the settings are in ${relativeToProject(stack.environmentFile)}.`)
    console.log(`Letters: ${stack.appEnv.INBOX_URL}   Payments: ${stack.appEnv.PAYMENT_MOCK_URL}`)
  }
  const { reason, failed } = await stack.supervisor.stopAsked
  console.log(reason)
  await stack.supervisor.stopAll()
  return failed ? 1 : 0
}
