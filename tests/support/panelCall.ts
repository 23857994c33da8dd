import { randomBytes } from 'node:crypto'
import type { Database } from '@/db/client'
import type { Actor } from '@/lib/domain/actor'
import type { ActingContext } from '@/lib/domain/context'
import { referenceFrom } from '@/lib/domain/proposals/reference'
import { testContext } from './context'
import { memoryStore } from './memoryStore'
import { makeScenario, type Scenario } from './scenario'
import { makeDraft } from './scenario/draft'
import { makePerson } from './scenario/people'
import { sendIn } from './sendIn'

export interface PanelProposalMade {
  id: number
  reference: string
  reviewNumber: string
  pi: Actor
}

export interface PanelCall extends Scenario {
  as: (actor: Actor) => ActingContext
  deputy: Actor
  proposals: PanelProposalMade[]
  /** A finished review with the same half points on every criterion, and words for both audiences. */
  review: (proposal: PanelProposalMade, reviewer: Actor, halfPoints: number) => Promise<number>
}

const hour = 3600_000
const names = [
  'Tove Ashgrove',
  'Ulf Benmarsh',
  'Vera Coldwell',
  'Wim Darrow',
  'Xenia Eastlake',
  'Yorick Fenby',
]

/** A call just closed with one sent proposal for each of `askedHours`, a chair, a deputy and three reviewers. */
export async function makePanelCall(
  db: Database,
  askedHours: readonly number[] = [40, 30, 20, 10],
): Promise<PanelCall> {
  const storage = memoryStore()
  const scenario = await makeScenario(db, { storage, currency: null })
  const as = (actor: Actor): ActingContext => testContext(db, actor, { storage })
  const onPanel = { callId: scenario.callId, panelId: scenario.panelId }
  const deputy = await makePerson(db, scenario.tag, 'Zelda Garth', 'chair', onPanel)
  await db('panel_members').insert({
    panel_id: scenario.panelId,
    person_id: deputy.personId,
    seat: 'deputy',
    number: 9,
  })
  const proposals: PanelProposalMade[] = []
  for (const [index, asked] of askedHours.entries()) {
    const tag = `${scenario.tag}${index}`
    const pi = await makePerson(db, tag, names[index % names.length] ?? 'Ada Holm')
    const draft = await makeDraft(db, {
      reference: referenceFrom(randomBytes(5)),
      facility: scenario,
      call: scenario,
      pi,
      coInvestigator: await makePerson(db, `${tag}b`, 'Ivo Lindqvane'),
      storage,
    })
    await db('observations')
      .where({ id: draft.observationId })
      .update({ asked_seconds: asked * 3600 })
    await db('proposals')
      .where({ id: draft.proposalId })
      .update({ title: `Question ${index + 1}` })
    await sendIn(as(pi), draft.reference)
    const row = await db('proposals').where({ id: draft.proposalId }).first('review_number')
    proposals.push({
      id: draft.proposalId,
      reference: draft.reference,
      reviewNumber: row?.review_number ?? '',
      pi,
    })
  }
  await db('calls')
    .where({ id: scenario.callId })
    .update({ closes_at: new Date(Date.now() - hour), grace_until: new Date(Date.now() + hour) })

  const review = async (proposal: PanelProposalMade, reviewer: Actor, halfPoints: number) => {
    const [id = 0] = await db('assignments').insert({
      proposal_id: proposal.id,
      person_id: reviewer.personId,
      panel_id: scenario.panelId,
      assigned_at: new Date(),
      finished_at: new Date(),
    })
    for (const criterion_id of scenario.criterionIds)
      await db('score_events').insert({
        assignment_id: id,
        criterion_id,
        criterion_version: 1,
        round: 'before-discussion',
        half_points: halfPoints,
      })
    for (const audience of ['investigators', 'panel', 'private'] as const)
      await db('review_texts').insert({
        assignment_id: id,
        audience,
        body: `Words for ${audience} on ${proposal.reviewNumber}, ${halfPoints} half points, from a careful reading.`,
        saved_at: new Date(),
      })
    return id
  }
  return { ...scenario, as, deputy, proposals, review }
}
