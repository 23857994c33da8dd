import { beforeEach, describe, expect, it } from 'vitest'
import type { Actor } from '@/lib/domain/actor'
import { startReview } from '@/lib/domain/assignments/startReview'
import { approveDecisions } from '@/lib/domain/decisions/approveDecisions'
import { openDecision } from '@/lib/domain/decisions/openDecision'
import { prepareDecisions } from '@/lib/domain/decisions/prepareDecisions'
import { readDecisions } from '@/lib/domain/decisions/readDecisions'
import { readOfficeDecisions } from '@/lib/domain/decisions/readOfficeDecisions'
import { readOutcome } from '@/lib/domain/decisions/readOutcome'
import { releaseDecisions } from '@/lib/domain/decisions/releaseDecisions'
import { saveAward } from '@/lib/domain/decisions/saveAward'
import { saveStatement } from '@/lib/domain/decisions/saveStatement'
import { withholdComment } from '@/lib/domain/decisions/withholdComment'
import { freezeRanking } from '@/lib/domain/rankings/freezeRanking'
import { readRanking } from '@/lib/domain/rankings/readRanking'
import { startRanking } from '@/lib/domain/rankings/startRanking'
import { useRolledBackDatabase } from '../../support/database'
import { makePanelCall, type PanelCall, type PanelProposalMade } from '../../support/panelCall'

// Seen to fail with the version left out of what is approved, and with the second person not compared with the first.

const db = useRolledBackDatabase()
let call: PanelCall
let first: PanelProposalMade

const key = () => ({ callSlug: call.callSlug })
const rowOf = async (id: number, who: Actor = call.chair) => {
  const row = (await readDecisions(call.as(who), key())).rows.find((one) => one.proposalId === id)
  if (!row) throw new Error('the decision is not shown')
  return row
}
const versions = async (ids: readonly number[]) => {
  const { rows } = await readDecisions(call.as(call.deputy), key())
  return rows.flatMap(({ proposalId, version }) =>
    ids.includes(proposalId) ? [{ proposalId, version }] : [],
  )
}
const approve = async (who: Actor, ids = [first.id]) => {
  const decisions = await versions(ids)
  for (const decision of decisions) await openDecision(call.as(who), { panelId: call.panelId, ...decision })
  return approveDecisions(call.as(who), { panelId: call.panelId, decisions })
}
const state = async () => (await rowOf(first.id)).approval
const rewrite = async (statement: string, who: Actor = call.chair) =>
  saveStatement(call.as(who), {
    panelId: call.panelId,
    proposalId: first.id,
    version: (await rowOf(first.id)).version,
    statement,
  })
const release = () =>
  releaseDecisions(call.as(call.chair), { panelId: call.panelId, typed: String(call.callNumber) })
const freeze = async () => {
  const { list } = await readRanking(call.as(call.chair), key())
  await freezeRanking(call.as(call.chair), {
    panelId: call.panelId,
    rankingId: list?.id ?? 0,
    version: list?.version ?? 0,
  })
}

beforeEach(async () => {
  call = await makePanelCall(db(), [20, 10])
  first = call.proposals[0] as PanelProposalMade
  for (const proposal of call.proposals)
    for (const reviewer of call.reviewers) await call.review(proposal, reviewer, 16)
  await startReview(call.as(call.chair), { callId: call.callId })
  await startRanking(call.as(call.chair), { panelId: call.panelId })
  await prepareDecisions(call.as(call.chair), { panelId: call.panelId })
})

