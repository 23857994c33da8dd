import { billingRecords } from '@/db/queries/billing'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { mayHandleFees } from '../fees/policy'
import type { BillingRecord } from './types'

/** Who writes invoices and where they are paid to: every version, the newest first. */
export async function readBilling(ctx: ActingContext): Promise<BillingRecord[]> {
  authorize(mayHandleFees(ctx.actor))
  return billingRecords(ctx.db)
}
