import { readSnapshot } from '@/db/queries/versions'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { computationOf } from '../proposals/computationOf'
import { isOpenForWriting, mayReadProposal } from '../proposals/policy'
import { readContents } from '../proposals/readContents'
import { makePacket, type PacketVariant } from './makePacket'
import { packetFor, type PacketFile } from './packetFor'
import { packetParts } from './packetParts'

/**
 * The packet of a proposal for its investigators and the office: what was sent, or a preview of what stands now
 * while it is being written. A preview is never kept.
 */
export async function readPacket(
  ctx: ActingContext,
  input: { reference: string; variant: PacketVariant },
): Promise<PacketFile> {
  const contents = await readContents(ctx.db, input.reference)
  authorize(mayReadProposal(ctx.actor, contents))
  const sent = await readSnapshot(ctx.db, contents.id)
  if (sent && !isOpenForWriting(contents)) return packetFor(ctx, sent.id, input.variant)

  const computation = computationOf(contents)
  const paper = contents.papers.find(({ kind }) => kind === 'justification') ?? null
  const { bytes } = await makePacket(
    {
      snapshot: { contents, computation, engineVersion: computation.engineVersion },
      variant: input.variant,
      versionNumber: null,
      paperSha256: paper?.sha256 ?? null,
    },
    await packetParts(ctx, paper, contents.figures),
  )
  return { bytes, fileName: `${contents.reference}-preview.pdf` }
}
