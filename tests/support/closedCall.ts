import type { Database } from '@/db/client'
import type { Actor } from '@/lib/domain/actor'
import type { ActingContext } from '@/lib/domain/context'
import { testContext } from './context'
import { memoryStore } from './memoryStore'
import { makeScenario, type Scenario } from './scenario'
import { sendIn } from './sendIn'

export interface ClosedCall extends Scenario {
  as: (actor: Actor) => ActingContext
  reviewNumber: string
  /** Gives the proposal to a reviewer. */
  assign: (reviewer: Actor) => Promise<number>
  requestId: number
}

const hour = 3600_000

/** The scenario with its proposal sent and its call closed an hour ago: what reviewers and staff begin with. */
export async function makeClosedCall(db: Database): Promise<ClosedCall> {
  const storage = memoryStore()
  const scenario = await makeScenario(db, { storage })
  const as = (actor: Actor): ActingContext => testContext(db, actor, { storage })
  await sendIn(as(scenario.pi), scenario.reference)
  await db('calls')
    .where({ id: scenario.callId })
    .update({ closes_at: new Date(Date.now() - hour), grace_until: new Date(Date.now() + hour) })
  const proposal = await db('proposals').where({ id: scenario.proposalId }).first()
  const request = await db('assessment_requests').where({ proposal_id: scenario.proposalId }).first()
  return {
    ...scenario,
    as,
    reviewNumber: proposal?.review_number ?? '',
    requestId: request?.id ?? 0,
    assign: async (reviewer) => {
      const [id = 0] = await db('assignments').insert({
        proposal_id: scenario.proposalId,
        person_id: reviewer.personId,
        panel_id: scenario.panelId,
        assigned_by: scenario.chair.personId,
        assigned_at: new Date(),
      })
      return id
    },
  }
}
