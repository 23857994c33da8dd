import { z } from 'zod'
import { accountProblem, bareAccount } from './accountProblem'
import { bankProblem } from './bankProblem'

const line = (limit: number, missing: string) =>
  z.string().trim().min(1, missing).max(limit, `At most ${limit} characters.`)

const checked = (problem: (text: string) => string | null) =>
  z
    .string()
    .transform(bareAccount)
    .superRefine((text, context) => {
      const sentence = problem(text)
      if (sentence) context.addIssue({ code: 'custom', message: sentence })
    })

export const billingSchema = z.object({
  /** The version that was on the page; 0 where there was none. */
  over: z.number().int().nonnegative(),
  name: line(160, 'Say who writes the invoices.'),
  address: line(500, 'Give the postal address.'),
  taxNumber: z.string().trim().max(40, 'At most 40 characters.'),
  contact: z.email('Give an e-mail address for questions.').max(254, 'This address is too long.'),
  accountHolder: line(160, 'Name the holder of the account.'),
  iban: checked(accountProblem),
  bic: checked(bankProblem),
  bank: line(160, 'Name the bank.'),
})

export type BillingForm = z.input<typeof billingSchema>
