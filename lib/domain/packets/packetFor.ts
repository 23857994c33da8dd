import { createHash } from 'node:crypto'
import { databaseNow } from '@/db/queries/clock'
import { findPacket, insertPacket, paperObject, type StoredPacket } from '@/db/queries/packets'
import { findVersion } from '@/db/queries/versions'
import { Refusal, refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { newObjectKey } from '../objects/objectKey'
import { storedBytes } from '../papers/storedBytes'
import { makePacket, packetHash, type PacketInput, type PacketVariant } from './makePacket'
import { packetParts } from './packetParts'

export interface PacketFile {
  bytes: Uint8Array
  fileName: string
}

const sha256Of = (bytes: Uint8Array) => createHash('sha256').update(bytes).digest('hex')

/**
 * The packet of a version that was sent, drawn when it is first asked for and kept under the hash of what went in.
 * It checks no right: the verb that calls it has asked its own policy.
 */
export async function packetFor(
  ctx: Context,
  proposalVersionId: number,
  variant: PacketVariant,
): Promise<PacketFile> {
  const version = await findVersion(ctx.db, proposalVersionId)
  if (!version) throw refuse.notFound('packet')
  const { snapshot, versionNumber, paperId } = version
  const paper = paperId === null ? null : await paperObject(ctx.db, paperId)
  if (!paper && !snapshot.contents.writings.justification.text)
    throw refuse.integrity('The justification of this proposal is missing. The office has to be told.')
  const input: PacketInput = { snapshot, variant, versionNumber, paperSha256: paper?.sha256 ?? null }
  const contentHash = packetHash(input)
  const { reference, reviewNumber } = snapshot.contents
  const fileName = `${variant === 'full' ? reference : (reviewNumber ?? 'packet')}.pdf`

  const kept = await findPacket(ctx.db, version.id, variant, contentHash)
  const keptBytes = kept && (await readKept(ctx, kept))
  if (keptBytes) return { bytes: keptBytes, fileName }
  const { bytes, pages } = await makePacket(input, await packetParts(ctx, paper, snapshot.contents.figures))
  await keep(ctx, { versionId: version.id, variant, contentHash, pages }, bytes)
  return { bytes, fileName }
}

/** A kept packet that is gone or changed is simply drawn again. */
async function readKept(ctx: Context, kept: StoredPacket): Promise<Uint8Array | null> {
  try {
    return await storedBytes(ctx, kept)
  } catch (error) {
    if (error instanceof Refusal) return null
    throw error
  }
}

/** Keeping it spares the next reader the wait; a store that does not answer costs no more than that. */
async function keep(
  ctx: Context,
  packet: { versionId: number; variant: PacketVariant; contentHash: string; pages: number },
  bytes: Uint8Array,
): Promise<void> {
  const key = newObjectKey(ctx.random, await databaseNow(ctx.db))
  try {
    await ctx.storage.put(key, bytes, 'application/pdf')
  } catch (error) {
    if (error instanceof Refusal) return
    throw error
  }
  await inTransaction(ctx, (tx) =>
    insertPacket(tx.db, { ...packet, object: { key, sha256: sha256Of(bytes), sizeBytes: bytes.byteLength } }),
  )
}
