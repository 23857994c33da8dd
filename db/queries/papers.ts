import type { Paper } from '../../lib/domain/proposals/writingTypes.ts'
import type { Database } from '../client.ts'
import { utcNow } from '../utcNow.ts'

const columns = [
  'p.id',
  'p.kind',
  'p.file_name',
  'p.pages',
  'p.created_at',
  'o.size_bytes',
  'o.sha256',
  'o.object_key',
] as const

/** Documents that stand, not those they replaced. */
export async function papersOf(db: Database, proposalId: number): Promise<Paper[]> {
  const rows = await db('papers as p')
    .join('stored_objects as o', 'o.id', 'p.object_id')
    .where({ 'p.proposal_id': proposalId })
    .whereNull('p.superseded_at')
    .orderBy('p.id')
    .select(...columns)
  return rows.map((row) => ({
    id: row.id,
    kind: row.kind,
    fileName: row.file_name,
    pages: row.pages,
    sizeBytes: row.size_bytes,
    sha256: row.sha256,
    objectKey: row.object_key,
    uploadedAt: row.created_at,
  }))
}

/** Marks the standing document of a kind as replaced or taken off. */
export async function supersedePapers(
  db: Database,
  proposalId: number,
  kind: Paper['kind'],
): Promise<number> {
  return await db('papers')
    .where({ proposal_id: proposalId, kind })
    .whereNull('superseded_at')
    .update({ superseded_at: utcNow(db) })
}

export interface NewPaper {
  proposalId: number
  objectId: number
  kind: Paper['kind']
  fileName: string
  pages: number
  uploadedBy: number
}

export async function insertPaper(db: Database, given: NewPaper): Promise<number> {
  const [id] = await db('papers').insert({
    proposal_id: given.proposalId,
    object_id: given.objectId,
    kind: given.kind,
    file_name: given.fileName,
    pages: given.pages,
    uploaded_by: given.uploadedBy,
  })
  return Number(id)
}
