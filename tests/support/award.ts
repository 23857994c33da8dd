import type { Database } from '@/db/client'

/** Awards a sent proposal as the panel would have: a decision made known, with so many seconds on one instrument. */
export async function award(
  db: Database,
  given: { proposalId: number; instrumentId: number; seconds: number; releasedAt?: Date | null },
): Promise<void> {
  const releasedAt = given.releasedAt === undefined ? new Date() : given.releasedAt
  const [decisionId = 0] = await db('decisions').insert({
    proposal_id: given.proposalId,
    decision_version: 1,
    outcome: 'awarded',
    statement: 'A clear case.',
    released_at: releasedAt,
    ...(releasedAt
      ? { version: 2, approved_version: 1, approved_by: (await db('people').first('id'))?.id }
      : {}),
  })
  await db('award_lines').insert({
    decision_id: decisionId,
    instrument_id: given.instrumentId,
    seconds: given.seconds,
    service: 'queue',
    conditions: '',
  })
  await db('proposals')
    .where({ id: given.proposalId })
    .update({ state: releasedAt ? 'awarded' : 'under-review' })
}
