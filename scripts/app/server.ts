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
}

/** Serves the application and waits until its health page says that all it needs is there. */
export async function startServer({ folder, env, host, port, dev = false }: ServerPlan): Promise<Child> {
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
  const reachable = host === '0.0.0.0' || host === '::' ? '127.0.0.1' : host
  const health = `http://${reachable.includes(':') ? `[${reachable}]` : reachable}:${port}/api/health`
  await untilReady(child, async () => (await fetch(health, { signal: AbortSignal.timeout(20_000) })).ok, 90)
  return child
}
