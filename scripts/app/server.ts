import { join } from 'node:path'
import { startChild, untilReady, type Child } from '../services/child'
import type { Environment } from '../services/environment'
import { projectRoot, type DataFolder } from '../services/folders'

export interface ServerPlan {
  folder: DataFolder
  env: Environment
  host: string
  port: number
  /** The development server instead of the built application. */
  dev?: boolean
  /** Serve also while a service outside is away: it may come back, and people can read meanwhile. */
  evenIfParted?: boolean
}

/** Serves the application and waits until it answers; with everything it leans on up, unless told otherwise. */
export async function startServer(plan: ServerPlan): Promise<Child> {
  const { folder, env, host, port, dev = false, evenIfParted = false } = plan
  const child = startChild({
    name: 'the application',
    command: process.execPath,
    args: [
      join(projectRoot, 'node_modules', 'next', 'dist', 'bin', 'next'),
      dev ? 'dev' : 'start',
      ...['-H', host, '-p', String(port)],
    ],
    cwd: projectRoot,
    env: { ...env, NODE_ENV: dev ? 'development' : 'production' },
    logFile: join(folder.logs, 'app.log'),
  })
  const ready = async () => {
    const { up } = await readHealth(host, port)
    return up || evenIfParted
  }
  await untilReady(child, ready, 90)
  return child
}

/** What the application says of itself; throws while it does not answer. */
export async function readHealth(host: string, port: number): Promise<{ up: boolean; parts: string }> {
  const reachable = host === '0.0.0.0' || host === '::' ? '127.0.0.1' : host
  const address = reachable.includes(':') ? `[${reachable}]` : reachable
  const response = await fetch(`http://${address}:${port}/api/health`, {
    signal: AbortSignal.timeout(20_000),
  })
  return { up: response.ok, parts: await response.text() }
}
