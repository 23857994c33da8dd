'use server'

import { defineAction } from '@/lib/actions/defineAction'
import { askForInvoice } from '@/lib/domain/fees/askForInvoice'
import { cancelInvoice } from '@/lib/domain/fees/cancelInvoice'
import { decideDispute } from '@/lib/domain/fees/decideDispute'
import { decideWaiver } from '@/lib/domain/fees/decideWaiver'
import { recordTransfer } from '@/lib/domain/fees/recordTransfer'
import { remindOwing } from '@/lib/domain/fees/remindOwing'
import { refundFee } from '@/lib/domain/fees/refundFee'
import {
  askForInvoiceSchema,
  cancelInvoiceSchema,
  decideDisputeSchema,
  decideWaiverSchema,
  recordTransferSchema,
  refundFeeSchema,
  remindOwingSchema,
  settleInvoiceSchema,
} from '@/lib/domain/fees/schema'
import { settleInvoice } from '@/lib/domain/fees/settleInvoice'
import { paths } from '@/lib/paths'

const feePages = () => [paths.office('fees'), paths.officeLedger()]

export const decideDisputeAction = defineAction({
  name: 'decideDispute',
  schema: decideDisputeSchema,
  run: decideDispute,
  revalidate: feePages,
})

export const decideWaiverAction = defineAction({
  name: 'decideWaiver',
  schema: decideWaiverSchema,
  run: decideWaiver,
  revalidate: feePages,
})

export const refundFeeAction = defineAction({
  name: 'refundFee',
  schema: refundFeeSchema,
  run: refundFee,
  revalidate: feePages,
})

export const writeInvoiceAction = defineAction({
  name: 'writeInvoice',
  schema: askForInvoiceSchema,
  run: askForInvoice,
  revalidate: feePages,
})

export const settleInvoiceAction = defineAction({
  name: 'settleInvoice',
  schema: settleInvoiceSchema,
  run: settleInvoice,
  revalidate: feePages,
})

export const cancelInvoiceAction = defineAction({
  name: 'cancelInvoice',
  schema: cancelInvoiceSchema,
  run: cancelInvoice,
  revalidate: feePages,
})

export const remindOwingAction = defineAction({
  name: 'remindOwing',
  schema: remindOwingSchema,
  run: remindOwing,
  revalidate: feePages,
})

export const recordTransferAction = defineAction({
  name: 'recordTransfer',
  schema: recordTransferSchema,
  run: recordTransfer,
  revalidate: feePages,
})
