import { z } from 'zod'
import { moneyAmount } from '../fees/moneyAmount'

const typed = z.string().trim().max(20, 'This is not an amount.')

const columns = ['member', 'partner', 'other', 'late'] as const

const currencies = new Set(Intl.supportedValuesOf('currency'))

/** A call's fees as typed: one row a kind, one column a class, and what sending late adds. */
export const feeScheduleSchema = z
  .object({
    slug: z.string().min(1).max(60),
    version: z.number().int().positive(),
    /** ISO 4217; empty for a call without fees. */
    currency: z
      .string()
      .trim()
      .toUpperCase()
      .refine((code) => code === '' || currencies.has(code), 'Give a currency by its three letters, as EUR.'),
    kinds: z
      .array(
        z.object({
          kindId: z.number().int().positive(),
          member: typed,
          partner: typed,
          other: typed,
          late: typed,
        }),
      )
      .max(40),
  })
  .superRefine(({ currency, kinds }, context) => {
    if (currency !== '' && !currencies.has(currency)) return
    const complain = (path: (string | number)[], message: string) =>
      context.addIssue({ code: 'custom', path, message })
    kinds.forEach((kind, index) => {
      for (const column of columns) {
        const at = ['kinds', index, column]
        const minor = currency === '' ? bareAmount(kind[column]) : moneyAmount(kind[column], currency)
        if (typeof minor === 'string') complain(at, minor)
        else if (currency === '' && minor > 0)
          complain(at, 'Give the currency of the call first, or write 0.')
      }
    })
  })

/** Without a currency only nought can be meant. */
const bareAmount = (text: string): number | string =>
  /^0*(\.0*)?$/.test(text) ? 0 : 'Give the currency of the call first, or write 0.'

export type FeeScheduleForm = z.input<typeof feeScheduleSchema>
export type FeeSchedule = z.output<typeof feeScheduleSchema>
