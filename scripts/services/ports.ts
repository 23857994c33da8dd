import { createServer } from 'node:net'
import { Problem } from './Problem'

/** Whether we may listen on this port of the loopback address. */
export function isPortFree(port: number): Promise<boolean> {
  return new Promise((resolve) => {
    const probe = createServer()
    probe.once('error', () => resolve(false))
    probe.listen({ port, host: '127.0.0.1', exclusive: true }, () => probe.close(() => resolve(true)))
  })
}

export interface PortWish<Name extends string> {
  name: Name
  /** What people call the service, for the sentence about a moved port. */
  label: string
  port: number
}

export interface PickedPorts<Name extends string> {
  ports: Record<Name, number>
  /** One sentence for every port that had to move. */
  moved: string[]
}

/** Gives each service its usual port, or the next free one; no two services get the same. */
export async function pickPorts<Name extends string>(
  wishes: readonly PortWish<Name>[],
  isFree: (port: number) => Promise<boolean> = isPortFree,
): Promise<PickedPorts<Name>> {
  const taken = new Set<number>()
  const picked: [Name, number][] = []
  const moved: string[] = []
  for (const { name, label, port: wished } of wishes) {
    let port = wished
    while (taken.has(port) || !(await isFree(port))) {
      port = port === 65_535 ? 1024 : port + 1
      if (port === wished) throw new Error(`No free port found for ${label}.`)
    }
    taken.add(port)
    picked.push([name, port])
    if (port !== wished) moved.push(`Port ${wished} is taken; ${label} uses ${port} instead.`)
  }
  return { ports: Object.fromEntries(picked) as Record<Name, number>, moved }
}

/** Ports nobody uses now, for test runs; all are held open until each is known, so no two are equal. */
export async function anyFreePorts(count: number): Promise<number[]> {
  const servers = await Promise.all(
    Array.from({ length: count }, async () => {
      const server = createServer()
      await new Promise<void>((resolve, reject) => {
        server.once('error', reject)
        server.listen(0, '127.0.0.1', resolve)
      })
      return server
    }),
  )
  const ports = servers.map((server) => {
    const address = server.address()
    if (address === null || typeof address === 'string') throw new Error('The system gave no port.')
    return address.port
  })
  await Promise.all(servers.map((server) => new Promise((resolve) => server.close(resolve))))
  return ports
}

/** A port given on the command line. */
export function readPort(text: string): number {
  const port = Number(text)
  if (Number.isInteger(port) && port >= 1 && port <= 65_535) return port
  throw new Problem(
    `"${text}" is not a port.`,
    'Give a whole number from 1 to 65535, for example --port=3000.',
  )
}
