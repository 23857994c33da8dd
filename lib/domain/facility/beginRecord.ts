import { databaseNow } from '@/db/queries/clock'
import type { RecordKind } from '@/db/queries/facilityRecords'
import type { Database } from '@/db/client'
import { holds } from '../actor'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { carrierIn } from './carrierIn'
import { putIn } from './putIn'
import type { FacilityKind, RecordVersion } from './types'

type First<Facts> = Pick<RecordVersion<Facts>, 'recordVersion' | 'validFrom' | 'facts'>

interface Beginning<Facts> {
  kind: RecordKind
  input: { slug: string; name: string; of?: string; validFrom: string; facts: Facts }
  /** What carries it; nothing carries a site. */
  carrier: FacilityKind | null
  insertOwner: (db: Database, carrierId: number) => Promise<number>
  insert: (db: Database, id: number, version: First<Facts>) => Promise<void>
}

/** Puts something new into the facility with its first record. The caller has asked the policy. */
export async function beginRecord<Facts>(
  ctx: ActingContext,
  { kind, input, carrier, insertOwner, insert }: Beginning<Facts>,
): Promise<{ slug: string }> {
  const { slug, name, validFrom, facts } = input
  return inTransaction(ctx, async (tx) => {
    const now = await databaseNow(tx.db)
    const above = carrier ? await carrierIn(tx.db, carrier, input.of ?? '', now) : null
    const carrierId = above?.id ?? 0
    const id = await putIn(tx.db, { kind, slug, name, carrierId }, () => insertOwner(tx.db, carrierId))
    await insert(tx.db, id, { recordVersion: 1, validFrom, facts })
    await writeLogbook(tx, {
      action: `facility.${kind}`,
      subject: { kind: `${kind} record`, id: `${id}.1` },
      actingAs: holds(tx.actor, 'office') ? 'office' : 'instrument-scientist',
      after: { of: name, ...(above ? { on: above.name } : {}), record: 1, validFrom, ...facts },
    })
    return { slug }
  })
}
