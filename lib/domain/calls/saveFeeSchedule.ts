import { callKinds } from '@/db/queries/calls'
import { ratesOfCall, replaceRates, type FeeRate } from '@/db/queries/feeRates'
import { isBilled } from '@/db/queries/fees'
import type { CallsRow } from '@/db/tables'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { moneyAmount } from '../fees/moneyAmount'
import { writeLogbook } from '../logbook/writeLogbook'
import { changeCall } from './changeCall'
import type { FeeSchedule } from './feeScheduleSchema'

const classes = ['member', 'partner', 'other'] as const

/** Saves what a call costs, until it closes. What has been billed keeps its price, and its currency binds the call. */
export function saveFeeSchedule(ctx: ActingContext, input: FeeSchedule): Promise<void> {
  return changeCall(ctx, {
    action: 'call.fees',
    slug: input.slug,
    version: input.version,
    decide: (row, now) => {
      const isBefore = row.stage === 'planned' || (row.stage === 'published' && now < row.closes_at)
      if (!isBefore) throw refuse.closed('The call has closed: its fees stay as they were.')
      return { currency: input.currency === '' ? null : input.currency }
    },
    then: (tx, before) => writeRates(tx, before, input),
  })
}

async function writeRates(tx: ActingContext, call: CallsRow, input: FeeSchedule): Promise<void> {
  if ((call.currency ?? '') !== input.currency && (await isBilled(tx.db, call.id)))
    throw refuse.field(
      'currency',
      `Fees have been billed in ${call.currency ?? 'another currency'} already: the currency stays.`,
    )
  const kinds = await callKinds(tx.db, call.id)
  const ids = kinds.map(({ id }) => id)
  if (!input.kinds.every(({ kindId }) => ids.includes(kindId)) || input.kinds.length !== ids.length)
    throw refuse.invalid('The kinds of this call have changed. Load the page again.')
  const minor = (text: string) => {
    const amount = input.currency === '' ? 0 : moneyAmount(text, input.currency)
    if (typeof amount === 'string') throw refuse.invalid(amount)
    return amount
  }
  const rates = input.kinds.flatMap((kind): FeeRate[] =>
    classes.map((affiliationClass) => ({
      callKindId: kind.kindId,
      affiliationClass,
      amountMinor: minor(kind[affiliationClass]),
      lateMinor: minor(kind.late),
    })),
  )
  const before = await ratesOfCall(tx.db, call.id)
  await replaceRates(tx.db, ids, rates)
  await writeLogbook(tx, {
    action: 'call.fee-rates',
    subject: { kind: 'call', id: call.number },
    actingAs: 'office',
    before: { rates: before },
    after: { rates },
  })
}
