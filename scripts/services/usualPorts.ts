import type { ServicePorts } from './environment'
import { pickPorts } from './ports'

const wishes = [
  { name: 'app', label: 'the application', port: 3000 },
  { name: 'database', label: 'the database', port: 3307 },
  { name: 'objects', label: 'the object store', port: 4568 },
  { name: 'payments', label: 'the payment mock', port: 4242 },
  { name: 'smtp', label: 'the mail fake', port: 2525 },
  { name: 'inbox', label: 'the inbox', port: 8025 },
] as const

/** The usual ports, or the next free ones, saying which had to move. */
export async function usualPorts(
  appPort = 3000,
  say: (sentence: string) => void = console.log,
): Promise<ServicePorts> {
  const { ports, moved } = await pickPorts(
    wishes.map(({ name, label, port }) => ({ name, label, port: name === 'app' ? appPort : port })),
  )
  for (const sentence of moved) say(sentence)
  return ports
}
