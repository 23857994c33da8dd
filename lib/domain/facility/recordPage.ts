import { databaseNow } from '@/db/queries/clock'
import { useOfRecord, type Owner } from '@/db/queries/facilityOwners'
import type { RecordKind } from '@/db/queries/facilityRecords'
import { retirementDates } from '@/db/queries/retirements'
import type { Database } from '@/db/client'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import type { RecordUse, RecordVersion } from './types'

export interface RecordPage<Facts> {
  slug: string
  name: string
  /** The newest first; never empty. */
  versions: RecordVersion<Facts>[]
  newest: RecordVersion<Facts>
  use: RecordUse
  /** First evening it is no longer there; null while it stays. */
  retiredFrom: string | null
  /** Today in UTC, `YYYY-MM-DD`. */
  today: string
}

/** What a page on one record shows. The caller has asked the policy. */
export async function recordPage<Facts>(
  ctx: Context,
  kind: RecordKind,
  owner: Owner,
  versionsOf: (db: Database, id: number) => Promise<RecordVersion<Facts>[]>,
): Promise<RecordPage<Facts>> {
  const now = await databaseNow(ctx.db)
  const [versions, use, dates] = await Promise.all([
    versionsOf(ctx.db, owner.id),
    useOfRecord(ctx.db, kind, owner.id, now),
    retirementDates(ctx.db, kind),
  ])
  const newest = versions[0]
  if (!newest) throw refuse.integrity(`The ${kind} has no record.`)
  const { slug, name } = owner
  const retiredFrom = dates.get(owner.id) ?? null
  return { slug, name, versions, newest, use, retiredFrom, today: now.toISOString().slice(0, 10) }
}
