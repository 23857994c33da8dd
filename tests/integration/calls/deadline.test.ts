import { beforeEach, describe, expect, it } from 'vitest'
import { databaseNow } from '@/db/queries/clock'
import { correctCall } from '@/lib/domain/calls/correctCall'
import { extendProposal } from '@/lib/domain/calls/extendProposal'
import { readCorrections } from '@/lib/domain/calls/readCorrections'
import { saveDates } from '@/lib/domain/calls/saveDates'
import { startReview } from '@/lib/domain/assignments/startReview'
import type { ActingContext } from '@/lib/domain/context'
import { testContext } from '../../support/context'
import { useRolledBackDatabase } from '../../support/database'
import { memoryStore } from '../../support/memoryStore'
import { refused } from '../../support/refused'
import { makeScenario, type Scenario } from '../../support/scenario'
import { makeDraft } from '../../support/scenario/draft'
import { sendIn } from '../../support/sendIn'

// Seen to fail: a letter for each draft in place of one a person, a cause without the call's version, drafts with a
// deadline of their own told of the call's, and the own deadline left out of the guard.

const db = useRolledBackDatabase()
const day = 86_400_000
let scenario: Scenario
let office: ActingContext
let pi: ActingContext
let storage: ReturnType<typeof memoryStore>

beforeEach(async () => {
  storage = memoryStore()
  scenario = await makeScenario(db(), { currency: null, storage })
  office = testContext(db(), scenario.office, { storage })
  pi = testContext(db(), scenario.pi, { storage })
})

const call = async () => {
  const row = await db()('calls').where({ id: scenario.callId }).first()
  if (!row) throw new Error('no call')
  return row
}

async function move(closesAt: Date, why = 'The network of the observatory was down.') {
  const row = await call()
  await saveDates(office, {
    slug: scenario.callSlug,
    version: row.version,
    why,
    opensAt: row.opens_at,
    closesAt,
    graceUntil: new Date(closesAt.getTime() + day),
    assessmentsDueAt: row.assessments_due_at,
    reviewsDueAt: row.reviews_due_at,
    panelMeetsAt: row.panel_meets_at,
    lettersAt: row.letters_at,
  })
}

const letters = (template: string) => db()('outbox').where({ template }).orderBy('id')

const second = () =>
  makeDraft(db(), {
    reference: '2M0-YXC',
    facility: scenario,
    call: scenario,
    pi: scenario.pi,
    coInvestigator: scenario.coInvestigator,
    storage,
  })

describe('a deadline that moves for everyone', () => {
  it('is told once a person, however many drafts, and told again when it moves again', async () => {
    await second()
    const { closes_at: was } = await call()
    await move(new Date(was.getTime() + day))
    const first = await letters('deadline-moved')
    expect(first.map((letter) => letter.to_email).sort()).toEqual(
      [scenario.pi.email, scenario.coInvestigator.email].sort(),
    )
    for (const letter of first) {
      expect(letter.text_body).toContain(scenario.reference)
      expect(letter.text_body).toContain('2M0-YXC')
      expect(letter.text_body).toContain('The network of the observatory was down.')
    }
    await move(new Date(was.getTime() + 2 * day))
    await move(new Date(was.getTime() + day))
    expect(await letters('deadline-moved')).toHaveLength(6)
    const entry = await db()('logbook').where({ action: 'call.dates' }).orderBy('id', 'desc').first()
    expect(JSON.parse(entry?.after_value ?? '')).toMatchObject({ told: 2 })
  })

  it('is not told where the draft has a deadline of its own, or of its kind', async () => {
    const { closes_at: was } = await call()
    await db()('proposals')
      .where({ id: scenario.proposalId })
      .update({ closes_at: new Date(was.getTime() + 3 * day) })
    await move(new Date(was.getTime() + day))
    expect(await letters('deadline-moved')).toEqual([])
    await db()('proposals').where({ id: scenario.proposalId }).update({ closes_at: null })
    await db()('call_kinds')
      .where({ id: scenario.kindId })
      .update({ closes_at: new Date(was.getTime() + 2 * day) })
    await move(new Date(was.getTime() + day / 2))
    expect(await letters('deadline-moved')).toEqual([])
  })

  it('wants a reason, and must leave the deadlines of kinds in order', async () => {
    const { closes_at: was, assessments_due_at: due } = await call()
    expect((await refused(move(new Date(was.getTime() + day), ''))).fieldErrors.why).toMatch(/Say why/)
    await db()('call_kinds').where({ id: scenario.kindId }).update({ closes_at: due })
    expect((await refused(move(new Date(was.getTime() + day)))).fieldErrors.assessmentsDueAt).toMatch(
      /“Regular” closes .* before assessments are due/,
    )
    expect((await call()).closes_at).toEqual(was)
  })
})

