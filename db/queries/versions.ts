import { thaw, type Snapshot } from '../../lib/domain/submission/snapshot.ts'
import type { Database } from '../client.ts'
import type { ProposalVersionsRow } from '../tables.ts'

/** A version that was sent, with its snapshot read back. */
export interface SentVersion {
  id: number
  proposalId: number
  versionNumber: number
  sha256: string
  engineVersion: string
  paperId: number
  arrivedAt: Date
  committedAt: Date
  submittedBy: number
  snapshot: Snapshot
}

function versionOf(row: ProposalVersionsRow): SentVersion {
  return {
    id: row.id,
    proposalId: row.proposal_id,
    versionNumber: row.version_number,
    sha256: row.snapshot_sha256,
    engineVersion: row.engine_version,
    paperId: row.paper_id,
    arrivedAt: row.arrived_at,
    committedAt: row.committed_at,
    submittedBy: row.submitted_by,
    snapshot: thaw(row.snapshot),
  }
}

/** The version that stands: the last one sent. Null for a proposal never sent. */
export async function readSnapshot(db: Database, proposalId: number): Promise<SentVersion | null> {
  const row = await db('proposal_versions')
    .where({ proposal_id: proposalId })
    .whereNull('superseded_at')
    .first()
  return row ? versionOf(row) : null
}

export async function findVersion(db: Database, id: number): Promise<SentVersion | null> {
  const row = await db('proposal_versions').where({ id }).first()
  return row ? versionOf(row) : null
}

export async function findVersionByKey(db: Database, idempotencyKey: string): Promise<SentVersion | null> {
  const row = await db('proposal_versions').where({ idempotency_key: idempotencyKey }).first()
  return row ? versionOf(row) : null
}
