import type { Database } from '../client.ts'

/** Those who read a proposal now: reviewers with a standing assignment. */
export function standingReaders(
  db: Database,
  proposalId: number,
): Promise<{ assignmentId: number; personId: number; name: string; email: string }[]> {
  return db('assignments as a')
    .join('people as p', 'p.id', 'a.person_id')
    .where('a.proposal_id', proposalId)
    .whereNull('a.withdrawn_at')
    .orderBy('a.id')
    .select({ assignmentId: 'a.id', personId: 'p.id', name: 'p.name', email: 'p.email' })
}
