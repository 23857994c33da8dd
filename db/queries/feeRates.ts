import type { Database } from '../client.ts'
import type { FeeRatesRow } from '../tables.ts'

export type AffiliationClass = FeeRatesRow['affiliation_class']

export interface FeeRate {
  callKindId: number
  affiliationClass: AffiliationClass
  amountMinor: number
  lateMinor: number
}

const asRate = (row: FeeRatesRow): FeeRate => ({
  callKindId: row.call_kind_id,
  affiliationClass: row.affiliation_class,
  amountMinor: row.amount_minor,
  lateMinor: row.late_minor,
})

/** What a kind of proposal costs by class; none where the kind has one fee for all. */
export async function ratesOfKind(db: Database, callKindId: number): Promise<FeeRate[]> {
  return (await db('fee_rates').where({ call_kind_id: callKindId }).orderBy('id')).map(asRate)
}

/** The schedule of a call, kind by kind. */
export async function ratesOfCall(db: Database, callId: number): Promise<FeeRate[]> {
  const rows = await db('fee_rates as r')
    .join('call_kinds as k', 'k.id', 'r.call_kind_id')
    .where('k.call_id', callId)
    .orderBy('r.id')
    .select<FeeRatesRow[]>('r.*')
  return rows.map(asRate)
}

/** Writes the schedule of a call anew; what was billed keeps its price. */
export async function replaceRates(
  db: Database,
  callKindIds: readonly number[],
  rates: readonly FeeRate[],
): Promise<void> {
  await db('fee_rates')
    .whereIn('call_kind_id', [...callKindIds])
    .delete()
  if (rates.length > 0)
    await db('fee_rates').insert(
      rates.map((rate) => ({
        call_kind_id: rate.callKindId,
        affiliation_class: rate.affiliationClass,
        amount_minor: rate.amountMinor,
        late_minor: rate.lateMinor,
      })),
    )
  // The fee of everybody else stands on the kind, too, where calls are shown.
  for (const rate of rates.filter(({ affiliationClass }) => affiliationClass === 'other'))
    await db('call_kinds').where({ id: rate.callKindId }).update({ fee_minor: rate.amountMinor })
}

/** The class of the institute of whoever leads a proposal; 'other' where no institute of ours is known. */
export async function affiliationOfLead(db: Database, proposalId: number): Promise<AffiliationClass> {
  const row = await db('proposal_people as q')
    .join('people as a', 'a.id', 'q.person_id')
    .join('institutes as i', 'i.id', 'a.institute_id')
    .where({ 'q.proposal_id': proposalId, 'q.role': 'pi' })
    .first<{ affiliation_class: AffiliationClass } | undefined>('i.affiliation_class')
  return row?.affiliation_class ?? 'other'
}