describe('a second person', () => {
  it('is not the one who prepared it', async () => {
    await expect(approve(call.chair)).rejects.toMatchObject({ kind: 'closed', message: /You prepared/ })
    expect(await state()).toBe('waits')
  })

  it.each(['deputy', 'office'] as const)('is the %s', async (who) => {
    expect(await approve(call[who])).toEqual({ approved: 1 })
    expect(await rowOf(first.id)).toMatchObject({ approval: 'approved', approvedBy: call[who].name })
    await expect(approve(call[who])).rejects.toMatchObject({ message: /approved already/ })
  })

  it.each(['reviewer', 'investigator', 'scientist'] as const)('is no %s', async (who) => {
    const actor = { reviewer: call.reviewers[0], investigator: first.pi, scientist: call.scientist }[who]
    await expect(approve(actor)).rejects.toMatchObject({ kind: 'not-found' })
  })

  it('is asked again after every change to words, hours or what is withheld', async () => {
    await approve(call.deputy)
    await rewrite('The hours suffice, and the sample is what decided.')
    expect(await state()).toBe('changed')
    await approve(call.deputy)
    await saveAward(call.as(call.chair), {
      panelId: call.panelId,
      proposalId: first.id,
      version: (await rowOf(first.id)).version,
      lines: [
        {
          instrumentId: call.instrumentId,
          hours: 3600,
          isReserve: false,
          service: 'queue',
          evenings: [],
          conditions: '',
        },
      ],
    })
    expect(await state()).toBe('changed')
    await approve(call.deputy)
    const [comment] = (await rowOf(first.id)).comments
    await withholdComment(call.as(call.chair), {
      panelId: call.panelId,
      proposalId: first.id,
      assignmentId: comment?.assignmentId ?? 0,
      withhold: true,
      reason: 'Tells who wrote it',
    })
    expect(await state()).toBe('changed')
  })

  it('who read an older version is told, and nothing is approved', async () => {
    const { version } = await rowOf(first.id)
    await rewrite('The hours suffice, and the sample is what decided.')
    await expect(
      approveDecisions(call.as(call.deputy), {
        panelId: call.panelId,
        decisions: [{ proposalId: first.id, version }],
      }),
    ).rejects.toMatchObject({ kind: 'stale' })
    expect(await state()).toBe('waits')
  })

  it('approves nothing while one of several was not opened as it stands', async () => {
    const { panelId } = call
    const ids = call.proposals.map(({ id }) => id)
    const office = call.as(call.office)
    const all = async () => approveDecisions(office, { panelId, decisions: await versions(ids) })
    await expect(all()).rejects.toMatchObject({
      kind: 'closed',
      message: /not opened .* and .* as they stand/,
    })
    for (const decision of await versions(ids)) await openDecision(office, { panelId, ...decision })
    await rewrite('The hours suffice, and the sample is what decided.')
    await expect(all()).rejects.toMatchObject({
      message: expect.stringContaining(`You have not opened ${first.reviewNumber} as it stands`),
    })
    expect(await state()).toBe('waits')
    expect((await rowOf(first.id)).isOpened).toBe(false)

    const [stale] = await versions([first.id])
    await expect(
      openDecision(office, { panelId, proposalId: first.id, version: (stale?.version ?? 0) - 1 }),
    ).rejects.toMatchObject({ kind: 'stale' })
    for (const decision of await versions([first.id]))
      for (const _ of [1, 2]) await openDecision(office, { panelId, ...decision })
    expect(await all()).toEqual({ approved: 2 })
  })

  it('who changes it, leaves the approval to the first', async () => {
    await rewrite('A clearer statement by the deputy of the panel.', call.deputy)
    await expect(approve(call.deputy)).rejects.toMatchObject({ message: /You prepared/ })
    expect(await approve(call.chair)).toEqual({ approved: 1 })
  })

  it('with an interest does not meet it', async () => {
    await db()('conflicts').insert({
      person_id: call.office.personId,
      proposal_id: first.id,
      kind: 'family',
      source: 'declared',
      from_at: new Date(Date.now() - 1000),
    })
    await expect(approve(call.office)).rejects.toMatchObject({ kind: 'not-found' })
    const view = await readOfficeDecisions(call.as(call.office), call.callSlug)
    expect(view.panels.flatMap((panel) => panel.rows)).toHaveLength(1)
    expect(JSON.stringify(view)).not.toContain(first.reviewNumber)
  })
})

it('nothing is made known while one is not approved as it stands', async () => {
  await freeze()
  await approve(call.deputy)
  await expect(release()).rejects.toMatchObject({ message: /second person/ })
  await approve(call.deputy, [call.proposals[1]?.id ?? 0])
  await rewrite('The hours suffice, and the sample is what decided.')
  await expect(release()).rejects.toMatchObject({ message: /second person/ })
  expect(await db()('outbox').where({ template: 'decision' })).toEqual([])
  await approve(call.deputy)
  expect(await release()).toEqual({ released: 2 })
  expect(await state()).toBe('approved')
  await expect(approve(call.office)).rejects.toMatchObject({ kind: 'closed' })
})

it('a withheld comment is read by no investigator; one shown again is', async () => {
  const comments = (await rowOf(first.id)).comments
  const set = (index: number, withhold: boolean) =>
    withholdComment(call.as(call.chair), {
      panelId: call.panelId,
      proposalId: first.id,
      assignmentId: comments[index]?.assignmentId ?? 0,
      withhold,
      reason: withhold ? 'Tells who wrote it' : '',
    })
  await set(0, true)
  await set(1, true)
  await set(1, false)
  await rewrite('What the panel says in its own words, all of it.')
  await freeze()
  await approve(
    call.deputy,
    call.proposals.map(({ id }) => id),
  )
  await release()
  const { decision } = await readOutcome(call.as(first.pi), first.reference)
  expect(decision?.comments).toHaveLength(2)
  await expect(set(2, true)).rejects.toMatchObject({ kind: 'closed' })
})
