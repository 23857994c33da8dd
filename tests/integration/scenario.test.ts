import { expect, it } from 'vitest'
import { papersOf } from '@/db/queries/papers'
import { memoryStore } from '../support/memoryStore'
import { makeScenario } from '../support/scenario'
import { useRolledBackDatabase } from '../support/database'

const db = useRolledBackDatabase()

// Seen to fail with the paper's bytes left out of the store.
it('makes a draft with a paper whose bytes are in the store', async () => {
  const storage = memoryStore()
  const scenario = await makeScenario(db(), { storage })
  const [paper] = await papersOf(db(), scenario.proposalId)
  expect(paper?.pages).toBe(2)
  expect(storage.objects.get(paper?.objectKey ?? '')?.byteLength).toBe(paper?.sizeBytes)
})

it('can be built twice in one database', async () => {
  const first = await makeScenario(db())
  const second = await makeScenario(db())
  expect(second.callNumber).toBe(first.callNumber + 1)
  expect(second.reference).not.toBe(first.reference)
})
