import { findCallBySlug } from '@/db/queries/calls'
import { proposalsOfCall } from '@/db/queries/office'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import type { OfficeProposalsReply } from './officeProposalSchema'
import { mayManageCalls } from './policy'

/** Who submitted and who paid, for the office. */
export async function readOfficeProposals(ctx: ActingContext, slug: string): Promise<OfficeProposalsReply> {
  authorize(mayManageCalls(ctx.actor))
  const call = await findCallBySlug(ctx.db, slug)
  if (!call) throw refuse.notFound('call')
  const rows = await proposalsOfCall(ctx.db, call.id)
  return {
    rows: rows.map((row) => ({
      reference: row.reference,
      reviewNumber: row.reviewNumber,
      title: row.title,
      state: row.isReopened ? 'reopened' : row.state,
      kind: row.kind,
      lead: row.lead,
      arrivedAt: row.arrivedAt?.toISOString() ?? null,
      askedSeconds: row.askedSeconds,
      feeState: row.feeState,
      feeMinor: row.feeMinor,
      currency: call.currency ?? 'EUR',
      paidMinor: row.paidMinor,
      refundedMinor: row.refundedMinor,
      affiliationClass: row.affiliationClass,
      disputedMinor: row.disputedMinor,
      lostMinor: row.lostMinor,
      invoice: row.invoice,
      waiverId: row.waiverId,
      waiverReason: row.waiverReason,
    })),
  }
}
