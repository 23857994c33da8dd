import type { RandomSource } from '../context'

const hex = (bytes: Uint8Array) => Buffer.from(bytes).toString('hex')

/**
 * A key for a new object: a shard, the moment in milliseconds, sixteen random bytes, all hexadecimal.
 * Nothing of the file or its author is in it, and its age can be read from it.
 */
export function newObjectKey(random: RandomSource, at: Date): string {
  const name = hex(random.bytes(16))
  return `${name.slice(0, 2)}/${at.getTime().toString(16).padStart(12, '0')}-${name}`
}

/** When a key was made; null for keys made another way. */
export function objectKeyMadeAt(key: string): Date | null {
  const stamp = /^[0-9a-f]{2}\/([0-9a-f]{12})-[0-9a-f]{32}$/.exec(key)?.[1]
  return stamp ? new Date(Number.parseInt(stamp, 16)) : null
}
