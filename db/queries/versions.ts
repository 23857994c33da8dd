import type { Investigator } from '../../lib/domain/proposals/types.ts'
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
  /** Null where the justification was written here. */
  paperId: number | null
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

/** A version by its number within the proposal. */
export async function versionNumbered(
  db: Database,
  proposalId: number,
  versionNumber: number,
): Promise<SentVersion | null> {
  const row = await db('proposal_versions')
    .where({ proposal_id: proposalId, version_number: versionNumber })
    .first()
  return row ? versionOf(row) : null
}

export async function findVersionByKey(db: Database, idempotencyKey: string): Promise<SentVersion | null> {
  const row = await db('proposal_versions').where({ idempotency_key: idempotencyKey }).first()
  return row ? versionOf(row) : null
}

export interface NewVersion {
  proposalId: number
  versionNumber: number
  snapshot: string
  sha256: string
  engineVersion: string
  paperId: number | null
  idempotencyKey: string
  arrivedAt: Date
  committedAt: Date
  submittedBy: number
}

/** The number the next version takes; numbers are never used twice. */
export async function nextVersionNumber(db: Database, proposalId: number): Promise<number> {
  const row = await db('proposal_versions')
    .where({ proposal_id: proposalId })
    .max({ last: 'version_number' })
    .first()
  return Number(row?.last ?? 0) + 1
}

/** Retires the version that stood. */
export async function supersedeVersions(db: Database, proposalId: number, at: Date): Promise<void> {
  await db('proposal_versions')
    .where({ proposal_id: proposalId })
    .whereNull('superseded_at')
    .update({ superseded_at: at })
}

export async function insertVersion(db: Database, version: NewVersion): Promise<number> {
  const [id] = await db('proposal_versions').insert({
    proposal_id: version.proposalId,
    version_number: version.versionNumber,
    snapshot: version.snapshot,
    snapshot_sha256: version.sha256,
    engine_version: version.engineVersion,
    paper_id: version.paperId,
    idempotency_key: version.idempotencyKey,
    arrived_at: version.arrivedAt,
    committed_at: version.committedAt,
    submitted_by: version.submittedBy,
  })
  return Number(id)
}

/** Keeps names and institutes as they are today: both change later. */
export async function insertVersionPeople(
  db: Database,
  versionId: number,
  people: readonly Investigator[],
): Promise<void> {
  const known = people.flatMap(({ personId }) => (personId === null ? [] : [personId]))
  const stages = await db('people').whereIn('id', known).select('id', 'career_stage')
  await db('proposal_version_people').insert(
    people.map((person) => ({
      proposal_version_id: versionId,
      person_id: person.personId,
      name: person.name,
      institute: person.institute,
      career_stage: stages.find(({ id }) => id === person.personId)?.career_stage ?? null,
      role: person.role,
      position: person.position,
    })),
  )
}

/** The contents of the standing versions of proposals, by proposal. */
export async function standingContents(
  db: Database,
  proposalIds: readonly number[],
): Promise<Map<number, Snapshot['contents']>> {
  const rows = await db('proposal_versions').whereIn('proposal_id', proposalIds).whereNull('superseded_at')
  return new Map(rows.map((row) => [row.proposal_id, thaw(row.snapshot).contents]))
}
