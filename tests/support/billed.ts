import type { Database } from '@/db/client'
import type { Actor } from '@/lib/domain/actor'
import type { ActingContext } from '@/lib/domain/context'
import { beginPayment } from '@/lib/domain/fees/beginPayment'
import { startPayment } from '@/lib/domain/fees/startPayment'
import { inTransaction } from '@/lib/domain/inTransaction'
import { testContext } from './context'
import { fakePayments, type FakePayments } from './fakePayments'
import { memoryStore } from './memoryStore'
import { makeScenario, type Scenario, type ScenarioOptions } from './scenario'
import { sendIn } from './sendIn'

/** A proposal that is in, with its fee due, and the payment firm it is paid through. */
export interface Billed {
  scenario: Scenario
  ctx: ActingContext
  payments: FakePayments
  as(actor: Actor): ActingContext
  /** Opens the firm's page and gives its session. */
  open(): Promise<string>
  rows(): Promise<{ fee: string; payments: string[]; receipts: number; refunds: string[]; letters: string[] }>
}

export async function makeBilled(db: Database, options: ScenarioOptions = {}): Promise<Billed> {
  const storage = memoryStore()
  const payments = fakePayments()
  const scenario = await makeScenario(db, { storage, ...options })
  const ctx = testContext(db, scenario.pi, { storage, payments })
  await sendIn(ctx, scenario.reference)
  const fee = () => db('fees').where({ proposal_id: scenario.proposalId }).first()
  return {
    scenario,
    ctx,
    payments,
    as: (actor) => ({ ...ctx, actor }),
    open: async () => {
      await startPayment(ctx, { reference: scenario.reference })
      const begun = await inTransaction(ctx, (tx) => beginPayment(tx, scenario.reference))
      return begun.payment.provider_session_id ?? ''
    },
    rows: async () => {
      const row = await fee()
      const made = await db('payments')
        .where({ fee_id: row?.id ?? 0 })
        .orderBy('id')
      const of = { fee_id: row?.id ?? 0 }
      return {
        fee: row?.state ?? 'none',
        payments: made.map(({ state }) => state),
        receipts: (await db('receipts').where(of)).length,
        refunds: (
          await db('refunds')
            .whereIn(
              'payment_id',
              made.map(({ id }) => id),
            )
            .orderBy('id')
        ).map(({ state }) => state),
        letters: (await db('outbox').where({ template: 'fee-receipt' }).orderBy('id')).map(
          ({ to_email }) => to_email,
        ),
      }
    },
  }
}
