import { randomUUID } from 'node:crypto'
import { beforeAll, describe, expect, it } from 'vitest'
import { checkInvariants } from '../../support/invariants'
import { memoryStore } from '../../support/memoryStore'
import { makeScenario, type Scenario } from '../../support/scenario'
import { useOwnDatabase } from '../../support/ownDatabase'
import { InjectedFault, withFault, type FaultMode } from '../../support/stepFault'
import { sendIn } from '../../support/sendIn'
import { testContext } from '../../support/context'
import type { ActingContext } from '@/lib/domain/context'

const db = useOwnDatabase('submit_faults')
const arrivedAt = new Date()

interface Ready {
  scenario: Scenario
  ctx: ActingContext
}

async function ready(): Promise<Ready> {
  const storage = memoryStore()
  const scenario = await makeScenario(db(), { storage })
  return { scenario, ctx: testContext(db(), scenario.pi, { storage }) }
}

/** What a sending leaves behind, counted. */
async function traces({ proposalId, reference }: Scenario) {
  const count = async (table: string, where: Record<string, unknown>) =>
    Number((await db()(table).where(where).count({ n: '*' }).first())?.n)
  const proposal = await db()('proposals').where({ id: proposalId }).first()
  return {
    state: proposal?.state,
    versions: await count('proposal_versions', { proposal_id: proposalId }),
    fees: await count('fees', { proposal_id: proposalId }),
    requests: await count('assessment_requests', { proposal_id: proposalId }),
    entries: await count('logbook', { action: 'proposal.send', subject_id: reference }),
    letters: Number(
      (await db()('outbox').where('dedupe_key', 'like', `sent:${proposalId}:%`).count({ n: '*' }).first())?.n,
    ),
  }
}

const nothing = { state: 'draft', versions: 0, fees: 0, requests: 0, entries: 0, letters: 0 }
const everything = { state: 'submitted', versions: 1, fees: 1, requests: 1, entries: 1, letters: 2 }

let stepCount = 0

// Seen to fail with the logbook written outside the transaction, and with a failed COMMIT's connection kept.
describe('sending, with each step made to fail in turn', () => {
  beforeAll(async () => {
    const { scenario, ctx } = await ready()
    const whole = await withFault(0, 'once', () => sendIn(ctx, scenario.reference, { arrivedAt }))
    expect(whole.error).toBeNull()
    expect(await traces(scenario)).toEqual(everything)
    stepCount = whole.steps.length
    expect(whole.steps).toContain('storage:get')
    expect(whole.steps.at(-1)).toBe('db:commit')
    expect(stepCount).toBeGreaterThan(30)
  })

  it.each<FaultMode>(['once', 'for good', 'answer lost'])(
    'leaves all of it or nothing, and the next press does it whole: %s',
    async (mode) => {
      for (let number = 1; number <= stepCount; number += 1) {
        const { scenario, ctx } = await ready()
        const idempotencyKey = randomUUID()
        const send = () => sendIn(ctx, scenario.reference, { arrivedAt, idempotencyKey })

        const { steps, error } = await withFault(number, mode, send)
        const where = `${mode}, step ${number}: ${steps[number - 1] ?? 'never reached'}`
        // The object store is asked a second time; nothing else may pass over a failure.
        const isRecovered = mode !== 'for good' && steps[number - 1]?.startsWith('storage:')
        const isCommitted = mode === 'answer lost' && steps[number - 1] === 'db:commit'
        expect(error === null, where).toBe(isRecovered)
        if (error) expect([error, (error as Error).cause], where).toContainEqual(expect.any(InjectedFault))
        expect(await traces(scenario), where).toEqual(isRecovered || isCommitted ? everything : nothing)

        await send()
        expect(await traces(scenario), where).toEqual(everything)
      }
      await checkInvariants(db())
    },
    240_000,
  )

  it('has no step beyond those that were made to fail', async () => {
    const { scenario, ctx } = await ready()
    const beyond = await withFault(stepCount + 1, 'for good', () =>
      sendIn(ctx, scenario.reference, { arrivedAt }),
    )
    expect(beyond.error).toBeNull()
  })
})
