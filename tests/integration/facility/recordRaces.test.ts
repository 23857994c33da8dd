import { expect, it } from 'vitest'
import { databaseNow } from '@/db/queries/clock'
import { telescopeVersions } from '@/db/queries/facilityRecords'
import { saveTelescopeRecord } from '@/lib/domain/facility/saveTelescopeRecord'
import { Refusal } from '@/lib/errors'
import { testContext } from '../../support/context'
import { useOwnDatabase } from '../../support/ownDatabase'
import { makeScenario } from '../../support/scenario'

// Seen to fail with the version that was read not compared: six versions, one over the other.

const db = useOwnDatabase('record_races', { max: 8 })

it('writes one version of six saved at the same moment, and shows it to the other five', async () => {
  const scenario = await makeScenario(db())
  const ctx = testContext(db(), scenario.office)
  const validFrom = (await databaseNow(db())).toISOString().slice(0, 10)
  const answers = await Promise.allSettled(
    [4, 5, 6, 7, 8, 9].map((collectingAreaM2) =>
      saveTelescopeRecord(ctx, {
        slug: `telescope-${scenario.tag}`,
        over: 1,
        validFrom,
        facts: { apertureM: 3.8, collectingAreaM2, horizon: [], highestAltitudeDeg: null },
      }),
    ),
  )
  const refusals = answers.flatMap((answer) =>
    answer.status === 'rejected' ? [answer.reason as unknown] : [],
  )
  expect(refusals).toHaveLength(5)
  for (const refusal of refusals) {
    if (!(refusal instanceof Refusal)) throw refusal
    expect([refusal.kind, refusal.stale?.version]).toEqual(['stale', 2])
  }
  const versions = await telescopeVersions(db(), scenario.telescopeId)
  expect(versions.map(({ recordVersion }) => recordVersion)).toEqual([2, 1])
  expect(await db()('logbook').where({ action: 'facility.telescope' })).toHaveLength(1)
})
