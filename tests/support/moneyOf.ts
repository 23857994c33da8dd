import type { Database } from '@/db/client'

/** What stands on the accounts of a proposal's fee, minor units; accounts at nought are left out. */
export async function moneyOf(db: Database, proposalId: number): Promise<Record<string, number>> {
  const rows = await db('money_entries as e')
    .join('fees as f', 'f.id', 'e.fee_id')
    .where('f.proposal_id', proposalId)
    .groupBy('e.account')
    .select<{ account: string; sum: string }[]>('e.account', db.raw('SUM(e.amount_minor) AS sum'))
  return Object.fromEntries(
    rows.map(({ account, sum }) => [account, Number(sum)] as const).filter(([, sum]) => sum !== 0),
  )
}
