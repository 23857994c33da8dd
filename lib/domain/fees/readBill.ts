import { feeByReference } from '@/db/queries/fees'
import { findCreditNote, findInvoice } from '@/db/queries/invoices'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import type { PacketFile } from '../packets/packetFor'
import { mayReadProposal } from '../proposals/policy'
import { readContents } from '../proposals/readContents'
import { renderPaper } from './renderPaper'

/** An invoice or a credit note of a proposal as PDF, for its investigators and the office. */
export async function readBill(
  ctx: ActingContext,
  input: { reference: string; number: string },
): Promise<PacketFile> {
  authorize(mayReadProposal(ctx.actor, await readContents(ctx.db, input.reference)))
  const fee = await feeByReference(ctx.db, input.reference)
  const paper = (await findInvoice(ctx.db, input.number)) ?? (await findCreditNote(ctx.db, input.number))
  if (!fee || paper?.fee_id !== fee.id) throw refuse.notFound('paper')
  return renderPaper(ctx.db, input.number)
}
