import type { Database } from '@/db/client'
import { callKinds, findCall } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { investigatorsOf } from '@/db/queries/proposalPeople'
import { lockProposal } from '@/db/queries/proposals'
import type { ProposalsRow } from '@/db/tables'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { Actor } from '../actor'
import type { Context } from '../context'
import { mayEditProposal, mayManagePeople, type ProposalSubject } from './policy'

export interface OpenedProposal {
  row: ProposalsRow
  subject: ProposalSubject
  actor: Actor
  /** By the database's clock. */
  now: Date
}

async function subjectOf(db: Database, row: ProposalsRow): Promise<ProposalSubject> {
  const call = await findCall(db, row.call_id)
  const kind = (await callKinds(db, row.call_id)).find(({ id }) => id === row.call_kind_id)
  if (!call || !kind) throw refuse.integrity('The call of this proposal is not complete.')
  return {
    state: row.state,
    isReopened: row.is_reopened === 1,
    closesAt: row.closes_at,
    call,
    kind,
    people: await investigatorsOf(db, row.id),
  }
}

/** Locks a proposal by its reference and gives what its policies ask; decides nothing yet. */
export async function lockedProposal(tx: Context, reference: string): Promise<OpenedProposal> {
  if (!tx.actor) throw refuse.notSignedIn()
  const row = await lockProposal(tx.db, reference)
  if (!row) throw refuse.notFound('proposal')
  return { row, subject: await subjectOf(tx.db, row), actor: tx.actor, now: await databaseNow(tx.db) }
}

/** Locks a proposal and checks that the actor may change it now: how every verb that edits one begins. */
export async function openForEditing(tx: Context, reference: string): Promise<OpenedProposal> {
  const opened = await lockedProposal(tx, reference)
  authorize(mayEditProposal(opened.actor, opened.subject, opened.now))
  return opened
}

/** The same for who is named on it. */
export async function openForManaging(tx: Context, reference: string): Promise<OpenedProposal> {
  const opened = await lockedProposal(tx, reference)
  authorize(mayManagePeople(opened.actor, opened.subject, opened.now))
  return opened
}
