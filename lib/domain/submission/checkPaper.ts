import { createHash } from 'node:crypto'
import { Refusal, refuse } from '@/lib/errors'
import type { Context } from '../context'
import type { ProposalContents } from '../proposals/types'

/**
 * Reads the justification back from the store before it is frozen. Missing or changed bytes stop the sending;
 * a store that does not answer does not, since the bytes were checked when they were uploaded.
 */
export async function checkPaper(ctx: Context, contents: Pick<ProposalContents, 'papers'>): Promise<void> {
  const paper = contents.papers.find(({ kind }) => kind === 'justification')
  if (!paper) return
  let bytes: Uint8Array
  try {
    bytes = await ctx.storage.get(paper.objectKey)
  } catch (error) {
    if (error instanceof Refusal && error.kind === 'unavailable') return
    if (error instanceof Refusal) throw refuse.field('papers', damaged)
    throw error
  }
  if (createHash('sha256').update(bytes).digest('hex') !== paper.sha256) throw refuse.field('papers', damaged)
}

const damaged = 'The stored justification is damaged. Upload it again, then send.'
