import { beforeEach, describe, expect, it } from 'vitest'
import { readPanelReport } from '@/lib/domain/panels/readPanelReport'
import { useRolledBackDatabase } from '../../support/database'
import { makePanelCall, type PanelCall } from '../../support/panelCall'

const db = useRolledBackDatabase()
let call: PanelCall

beforeEach(async () => {
  call = await makePanelCall(db(), [50, 40])
})

const read = (who = call.chair, reviewNumber = call.proposals[0]?.reviewNumber ?? '') =>
  readPanelReport(call.as(who), { callSlug: call.callSlug, reviewNumber })

describe('the report a chair reads', () => {
  it('is the frozen one, without a name or the public reference', async () => {
    const [proposal] = call.proposals
    const report = await read()
    expect(report.proposal.reviewNumber).toBe(proposal?.reviewNumber)
    const text = JSON.stringify(report)
    for (const secret of [proposal?.reference ?? '?', proposal?.pi.name ?? '?', proposal?.pi.email ?? '?'])
      expect(text).not.toContain(secret)
  })

  it('is not there for a chair with an interest in it, nor under a number nobody has', async () => {
    await db()('conflicts').insert({
      person_id: call.chair.personId,
      proposal_id: call.proposals[0]?.id ?? 0,
      kind: 'family',
      source: 'declared',
      from_at: new Date(Date.now() - 1000),
    })
    await expect(read()).rejects.toMatchObject({ kind: 'not-found' })
    await expect(read(call.chair, '00-000')).rejects.toMatchObject({ kind: 'not-found' })
    await expect(read(call.chair, call.proposals[1]?.reviewNumber)).resolves.toBeTruthy()
  })

  it('is for nobody else', async () => {
    const [reviewer] = call.reviewers
    for (const who of [reviewer ?? call.office, call.office, call.stranger])
      await expect(read(who)).rejects.toMatchObject({ kind: expect.stringMatching(/not-found|forbidden/) })
  })
})