describe('a deadline of one proposal', () => {
  const close = () =>
    db()('calls')
      .where({ id: scenario.callId })
      .update({ closes_at: new Date(Date.now() - day), grace_until: new Date(Date.now() + day) })
  const extend = (closesAt: Date, ctx = office) =>
    extendProposal(ctx, { reference: scenario.reference, closesAt, why: 'The proxy refused the file.' })

  it('lets it be sent after the call has closed, and no other', async () => {
    const other = await second()
    await close()
    expect((await refused(sendIn(pi, scenario.reference))).message).toMatch(/The call closed at/)
    const until = new Date(Date.now() + day)
    await extend(until)
    expect((await letters('deadline-extended')).map((letter) => letter.to_email).sort()).toEqual(
      [scenario.pi.email, scenario.coInvestigator.email].sort(),
    )
    expect((await refused(sendIn(pi, other.reference))).message).toMatch(/The call closed at/)
    const atTheEnd = sendIn(pi, scenario.reference, { arrivedAt: until })
    expect((await refused(atTheEnd)).message).toMatch(/The call closed at/)
    await expect(sendIn(pi, scenario.reference)).resolves.toMatchObject({ versionNumber: 1 })
    const entry = await db()('logbook').where({ action: 'proposal.extend' }).first()
    expect(entry).toMatchObject({ subject_id: scenario.reference })
    expect(JSON.parse(entry?.after_value ?? '')).toMatchObject({ why: 'The proxy refused the file.' })
  })

  it('keeps the review from starting before it has passed', async () => {
    await close()
    await extend(new Date(Date.now() + day))
    expect((await refused(startReview(office, { callId: scenario.callId }))).message).toMatch(
      /may still be sent until .* The review starts after that/,
    )
    await db()('proposals')
      .where({ id: scenario.proposalId })
      .update({ closes_at: new Date(Date.now() - 1000) })
    await startReview(office, { callId: scenario.callId })
    expect((await call()).stage).toBe('review')
  })

  it('lies ahead, after the usual one, and before the reviews', async () => {
    const { closes_at: closes, reviews_due_at: reviews } = await call()
    expect((await refused(extend(new Date(Date.now() - 1000)))).fieldErrors.closesAt).toMatch(/has passed/)
    expect((await refused(extend(closes))).fieldErrors.closesAt).toMatch(/as it is/)
    expect((await refused(extend(reviews))).fieldErrors.closesAt).toMatch(/Reviews are due/)
    expect((await refused(extend(new Date(closes.getTime() + day), pi))).kind).toBe('forbidden')
    await db()('calls').where({ id: scenario.callId }).update({ stage: 'review' })
    expect((await refused(extend(new Date(closes.getTime() + day)))).kind).toBe('closed')
  })
})

describe('a correction', () => {
  const correct = async (ctx = office) =>
    correctCall(ctx, {
      slug: scenario.callSlug,
      version: (await call()).version,
      concerns: 'the slit of SPINDLE',
      body: 'It is 1.2 arcsec wide, not 1.0.',
    })

  it('stands on the call and is told once to everyone on a draft or a proposal sent', async () => {
    await second()
    await correct()
    expect(await readCorrections(pi, scenario.callSlug)).toMatchObject([
      { concerns: 'the slit of SPINDLE', body: 'It is 1.2 arcsec wide, not 1.0.' },
    ])
    expect((await letters('call-corrected')).map((letter) => letter.to_email).sort()).toEqual(
      [scenario.pi.email, scenario.coInvestigator.email].sort(),
    )
    await correct()
    expect((await readCorrections(pi, scenario.callSlug)).map(({ id }) => id)).toHaveLength(2)
  })

  it('is for published calls, by the office; once closed it writes to nobody', async () => {
    expect((await refused(correct(pi))).kind).toBe('forbidden')
    await db()('calls')
      .where({ id: scenario.callId })
      .update({ closes_at: await databaseNow(db()) })
    await correct()
    expect(await letters('call-corrected')).toEqual([])
    await db()('calls').where({ id: scenario.callId }).update({ stage: 'planned' })
    expect((await refused(correct())).kind).toBe('closed')
    expect((await refused(readCorrections(pi, scenario.callSlug))).kind).toBe('not-found')
  })
})
