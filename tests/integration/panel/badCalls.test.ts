import { beforeEach, describe, expect, it } from 'vitest'
import { readAssignments } from '@/lib/domain/assignments/readAssignments'
import { startReview } from '@/lib/domain/assignments/startReview'
import { suggestForPanel } from '@/lib/domain/assignments/suggestForPanel'
import { prepareDecisions } from '@/lib/domain/decisions/prepareDecisions'
import { readDecisions } from '@/lib/domain/decisions/readDecisions'
import { readNights } from '@/lib/domain/decisions/readNights'
import { readSeasons } from '@/lib/domain/decisions/readSeasons'
import { takePlan } from '@/lib/domain/decisions/takePlan'
import { discussNow } from '@/lib/domain/discussions/discussNow'
import { readTable } from '@/lib/domain/discussions/readTable'
import { readPanelPlan } from '@/lib/domain/nightPlan/readPanelPlan'
import { readDiscussion } from '@/lib/domain/rankings/readDiscussion'
import { readRanking } from '@/lib/domain/rankings/readRanking'
import { startRanking } from '@/lib/domain/rankings/startRanking'
import { saveScoreSchema } from '@/lib/domain/reviews/schema'
import { useRolledBackDatabase } from '../../support/database'
import { makePanelCall, type PanelCall, type PanelProposalMade } from '../../support/panelCall'
import { refused } from '../../support/refused'

// Every page of the panel is read in calls that went wrong: each answers, and says why it has nothing to say.
// Seen to fail with the share lost divided by no dark time at all.

const db = useRolledBackDatabase()
let call: PanelCall

const key = () => ({ callSlug: call.callSlug })
const chair = () => call.as(call.chair)
const begin = async () => {
  await startReview(chair(), { callId: call.callId })
}
const review = (proposal: number, reviewer: number, half: number) => {
  const [own, who] = [call.proposals[proposal], call.reviewers[reviewer]]
  if (!own || !who) throw new Error('no such proposal or reviewer')
  return call.review(own, who, half)
}

/** Every view of the panel; none has a number that is none, which JSON would pass on as null. */
async function pages() {
  const views = {
    assignments: await readAssignments(chair(), key()),
    ranking: await readRanking(chair(), key()),
    discussion: await readDiscussion(chair(), key()),
    table: await readTable(chair(), key()),
    nights: await readNights(chair(), key()),
    decisions: await readDecisions(chair(), key()),
  }
  const odd: string[] = []
  const look = (value: unknown, path: string): void => {
    if (typeof value === 'number' && !Number.isFinite(value)) odd.push(path)
    if (typeof value === 'object' && value !== null && !(value instanceof Date))
      for (const [name, inner] of Object.entries(value)) look(inner, `${path}.${name}`)
  }
  look(views, 'views')
  expect(odd).toEqual([])
  return views
}

beforeEach(async () => {
  call = await makePanelCall(db(), [40, 30, 20])
})

describe('a call without reviews', () => {
  it('is shown, not ranked, and nothing is planned from it', async () => {
    await begin()
    const { ranking, nights } = await pages()
    expect(ranking.rows.map(({ raw }) => raw)).toEqual([null, null, null])
    expect(nights.hasRanking).toBe(false)
    const no = 'No review is finished yet: there is nothing to rank by.'
    expect((await refused(startRanking(chair(), { panelId: call.panelId }))).message).toBe(no)
    expect((await refused(takePlan(chair(), { panelId: call.panelId, policy: 'rank' }))).message).toBe(
      'Begin the ranking first.',
    )
    expect((await refused(readSeasons(chair(), { ...key(), of: 'given' }))).kind).toBe('closed')
    expect((await refused(readPanelPlan(chair(), key()))).kind).toBe('closed')
  })
})

describe('a call with exactly one review', () => {
  it('is ranked by it, those without one last, under either policy', async () => {
    await review(1, 0, 15)
    await begin()
    await startRanking(chair(), { panelId: call.panelId })
    const { ranking, nights } = await pages()
    expect(ranking.rows[0]).toMatchObject({ proposalId: call.proposals[1]?.id, raw: 7.5 })
    expect(nights.rows).toHaveLength(3)
    for (const policy of ['rank', 'merit'] as const) {
      const view = await readNights(chair(), { ...key(), policy })
      expect(view.policies.map(({ why }) => why)).toEqual([null, null])
      await takePlan(chair(), { panelId: call.panelId, policy })
    }
    await prepareDecisions(chair(), { panelId: call.panelId })
    await pages()
  })

  it.each([-1, 21, 3.5, Number.NaN, Infinity])('takes no score of %s half points', async (halfPoints) => {
    const score = { assignmentId: 1, criterionId: call.criterionIds[0], halfPoints }
    expect(saveScoreSchema.safeParse(score).success).toBe(false)
    expect(saveScoreSchema.safeParse({ ...score, halfPoints: 20 }).success).toBe(true)
    if (!Number.isFinite(halfPoints) || halfPoints === 3.5) return
    // Nor does the table itself.
    const id = await review(0, 0, 10)
    await expect(
      db()('score_events').insert({
        ...{ assignment_id: id, criterion_id: call.criterionIds[0] ?? 0, criterion_version: 1 },
        ...{ round: 'before-discussion' as const, half_points: halfPoints },
      }),
    ).rejects.toThrow()
  })
})

