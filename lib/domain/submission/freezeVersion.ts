import { databaseNow } from '@/db/queries/clock'
import { moveTime, timeBalance } from '@/db/queries/timeLedger'
import {
  insertVersion,
  insertVersionPeople,
  nextVersionNumber,
  supersedeVersions,
} from '@/db/queries/versions'
import type { ActingContext } from '../context'
import { freeze, type Snapshot } from './snapshot'

export interface Submission {
  reference: string
  proposalId: number
  versionId: number
  versionNumber: number
  /** Stamped by the database's clock as the first thing the request did. */
  arrivedAt: Date
  sha256: string
}

/** Writes the next version of a proposal with the people as they are, and puts its hours in the time ledger. */
export async function freezeVersion(
  tx: ActingContext,
  snapshot: Snapshot,
  given: { paperId: number | null; idempotencyKey: string; arrivedAt: Date },
): Promise<Submission> {
  const { contents, computation, engineVersion } = snapshot
  const { text, sha256 } = freeze(snapshot)
  const committedAt = await databaseNow(tx.db)
  const versionNumber = await nextVersionNumber(tx.db, contents.id)
  // Only where there is one: an update that finds no row locks the gap that parallel first sends insert into.
  if (versionNumber > 1) await supersedeVersions(tx.db, contents.id, committedAt)
  const versionId = await insertVersion(tx.db, {
    ...given,
    proposalId: contents.id,
    versionNumber,
    snapshot: text,
    sha256,
    engineVersion,
    committedAt,
    submittedBy: tx.actor.personId,
  })
  await insertVersionPeople(tx.db, versionId, contents.people)

  const movement = { proposalId: contents.id, madeBy: tx.actor.personId }
  const askedBefore = await timeBalance(tx.db, contents.id, 'asked')
  await moveTime(tx.db, {
    ...movement,
    from: 'asked',
    to: 'outside',
    seconds: askedBefore,
    reason: `version ${versionNumber - 1} superseded`,
  })
  await moveTime(tx.db, {
    ...movement,
    from: 'outside',
    to: 'asked',
    seconds: computation.askedSeconds,
    reason: `asked in version ${versionNumber}`,
  })
  const { reference } = contents
  return { reference, proposalId: contents.id, versionId, versionNumber, arrivedAt: given.arrivedAt, sha256 }
}
