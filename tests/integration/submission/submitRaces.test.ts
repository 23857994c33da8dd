import { randomUUID } from 'node:crypto'
import { describe, expect, it } from 'vitest'
import { testContext } from '../../support/context'
import { memoryStore } from '../../support/memoryStore'
import { useOwnDatabase } from '../../support/ownDatabase'
import { makeScenario } from '../../support/scenario'
import { sendIn } from '../../support/sendIn'

const db = useOwnDatabase('submit_races', { max: 16 })
const arrivedAt = new Date()

async function ready() {
  const storage = memoryStore()
  const scenario = await makeScenario(db(), { storage })
  return { scenario, ctx: testContext(db(), scenario.pi, { storage }) }
}

describe('sending at the same moment', () => {
  // Seen to fail with the head of the logbook read in the transaction's snapshot.
  it('takes twelve proposals in side by side', async () => {
    const drafts = []
    for (let n = 0; n < 12; n += 1) drafts.push(await ready())
    const sent = await Promise.all(
      drafts.map(({ ctx, scenario }) => sendIn(ctx, scenario.reference, { arrivedAt })),
    )
    expect(new Set(sent.map(({ versionId }) => versionId)).size).toBe(12)
  })

  it.each([
    ['one press that arrives five times', true],
    ['five presses from five windows', false],
  ])('makes one submission of %s', async (_, isOneKey) => {
    const { ctx, scenario } = await ready()
    const key = randomUUID()
    const sent = await Promise.all(
      Array.from({ length: 5 }, () =>
        sendIn(ctx, scenario.reference, { arrivedAt, idempotencyKey: isOneKey ? key : randomUUID() }),
      ),
    )
    expect(new Set(sent.map(({ versionId }) => versionId)).size).toBe(1)
    const versions = await db()('proposal_versions').where({ proposal_id: scenario.proposalId })
    expect(versions).toHaveLength(1)
    expect(await db()('fees').where({ proposal_id: scenario.proposalId })).toHaveLength(1)
  })
})