describe('a call of which all reviewers say the same', () => {
  it('is ranked all the same', async () => {
    for (const proposal of [0, 1, 2]) for (const reviewer of [0, 1, 2]) await review(proposal, reviewer, 14)
    await begin()
    await startRanking(chair(), { panelId: call.panelId })
    const { ranking } = await pages()
    expect(ranking.rows.map(({ raw }) => raw)).toEqual([7, 7, 7])
  })
})

describe('a call without a single hour to give', () => {
  it.each([
    ['no night at all', () => db()('night_blocks').where({ call_id: call.callId }).delete()],
    [
      'only engineering',
      () => db()('night_blocks').where({ call_id: call.callId }).update({ use_for: 'engineering' }),
    ],
    [
      'nights that never get dark',
      () => db()('night_blocks').where({ call_id: call.callId }).update({ dark_seconds: 0 }),
    ],
  ])('as there is %s: gives nothing, and says so', async (_, change) => {
    for (const proposal of [0, 1, 2]) await review(proposal, 0, 14 - proposal)
    await change()
    await begin()
    await startRanking(chair(), { panelId: call.panelId })
    const { ranking } = await pages()
    expect(ranking.rows).toHaveLength(3)
    for (const policy of ['rank', 'merit'] as const) await readNights(chair(), { ...key(), policy })
    const trial = { lostPercent: 100, offeredPercent: {}, heldHours: { [call.telescopeId]: 10 } }
    await readNights(chair(), { ...key(), trial })
    await readSeasons(chair(), { ...key(), of: 'suggested', trial })
  })

  it('as all of it is lost to weather: everything is not usable, and the plan is empty', async () => {
    for (const proposal of [0, 1, 2]) await review(proposal, 0, 14 - proposal)
    await begin()
    await startRanking(chair(), { panelId: call.panelId })
    const view = await readNights(chair(), { ...key(), trial: { lostPercent: 100 } })
    expect(view.rows.flatMap(({ lines }) => lines.map(({ suggestedSeconds }) => suggestedSeconds))).toEqual([
      0, 0, 0,
    ])
    for (const row of view.rows) expect(row.lines[0]?.whyNot?.reason).toBe('not-usable')
  })
})

describe('a call of which every reviewer has an interest in every proposal', () => {
  it('suggests nobody, and names each proposal that lacks readers', async () => {
    await db()('conflicts').insert(
      call.reviewers.flatMap(({ personId }) =>
        call.proposals.map(({ id }) => ({
          ...{
            person_id: personId,
            proposal_id: id,
            kind: 'institute' as const,
            severity: 'barred' as const,
          },
          ...{ source: 'declared' as const, from_at: new Date() },
        })),
      ),
    )
    await begin()
    const found = await suggestForPanel(chair(), { panelId: call.panelId, each: 3 })
    expect(
      found.pairs.every(({ personId }) => !call.reviewers.some((one) => one.personId === personId)),
    ).toBe(true)
    expect(found.short.map(({ reviewNumber }) => reviewNumber).sort()).toEqual(
      call.proposals.map(({ reviewNumber }) => reviewNumber).sort(),
    )
    await pages()
  })
})

describe('a panel without a quorum', () => {
  it('discusses nothing, says how many it lacks, and can still be read', async () => {
    await review(0, 0, 14)
    await begin()
    await startRanking(chair(), { panelId: call.panelId })
    await db()('panels').where({ id: call.panelId }).update({ quorum: 30 })
    const { table } = await pages()
    expect(table.quorum).toBe(30)
    const first = call.proposals[0] as PanelProposalMade
    const no = await refused(discussNow(chair(), { panelId: call.panelId, proposalId: first.id }))
    expect(no.message).toMatch(/30 members are needed to discuss/)
    await db()('panel_members')
      .where({ panel_id: call.panelId })
      .andWhereNot('seat', 'chair')
      .update({ left_at: new Date() })
    await pages()
  })
})
