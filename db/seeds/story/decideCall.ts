import { approveDecisions } from '../../../lib/domain/decisions/approveDecisions.ts'
import { openDecision } from '../../../lib/domain/decisions/openDecision.ts'
import { prepareDecisions } from '../../../lib/domain/decisions/prepareDecisions.ts'
import { releaseDecisions } from '../../../lib/domain/decisions/releaseDecisions.ts'
import { takePlan } from '../../../lib/domain/decisions/takePlan.ts'
import { freezeRanking } from '../../../lib/domain/rankings/freezeRanking.ts'
import { startRanking } from '../../../lib/domain/rankings/startRanking.ts'
import type { SeededCall } from '../calls.ts'
import type { Teller } from './teller.ts'

/** The panel meets: ranks, divides the nights, and the letters go out. */
export async function decideCall(story: Teller, call: SeededCall): Promise<void> {
  await story.at(call.dates.panel_meets_at)
  const chair = await story.as('Edda Vorskell')
  const key = { panelId: call.panelId }
  await startRanking(chair, key)
  const ranking = await story
    .db('rankings')
    .where({ panel_id: call.panelId })
    .whereNull('superseded_at')
    .first()
  if (!ranking) throw new Error('the ranking was not started')
  await freezeRanking(chair, { ...key, rankingId: ranking.id, version: ranking.version })
  await takePlan(chair, { ...key, policy: 'rank' })
  await prepareDecisions(chair, key)
  const decided = await story
    .db('decisions as d')
    .join('proposals as p', 'p.id', 'd.proposal_id')
    .where({ 'p.panel_id': call.panelId })
    .whereNull('d.superseded_at')
    .select('d.proposal_id as proposalId', 'd.version')
  const office = await story.as('Maud Ferrisay')
  for (const decision of decided) await openDecision(office, { ...key, ...decision })
  await approveDecisions(office, { ...key, decisions: decided })
  await story.at(call.dates.letters_at)
  await releaseDecisions(chair, { ...key, typed: String(call.number) })
}
