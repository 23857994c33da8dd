import { expect, it } from 'vitest'
import { setNights } from '@/lib/domain/calendar/setNights'
import { Refusal } from '@/lib/errors'
import { testContext } from '../../support/context'
import { useOwnDatabase } from '../../support/ownDatabase'
import { makeScenario } from '../../support/scenario'
import { makeCall } from '../../support/scenario/call'

// Seen to fail without the telescope locked: both calls had the night, and the invariant said so.

const db = useOwnDatabase('night_races', { max: 8 })

it('gives a night to one of two calls that two people of the office save at one moment', async () => {
  const scenario = await makeScenario(db())
  const second = await makeCall(db(), `${scenario.tag}b`, scenario, { month: '2027-08' })
  await db()('calls').update({ season_from: '2027-07-01', season_to: '2027-12-31' })
  const ctx = testContext(db(), scenario.office)
  const on = { telescopeId: scenario.telescopeId, version: 1, mayTakePromised: false }
  for (const evening of ['2027-10-01', '2027-10-02', '2027-10-03', '2027-10-04']) {
    const version = (await db()('calls').where({ id: scenario.callId }).first('version'))?.version ?? 0
    const other = (await db()('calls').where({ id: second.callId }).first('version'))?.version ?? 0
    const answers = await Promise.allSettled(
      [
        { slug: scenario.callSlug, version },
        { slug: second.callSlug, version: other },
      ].map((call) =>
        setNights(ctx, {
          ...on,
          ...call,
          from: evening,
          to: evening,
          parts: [{ from: 0, to: 1, useFor: 'science', instrumentId: null, note: '' }],
        }),
      ),
    )
    const refusals = answers.flatMap((answer) =>
      answer.status === 'rejected' ? [answer.reason as unknown] : [],
    )
    expect(refusals).toHaveLength(1)
    const [refusal] = refusals
    if (!(refusal instanceof Refusal)) throw refusal
    expect(refusal.fieldErrors.from).toMatch(/^Call \d+ offers Telescope .* already/)
    expect(await db()('night_blocks').where({ evening_date: evening })).toHaveLength(1)
  }
})
