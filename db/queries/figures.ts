import type { Figure } from '../../lib/domain/proposals/writingTypes.ts'
import type { Database } from '../client.ts'
import { utcNow } from '../utcNow.ts'

const columns = [
  'f.id',
  'f.label',
  'f.caption',
  'f.file_name',
  'f.width_px',
  'f.height_px',
  'f.position',
  'f.version',
  'o.size_bytes',
  'o.sha256',
  'o.object_key',
  'o.content_type',
] as const

/** Figures that stand, in their order. */
export async function figuresOf(db: Database, proposalId: number): Promise<Figure[]> {
  const rows = await db('figures as f')
    .join('stored_objects as o', 'o.id', 'f.object_id')
    .where({ 'f.proposal_id': proposalId })
    .whereNull('f.removed_at')
    .orderBy(['f.position', 'f.id'])
    .select(...columns)
  return rows.map((row) => ({
    id: row.id,
    label: row.label,
    caption: row.caption,
    fileName: row.file_name,
    widthPx: row.width_px,
    heightPx: row.height_px,
    position: row.position,
    version: row.version,
    sizeBytes: row.size_bytes,
    sha256: row.sha256,
    objectKey: row.object_key,
    contentType: row.content_type === 'image/png' ? 'image/png' : 'image/jpeg',
  }))
}

export interface NewFigure {
  proposalId: number
  objectId: number
  label: string
  caption: string
  fileName: string
  widthPx: number
  heightPx: number
  position: number
}

export async function insertFigure(db: Database, given: NewFigure): Promise<number> {
  const [id] = await db('figures').insert({
    proposal_id: given.proposalId,
    object_id: given.objectId,
    label: given.label,
    caption: given.caption,
    file_name: given.fileName,
    width_px: given.widthPx,
    height_px: given.heightPx,
    position: given.position,
  })
  return Number(id)
}

/** Puts another picture into a figure; the old one stays in the store, for a version sent before. */
export async function putPicture(
  db: Database,
  id: number,
  drawn: Pick<NewFigure, 'objectId' | 'fileName' | 'widthPx' | 'heightPx'>,
): Promise<void> {
  await db('figures').where({ id }).update({
    object_id: drawn.objectId,
    file_name: drawn.fileName,
    width_px: drawn.widthPx,
    height_px: drawn.heightPx,
  })
}

/** Changes words of a figure over the version they were read in; false when another was there first. */
export async function changeFigure(
  db: Database,
  figure: { id: number; version: number },
  words: { label: string; caption: string },
): Promise<boolean> {
  const count = await db('figures')
    .where({ ...figure })
    .update({ ...words, version: figure.version + 1 })
  return count === 1
}

/** Marks a figure as taken off. */
export async function takeFigureOff(db: Database, id: number): Promise<void> {
  await db('figures')
    .where({ id })
    .update({ removed_at: utcNow(db) })
}

/** Sets the order of figures by their keys, from 1. */
export async function orderFigures(db: Database, ids: readonly number[]): Promise<void> {
  for (const [index, id] of ids.entries())
    await db('figures')
      .where({ id })
      .update({ position: index + 1 })
}
