import { readSnapshot } from '@/db/queries/versions'
import type { Context } from '../context'
import { isOpenForWriting } from '../proposals/policy'
import type { ProposalContents } from '../proposals/types'
import type { ProposalComputation } from './types'

/**
 * The numbers that count: of a draft those of now, of a sent proposal those frozen with it, whatever the engine
 * would say today. The caller has checked that the proposal may be read.
 */
export async function standingComputation(
  ctx: Context,
  read: { contents: ProposalContents; computation: ProposalComputation },
): Promise<ProposalComputation> {
  if (isOpenForWriting(read.contents)) return read.computation
  const standing = await readSnapshot(ctx.db, read.contents.id)
  return standing?.snapshot.computation ?? read.computation
}
