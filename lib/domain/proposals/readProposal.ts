import { databaseNow } from '@/db/queries/clock'
import { feeOf, type FeeState } from '@/db/queries/fees'
import { findProposal } from '@/db/queries/proposals'
import type { ProposalsRow } from '@/db/tables'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { deadlineOf } from '../calls/rules'
import type { Actor } from '../actor'
import type { Context } from '../context'
import type { ProposalComputation } from '../observations/types'
import { completeness, type SectionReport } from './completeness'
import { computationOf } from './computationOf'
import { mayOfferLead } from './leadPolicy'
import { investigatorRow, mayEditProposal, mayManagePeople, mayReadProposal } from './policy'
import { putAwayReason } from './putAwayDraft'
import { readContents } from './readContents'
import type { Investigator, ProposalContents } from './types'

export interface ReadProposal {
  contents: ProposalContents
  computation: ProposalComputation
  sections: SectionReport[]
  now: Date
  deadline: Date
  /** What is owed since it was sent; null before that, and where there is no fee. */
  fee: { amountMinor: number; currency: string; state: FeeState } | null
  /** The reader's own row; null for the office. */
  own: Investigator | null
  /** Why it cannot be changed now, in a sentence; null when it can. */
  readOnly: string | null
  mayManage: boolean
  /** Who has been asked to lead it, by their account; null when nobody has. */
  leadOfferedTo: number | null
  mayOfferLead: boolean
  /** A draft put away that may be taken back. */
  mayTakeBack: boolean
}

/** Whether it is a draft the investigators put away, and could still be written on. */
function mayTakeBack(row: ProposalsRow | null, actor: Actor, contents: ProposalContents, now: Date): boolean {
  if (contents.state !== 'withdrawn') return false
  const asDraft = { ...contents, state: 'draft' as const }
  return row?.withdrawn_reason === putAwayReason && mayManagePeople(actor, asDraft, now).allowed
}

/** One proposal as its pages show it, for those who may read it. */
export async function readProposal(ctx: Context, reference: string): Promise<ReadProposal> {
  if (!ctx.actor) throw refuse.notSignedIn()
  const [contents, now] = await Promise.all([readContents(ctx.db, reference), databaseNow(ctx.db)])
  authorize(mayReadProposal(ctx.actor, contents))
  const computation = computationOf(contents)
  const [fee, row] = await Promise.all([feeOf(ctx.db, contents.id), findProposal(ctx.db, contents.id)])
  const mayEdit = mayEditProposal(ctx.actor, contents, now)
  return {
    contents,
    computation,
    sections: completeness(contents, computation),
    now,
    deadline: deadlineOf(contents.call, contents.kind, contents),
    fee: fee ? { amountMinor: fee.amount_minor, currency: fee.currency, state: fee.state } : null,
    own: investigatorRow(ctx.actor, contents),
    readOnly: mayEdit.allowed ? null : mayEdit.sentence,
    mayManage: mayManagePeople(ctx.actor, contents, now).allowed,
    leadOfferedTo: row?.lead_offered_to ?? null,
    mayOfferLead: mayOfferLead(ctx.actor, contents).allowed,
    mayTakeBack: mayTakeBack(row, ctx.actor, contents, now),
  }
}
