import type { Database } from '../client.ts'
import { utcNow } from '../utcNow.ts'

/** Notes who has been asked to lead a proposal; the lock on its row is the caller's. */
export async function offerLeadTo(db: Database, proposalId: number, personId: number): Promise<void> {
  await db('proposals')
    .where({ id: proposalId })
    .update({ lead_offered_to: personId, lead_offered_at: utcNow(db), updated_at: utcNow(db) })
}

/** Nobody is asked any more: taken back, declined, or carried out. */
export async function endLeadOffer(db: Database, proposalId: number): Promise<void> {
  await db('proposals')
    .where({ id: proposalId })
    .update({ lead_offered_to: null, lead_offered_at: null, updated_at: utcNow(db) })
}

/** The programme goes with whoever leads its newest proposal. */
export async function setProgrammeLead(db: Database, programmeId: number, personId: number): Promise<void> {
  await db('programmes').where({ id: programmeId }).update({ lead_person_id: personId })
}
