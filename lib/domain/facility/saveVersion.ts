import { databaseNow } from '@/db/queries/clock'
import { lockOwner, useOfRecord, type Owner } from '@/db/queries/facilityOwners'
import type { RecordKind } from '@/db/queries/facilityRecords'
import type { Database } from '@/db/client'
import { refuse } from '@/lib/errors'
import { holds } from '../actor'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { eveningProblem } from './evening'
import type { RecordVersion } from './types'

type NewVersion<Facts> = Pick<RecordVersion<Facts>, 'recordVersion' | 'validFrom' | 'facts'>

interface Save<Facts> {
  kind: RecordKind
  owner: Owner
  input: { over: number; validFrom: string; facts: Facts }
  /** Every version, the newest first. */
  versions: (db: Database, id: number) => Promise<RecordVersion<Facts>[]>
  insert: (db: Database, id: number, version: NewVersion<Facts>) => Promise<void>
  /** Facts as a form holds them: what somebody who came second is shown. */
  typed: (facts: Facts) => Record<string, unknown>
}

/** Somebody saved a version since the page was read: who, when, and what it says. */
function staleRecord<Facts>(ctx: ActingContext, newest: RecordVersion<Facts>, typed: Save<Facts>['typed']) {
  return refuse.stale({
    changedBy: newest.savedBy === ctx.actor.name ? 'Another window of yours' : (newest.savedBy ?? 'Someone'),
    changedAt: newest.savedAt.toISOString(),
    version: newest.recordVersion,
    theirs: { validFrom: newest.validFrom, ...typed(newest.facts) },
  })
}

/** Before and after, of what differs: every version is kept whole in its own row. */
function changedFacts<Facts>(of: string, before: NewVersion<Facts>, after: NewVersion<Facts>) {
  const { facts: old } = before
  const differing = Object.entries(after.facts as object).filter(
    ([name, value]) => JSON.stringify(old[name as keyof Facts]) !== JSON.stringify(value),
  )
  const pick = ({ recordVersion, validFrom, facts }: NewVersion<Facts>) => ({
    of,
    record: recordVersion,
    validFrom,
    ...Object.fromEntries(differing.map(([name]) => [name, facts[name as keyof Facts]])),
  })
  return { before: pick(before), after: pick(after) }
}

/**
 * The one way a record is changed: a new version beside the old ones, which stay as they are, so that what cites them
 * keeps its meaning. The caller has asked the policy.
 */
export async function saveVersion<Facts>(
  ctx: ActingContext,
  { kind, owner, input, versions, insert, typed }: Save<Facts>,
): Promise<{ recordVersion: number }> {
  return inTransaction(ctx, async (tx) => {
    if (!(await lockOwner(tx.db, kind, owner.id))) throw refuse.notFound(kind)
    const [newest] = await versions(tx.db, owner.id)
    if (!newest) throw refuse.integrity(`The ${kind} has no record.`)
    if (newest.recordVersion !== input.over) throw staleRecord(tx, newest, typed)
    const now = await databaseNow(tx.db)
    const { wasUsed } = await useOfRecord(tx.db, kind, owner.id, now)
    const problem = eveningProblem(input.validFrom, now.toISOString().slice(0, 10), wasUsed)
    if (problem) throw refuse.field('validFrom', problem)
    const saysTheSame = JSON.stringify(typed(newest.facts)) === JSON.stringify(typed(input.facts))
    if (saysTheSame && input.validFrom >= newest.validFrom)
      throw refuse.invalid(`Nothing differs from record ${newest.recordVersion}.`)
    const version = {
      recordVersion: newest.recordVersion + 1,
      validFrom: input.validFrom,
      facts: input.facts,
    }
    await insert(tx.db, owner.id, version)
    await writeLogbook(tx, {
      action: `facility.${kind}`,
      subject: { kind: `${kind} record`, id: `${owner.id}.${version.recordVersion}` },
      actingAs: holds(tx.actor, 'office') ? 'office' : 'instrument-scientist',
      ...changedFacts(owner.name, newest, version),
    })
    return { recordVersion: version.recordVersion }
  })
}
