import { expect, it } from 'vitest'
import { readFigures } from '@/lib/domain/figures/readFigures'
import { useRolledBackDatabase } from '../../support/database'
import { makePanelCall } from '../../support/panelCall'
import { refused } from '../../support/refused'

// Seen to fail: with withdrawn proposals counted, and with the people of a proposal counted in place of its lead.

const db = useRolledBackDatabase()

it('gives a call in figures, of what stands, with small counts of people held back', async () => {
  const call = await makePanelCall(db(), [40, 30, 20])
  const office = call.as(call.office)
  await db()('proposals').where({ id: call.proposals[2]?.id }).update({ state: 'withdrawn' })
  await db()('proposal_version_people').where({ role: 'co-investigator' }).update({ career_stage: 'student' })
  const figures = await readFigures(office, call.callSlug)

  expect(figures.calls[0]).toMatchObject({
    proposals: 2,
    askedSeconds: 70 * 3600,
    offeredSeconds: 31 * 39_600,
  })
  const own = figures.byTelescope.find(({ askedSeconds }) => askedSeconds > 0)
  expect(own?.askedSeconds).toBe(70 * 3600)
  expect(figures.byInstrument.reduce((sum, { askedSeconds }) => sum + askedSeconds, 0)).toBe(70 * 3600)
  for (const rows of [figures.byHalfMonth, figures.bySidereal, figures.byMoon]) {
    const asked = rows.reduce((sum, { askedSeconds }) => sum + askedSeconds, 0)
    expect(asked + figures.unservedSeconds).toBeCloseTo(70 * 3600, 3)
    const offered = rows.reduce((sum, { offeredSeconds }) => sum + (offeredSeconds ?? 0), 0)
    expect(offered).toBe(own?.offeredSeconds)
  }
  // All three arrived, whatever became of them.
  expect(figures.arrivals[0]?.points.at(-1)?.[1]).toBe(3)
  expect(figures.fees).toBeNull()
  expect(figures.leads).toEqual([{ name: 'Staff', count: null }])

  for (const actor of [call.chair, call.pi])
    expect((await refused(readFigures(call.as(actor), call.callSlug))).kind).toBe('forbidden')
})
