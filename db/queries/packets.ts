import type { Database } from '../client.ts'
import { atNow } from './clock.ts'
import type { PacketsRow } from '../tables.ts'

export type PacketVariant = PacketsRow['variant']

export interface StoredPacket {
  objectKey: string
  sha256: string
  pages: number
}

/** The rendered packet of a version, if what would go into it has not changed since. */
export async function findPacket(
  db: Database,
  versionId: number,
  variant: PacketVariant,
  contentHash: string,
): Promise<StoredPacket | null> {
  const row = await db('packets as p')
    .join('stored_objects as o', 'o.id', 'p.object_id')
    .where({ 'p.proposal_version_id': versionId, 'p.variant': variant, 'p.content_hash': contentHash })
    .whereNull('p.superseded_at')
    .first('o.object_key', 'o.sha256', 'p.pages')
  return row ? { objectKey: row.object_key, sha256: row.sha256, pages: row.pages } : null
}

export interface NewPacket {
  versionId: number
  variant: PacketVariant
  contentHash: string
  pages: number
  object: { key: string; sha256: string; sizeBytes: number }
}

/** Keeps a packet just rendered; an older one of the same version and variant is superseded. */
export async function insertPacket(db: Database, packet: NewPacket): Promise<void> {
  await db('packets')
    .where({ proposal_version_id: packet.versionId, variant: packet.variant })
    .whereNull('superseded_at')
    .update({ superseded_at: atNow(db) })
  const [objectId] = await db('stored_objects').insert({
    object_key: packet.object.key,
    sha256: packet.object.sha256,
    size_bytes: packet.object.sizeBytes,
    content_type: 'application/pdf',
    purpose: 'packet',
  })
  await db('packets').insert({
    proposal_version_id: packet.versionId,
    variant: packet.variant,
    object_id: Number(objectId),
    pages: packet.pages,
    content_hash: packet.contentHash,
  })
}

/** Where the bytes of a paper lie. */
export async function paperObject(
  db: Database,
  paperId: number,
): Promise<{ objectKey: string; sha256: string; pages: number } | null> {
  const row = await db('papers as p')
    .join('stored_objects as o', 'o.id', 'p.object_id')
    .where({ 'p.id': paperId })
    .first('o.object_key', 'o.sha256', 'p.pages')
  return row ? { objectKey: row.object_key, sha256: row.sha256, pages: row.pages } : null
}
