import { beforeEach, describe, expect, it } from 'vitest'
import type { z } from 'zod'
import { assignmentsView } from '@/lib/domain/assignments/assignmentsView'
import { readAssignments } from '@/lib/domain/assignments/readAssignments'
import { startReview } from '@/lib/domain/assignments/startReview'
import type { ActingContext } from '@/lib/domain/context'
import { decisionsView } from '@/lib/domain/decisions/decisionsView'
import { nightsView } from '@/lib/domain/decisions/nightsView'
import { prepareDecisions } from '@/lib/domain/decisions/prepareDecisions'
import { readDecisions } from '@/lib/domain/decisions/readDecisions'
import { readNights } from '@/lib/domain/decisions/readNights'
import { takePlan } from '@/lib/domain/decisions/takePlan'
import { rankingView } from '@/lib/domain/rankings/rankingView'
import { readRanking } from '@/lib/domain/rankings/readRanking'
import { startRanking } from '@/lib/domain/rankings/startRanking'
import { useRolledBackDatabase } from '../../support/database'
import { makePanelCall, type PanelCall } from '../../support/panelCall'

// What the chair's tables are fed with, as the handlers send it. Seen to fail with the barred proposals left in.

const db = useRolledBackDatabase()
let call: PanelCall

beforeEach(async () => {
  call = await makePanelCall(db(), [50, 40])
  for (const proposal of call.proposals)
    for (const reviewer of call.reviewers) await call.review(proposal, reviewer, 14)
  await startReview(call.as(call.chair), { callId: call.callId })
  await startRanking(call.as(call.chair), { panelId: call.panelId })
  await takePlan(call.as(call.chair), { panelId: call.panelId, policy: 'rank' })
  await prepareDecisions(call.as(call.chair), { panelId: call.panelId })
})

type Key = { callSlug: string }
type Read = (ctx: ActingContext, key: Key) => Promise<{ rows: { reviewNumber: string }[] }>
const tables: [string, Read, z.ZodType<{ rows: { reviewNumber: string }[] }>][] = [
  ['assignments', readAssignments, assignmentsView],
  ['ranking', readRanking, rankingView],
  ['nights', readNights, nightsView],
  ['decisions', readDecisions, decisionsView],
]

describe.each(tables)('the table of %s', (_name, read, schema) => {
  const sent = async (who = call.chair) => schema.parse(await read(call.as(who), { callSlug: call.callSlug }))

  it('holds every proposal by review number, and no investigator', async () => {
    const view = await sent()
    expect(view.rows.map((row) => row.reviewNumber).sort()).toEqual(
      call.proposals.map((proposal) => proposal.reviewNumber).sort(),
    )
    const text = JSON.stringify(view)
    for (const { reference, pi } of call.proposals)
      for (const secret of [reference, pi.name, pi.email]) expect(text).not.toContain(secret)
  })

  it('leaves out what its reader has an interest in; the deputy has the whole', async () => {
    const [barred, other] = call.proposals
    await db()('conflicts').insert({
      person_id: call.chair.personId,
      proposal_id: barred?.id ?? 0,
      kind: 'family',
      source: 'declared',
      from_at: new Date(Date.now() - 1000),
    })
    const view = await sent()
    expect(view.rows.map((row) => row.reviewNumber)).toEqual([other?.reviewNumber])
    expect(JSON.stringify(view)).not.toContain(barred?.reviewNumber)
    expect((await sent(call.deputy)).rows).toHaveLength(2)
  })

  it.each(['a reviewer', 'an investigator', 'the office'] as const)('is not there for %s', async (who) => {
    const actor = { 'a reviewer': call.reviewers[0], 'an investigator': call.pi, 'the office': call.office }[
      who
    ]
    await expect(sent(actor)).rejects.toMatchObject({ kind: 'not-found' })
  })
})
