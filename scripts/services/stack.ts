import { join } from 'node:path'
import { ensurePrograms, programs } from './debian'
import {
  appEnvironment,
  databases,
  ownerEnvironment,
  writeEnvironment,
  type Environment,
  type ServicePorts,
} from './environment'
import { emptyDataFolder, openDataFolder, type DataFolder } from './folders'
import { startMail } from './mail'
import { startMariadb } from './mariadb'
import { startObjectStore } from './objectStore'
import { startPayments } from './payments'
import { loadSecrets, type Secrets } from './secrets'
import { Supervisor } from './Supervisor'

/** The services of one data folder, up and answering. */
export interface Stack {
  folder: DataFolder
  secrets: Secrets
  ports: ServicePorts
  supervisor: Supervisor
  /** For the application itself. */
  appEnv: Environment
  /** For migrations and the seed. */
  ownerEnv: Environment
  environmentFile: string
}

export interface StackPlan {
  mode: string
  /** Called once the data folder is ours. */
  choosePorts: () => Promise<ServicePorts>
  /** Begins with nothing: what an earlier run kept is thrown away. */
  fresh?: boolean
}

/** Brings up database, object store, mail and payments; on any failure nothing is left running. */
export async function startStack({ mode, choosePorts, fresh = false }: StackPlan): Promise<Stack> {
  const folder = openDataFolder(mode)
  await ensurePrograms([programs.mariadb], join(folder.logs, 'apt-get.log'))
  const secrets = loadSecrets(folder)
  const supervisor = await Supervisor.claim(folder)
  if (fresh) emptyDataFolder(folder)
  const ports = await choosePorts()
  try {
    const starts = [
      startMariadb({
        folder,
        port: ports.database,
        secrets,
        databases: Object.values(databases),
        forgetful: mode === 'test',
      }),
      startObjectStore(folder, ports.objects),
      startMail(folder, ports.smtp, ports.inbox),
      startPayments({
        folder,
        port: ports.payments,
        webhookUrl: `http://127.0.0.1:${ports.app}/api/webhooks/stripe`,
        webhookSecret: secrets.webhook,
      }),
    ].map((start) => supervisor.add(start))
    const failed = (await Promise.allSettled(starts)).find((result) => result.status === 'rejected')
    if (failed) throw failed.reason
  } catch (error) {
    await supervisor.stopAll()
    throw error
  }
  return {
    folder,
    secrets,
    ports,
    supervisor,
    appEnv: appEnvironment(folder, secrets, ports),
    ownerEnv: ownerEnvironment(folder, secrets, ports),
    environmentFile: writeEnvironment(folder, secrets, ports),
  }
}
