import { findProposal, updateProposal, type ProposalChanges } from '@/db/queries/proposals'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { writeLogbook } from '../logbook/writeLogbook'
import { changedFields } from './changedFields'
import type { OpenedProposal } from './openProposal'

export interface Saved {
  version: number
  savedAt: string
}

/** Writes columns of a locked proposal, with its entry in the logbook; writes nothing when nothing differs. */
export async function writeProposal(
  tx: Context,
  { row }: Pick<OpenedProposal, 'row'>,
  action: string,
  changes: ProposalChanges,
): Promise<Saved> {
  const before = Object.fromEntries(
    Object.keys(changes).map((name) => [name, row[name as keyof ProposalChanges]]),
  )
  const changed = changedFields<Record<string, unknown>>(before, changes)
  if (!changed) return { version: row.version, savedAt: row.updated_at.toISOString() }
  if (!(await updateProposal(tx.db, row.id, row.version, changes)))
    throw refuse.integrity('The proposal changed while it was locked.')
  await writeLogbook(tx, {
    action,
    subject: { kind: 'proposal', id: row.reference },
    actingAs: 'investigator',
    ...changed,
  })
  const written = await findProposal(tx.db, row.id)
  return { version: row.version + 1, savedAt: (written ?? row).updated_at.toISOString() }
}
