import { refuse } from '@/lib/errors'
import { step } from '@/lib/services/step'
import type { ObjectStore } from '@/lib/services/storage/ObjectStore'

/** An object store in memory, whose calls pass the same step as the real one's. */
export function memoryStore(): ObjectStore & { objects: Map<string, Uint8Array> } {
  const objects = new Map<string, Uint8Array>()
  const reach = async <T>(name: `storage:${string}`, call: () => T): Promise<T> => {
    try {
      return await step(name, async () => call())
    } catch (cause) {
      throw refuse.unavailable('object store', cause)
    }
  }
  return {
    objects,
    put: (key, bytes) => reach('storage:put', () => void objects.set(key, bytes)),
    get: async (key) => {
      const bytes = await reach('storage:get', () => objects.get(key))
      if (!bytes) throw refuse.integrity('A stored document is missing. The office has been told.')
      return bytes
    },
    remove: (key) => reach('storage:remove', () => void objects.delete(key)),
    list: (prefix) =>
      reach('storage:list', () => [...objects.keys()].filter((key) => key.startsWith(prefix))),
    isUp: () => Promise.resolve(true),
  }
}
