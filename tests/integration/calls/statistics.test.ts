import { beforeEach, expect, it } from 'vitest'
import { readCallStatistics } from '@/lib/domain/statistics/readCallStatistics'
import { useRolledBackDatabase } from '../../support/database'
import { award } from '../../support/award'
import { makePanelCall, type PanelCall } from '../../support/panelCall'

// Seen to fail with the office's counts shown to everyone.

const db = useRolledBackDatabase()
let call: PanelCall
const as = (who: 'public' | 'office' | 'chair') =>
  readCallStatistics({ ...call.as(call.office), actor: who === 'public' ? null : call[who] }, call.callSlug)

beforeEach(async () => {
  call = await makePanelCall(db(), [20, 10])
})

it('says nothing before everything is made known', async () => {
  for (const who of ['public', 'office', 'chair'] as const) expect(await as(who)).toBeNull()
})

it('tells the office all of it, and nobody else a count below five', async () => {
  const [first, second] = call.proposals
  await award(db(), {
    proposalId: first?.id ?? 0,
    instrumentId: call.instrumentId,
    seconds: 36_000,
  })
  await db()('proposals')
    .where({ id: second?.id ?? 0 })
    .update({ state: 'declined' })
  await db()('calls').where({ id: call.callId }).update({ stage: 'decided' })
  const whole = await as('office')
  expect(whole?.counts.at(-1)).toMatchObject({ awarded: 1, reserve: 0, declined: 1, all: 2 })
  expect(whole?.hours[0]).toMatchObject({ askedSeconds: 108_000, givenSeconds: 36_000 })
  for (const who of ['public', 'chair'] as const) {
    const shown = await as(who)
    expect(shown?.isPublic).toBe(true)
    for (const row of shown?.counts ?? [])
      for (const value of [row.awarded, row.reserve, row.declined, row.all])
        expect([null, 0]).toContain(value)
    expect(shown?.hours[0]).toMatchObject({ askedSeconds: null, givenSeconds: null })
    expect(shown?.hours[0]?.offeredSeconds).toBe(whole?.hours[0]?.offeredSeconds)
  }
})
