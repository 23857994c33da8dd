import { expect, it } from 'vitest'
import { declareInterests } from '@/lib/domain/conflicts/declareInterests'
import { readReviewLines } from '@/lib/domain/reviews/readReviewLines'
import { useRolledBackDatabase } from '../../support/database'
import { makePanelCall, type PanelProposalMade } from '../../support/panelCall'
import { makePerson } from '../../support/scenario/people'

const db = useRolledBackDatabase()

it('shows the own scores at once, and the others’ together only after the decisions, without what one may not judge', async () => {
  const call = await makePanelCall(db(), [20, 10])
  const [one, two] = call.proposals as [PanelProposalMade, PanelProposalMade]
  const [me, ...rest] = call.reviewers
  const more = await makePerson(db(), `${call.tag}m`, 'Quill Ostrand', 'reviewer', call)
  await call.review(one, me, 13)
  for (const other of [...rest, call.deputy, more]) await call.review(one, other, 17)
  // Read by the others alone, and barred for the reader.
  for (const other of rest) await call.review(two, other, 4)
  await db()('conflicts').insert({
    person_id: me.personId,
    proposal_id: two.id,
    kind: 'family',
    source: 'declared',
    from_at: new Date(Date.now() - 1000),
  })
  const scale = async () => (await readReviewLines(call.as(me)))[0]?.scale
  expect(await scale()).toBeNull()
  await declareInterests(call.as(me), { callSlug: call.callSlug, names: [], wentThrough: true })
  const criteria = call.criterionIds.length
  for (const stage of ['review', 'ranking'] as const) {
    await db()('calls').where({ id: call.callId }).update({ stage })
    expect(await scale()).toMatchObject({
      others: null,
      whyAlone: expect.stringMatching(/once the decisions/),
    })
    expect((await scale())?.own[13]).toBe(criteria)
  }
  await db()('calls').where({ id: call.callId }).update({ stage: 'decided' })
  const shown = await scale()
  expect(shown?.others?.[17]).toBe(criteria * (rest.length + 2))
  expect(shown?.others?.reduce((sum, count) => sum + count, 0)).toBe(criteria * (rest.length + 2))
})
