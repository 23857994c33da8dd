import { lockProposal } from '@/db/queries/proposals'
import type { ProposalsRow } from '@/db/tables'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { contentsOf } from '../proposals/readContents'
import type { ProposalContents } from '../proposals/types'

/** Locks a proposal and reads it whole; decides nothing. */
export async function lockContents(
  tx: Context,
  which: string | number,
): Promise<{ row: ProposalsRow; contents: ProposalContents }> {
  const row = await lockProposal(tx.db, which)
  if (!row) throw refuse.notFound('proposal')
  return { row, contents: await contentsOf(tx.db, row) }
}
