import { createHash } from 'node:crypto'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import type { Paper } from '../proposals/writingTypes'

/** The bytes of a stored document, checked against the fingerprint taken when it was kept. */
export async function storedBytes(
  ctx: Pick<Context, 'storage'>,
  paper: Pick<Paper, 'objectKey' | 'sha256'>,
): Promise<Uint8Array> {
  const bytes = await ctx.storage.get(paper.objectKey)
  if (createHash('sha256').update(bytes).digest('hex') !== paper.sha256)
    throw refuse.integrity('The stored document is not the one that was kept. The office has been told.')
  return bytes
}
