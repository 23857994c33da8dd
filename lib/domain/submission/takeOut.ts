import { markOut } from '@/db/queries/submission'
import { moveTime, timeBalance } from '@/db/queries/timeLedger'
import type { ProposalsRow } from '@/db/tables'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'

/** Takes a proposal out of the running: it asks for no time any more. Assignments and reviews stay as they are. */
export async function takeOut(
  tx: Context,
  row: ProposalsRow,
  out: { state: 'withdrawn'; reason: string } | { state: 'lapsed' },
): Promise<void> {
  if (!(await markOut(tx.db, row, out)))
    throw refuse.closed('This proposal has moved on. Load the page again.')
  await moveTime(tx.db, {
    proposalId: row.id,
    from: 'asked',
    to: 'outside',
    seconds: await timeBalance(tx.db, row.id, 'asked'),
    reason: out.state,
    madeBy: tx.actor?.personId ?? null,
  })
}
