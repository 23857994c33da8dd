import type { Database } from '../client.ts'

export interface VersionHead {
  number: number
  arrivedAt: Date
  sentBy: string
  sha256: string
  engineVersion: string
  stands: boolean
}

/** Versions of a proposal that were sent, newest first, without their snapshots. */
export async function versionsOf(db: Database, proposalId: number): Promise<VersionHead[]> {
  const rows = await db('proposal_versions as v')
    .join('people as p', 'p.id', 'v.submitted_by')
    .where('v.proposal_id', proposalId)
    .orderBy('v.version_number', 'desc')
    .select(
      'v.version_number',
      'v.arrived_at',
      'v.snapshot_sha256',
      'v.engine_version',
      'v.superseded_at',
      'p.name',
    )
  return rows.map((row) => ({
    number: row.version_number,
    arrivedAt: row.arrived_at,
    sentBy: row.name,
    sha256: row.snapshot_sha256,
    engineVersion: row.engine_version,
    stands: row.superseded_at === null,
  }))
}
