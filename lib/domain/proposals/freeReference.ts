import { findProposal } from '@/db/queries/proposals'
import type { Context } from '../context'
import { referenceFrom } from './reference'

/** A reference nobody has. A million drafts leave it free at the first try 29 times in 30. */
export async function freeReference(tx: Context): Promise<string> {
  for (;;) {
    const reference = referenceFrom(tx.random.bytes(5))
    if (!(await findProposal(tx.db, reference))) return reference
  }
}
