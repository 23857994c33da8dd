import { z } from 'zod'
import { calendarDay } from '../calendarDay'

const reference = z
  .string()
  .regex(/^[0-9A-HJKMNP-TV-Z]{3}-[0-9A-HJKMNP-TV-Z]{3}$/, 'This is not a reference.')

export const startPaymentSchema = z.object({ reference })

export const askForWaiverSchema = z.object({
  reference,
  reason: z
    .string()
    .trim()
    .min(10, 'Say in a sentence why the fee should be waived.')
    .max(2000, 'Keep the reason below 2,000 characters.'),
})

export type AskForWaiverInput = z.input<typeof askForWaiverSchema>

export const decideWaiverSchema = z
  .object({
    waiverId: z.number().int().positive(),
    decision: z.enum(['granted', 'refused'], 'Grant it or refuse it.'),
    note: z.string().trim().max(300, 'Keep the note below 300 characters.'),
  })
  .refine(({ decision, note }) => decision === 'granted' || note.length > 0, {
    path: ['note'],
    message: 'Say why it is refused.',
  })

export type DecideWaiverInput = z.input<typeof decideWaiverSchema>

const oneLine = (limit: number, missing: string, long: string) =>
  z.string().trim().min(1, missing).max(limit, long)

const reason = oneLine(300, 'Say why, in a sentence.', 'Keep the reason below 300 characters.')

const amount = oneLine(20, 'Give the amount.', 'This is not an amount.')

const billNumber = z.string().regex(/^Q[IC]-\d{4}-\d{4,}$/, 'There is no such number.')

/** In the address of a PDF. */
export const billParams = z.object({ reference, number: billNumber })

export const refundFeeSchema = z
  .object({
    reference,
    amount,
    reason,
    givenBackMinor: z.number().int().nonnegative(),
    /** The reference once more, by hand. */
    typed: z.string().trim().toUpperCase(),
  })
  .refine(({ typed, reference: expected }) => typed === expected, {
    path: ['typed'],
    message: 'Type the reference of this proposal.',
  })

export type RefundFeeForm = z.input<typeof refundFeeSchema>

export const askForInvoiceSchema = z.object({
  reference,
  institute: oneLine(200, 'Name the institute that pays.', 'Keep the name below 200 characters.'),
  address: oneLine(500, 'Give its postal address.', 'Keep the address below 500 characters.'),
  purchaseOrder: z.string().trim().max(60, 'Keep the purchase order below 60 characters.'),
  sendTo: z.email('Give the address the invoice is mailed to.').max(254, 'This address is too long.'),
})

export type AskForInvoiceForm = z.input<typeof askForInvoiceSchema>

export const settleInvoiceSchema = z.object({
  number: billNumber,
  amount,
  paidOn: calendarDay,
  bankReference: oneLine(140, 'Give the reference on the statement.', 'Keep it below 140 characters.'),
})

export type SettleInvoiceForm = z.input<typeof settleInvoiceSchema>

export const cancelInvoiceSchema = z.object({
  number: billNumber,
  reason,
  then: z.enum(['due', 'nothing'], 'Say what becomes of the fee.'),
})

export type CancelInvoiceForm = z.input<typeof cancelInvoiceSchema>

export const decideDisputeSchema = z.object({
  disputeId: z.number().int().positive(),
  decision: z.enum(['ask-again', 'waive', 'withdraw', 'accept'], 'Say what becomes of the fee.'),
  graceDays: z
    .string()
    .trim()
    .regex(/^\d{1,2}$/, 'Give whole days.')
    .transform(Number)
    .refine((days) => days >= 1 && days <= 60, 'Between 1 and 60 days.'),
  note: reason,
})

export type DecideDisputeForm = z.input<typeof decideDisputeSchema>

export const remindOwingSchema = z.object({ slug: z.string().min(1).max(60) })

export const recordTransferSchema = z.object({
  refundId: z.number().int().positive(),
  bankReference: oneLine(140, 'Give the reference of the transfer.', 'Keep it below 140 characters.'),
})

export type RecordTransferForm = z.input<typeof recordTransferSchema>
