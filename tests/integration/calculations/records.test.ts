import { beforeEach, describe, expect, it } from 'vitest'
import { modesAnswer } from '@/lib/domain/calculations/answers'
import { computeExposure } from '@/lib/domain/calculations/computeExposure'
import { exposureRequest } from '@/lib/domain/calculations/exposureSchema'
import { listModes } from '@/lib/domain/calculations/listModes'
import type { Context } from '@/lib/domain/context'
import { describeAvailability } from '@/lib/domain/observability/describeAvailability'
import { findObservability } from '@/lib/domain/observability/findObservability'
import { readAsked } from '@/lib/domain/observability/readAsked'
import { testContext } from '../../support/context'
import { useRolledBackDatabase } from '../../support/database'
import { refused } from '../../support/refused'
import { makeScenario, type Scenario } from '../../support/scenario'

const db = useRolledBackDatabase()
let scenario: Scenario
let ctx: Context

beforeEach(async () => {
  scenario = await makeScenario(db())
  ctx = testContext(db(), null)
})

describe('the modes of the observatory', () => {
  it('are listed as described, to anyone', async () => {
    const found = JSON.parse(JSON.stringify({ modes: await listModes(ctx) })) as unknown
    expect(modesAnswer.parse(found)).toEqual(found)
    expect(found).toMatchObject({
      modes: expect.arrayContaining([
        expect.objectContaining({ id: scenario.modeId, slug: `mode-${scenario.tag}` }),
      ]),
    })
  })
})

describe('an exposure with a mode', () => {
  const expose = (mode: string | number) =>
    computeExposure(
      ctx,
      exposureRequest.parse({
        mode,
        source: { kind: 'magnitude', ab: 20 },
        conditions: { airmass: 1.2, seeingArcsec: 0.9, moon: 'dark' },
        solve: 'snr',
        timeS: 1800,
      }),
    )

  it('is the same by its id and its slug, and names the records', async () => {
    const found = await expose(scenario.modeId)
    expect(await expose(`mode-${scenario.tag}`)).toEqual(found)
    expect(found).toMatchObject({
      mode: { id: scenario.modeId, name: 'Red, 1.0″ slit' },
      records: { site: 1, telescope: 1, mode: 1 },
    })
  })

  it('uses the record in force today, not one that is to come', async () => {
    const before = await expose(scenario.modeId)
    const row = await db()('site_records').where({ site_id: scenario.siteId }).first()
    if (!row) return expect.fail('the site has no record')
    const { id: _, ...record } = row
    const dark = JSON.parse(record.dark_sky_mag_arcsec2) as Record<string, number>
    const brighter = Object.fromEntries(Object.entries(dark).map(([band, sky]) => [band, sky - 3]))
    const next = { ...record, record_version: 2, dark_sky_mag_arcsec2: JSON.stringify(brighter) }
    await db()('site_records').insert({ ...next, valid_from: '2999-01-01' })
    expect(await expose(scenario.modeId)).toEqual(before)
    await db()('site_records')
      .where({ site_id: scenario.siteId, record_version: 2 })
      .update({ valid_from: '2020-01-02' })
    const after = await expose(scenario.modeId)
    expect(after.records.site).toBe(2)
    expect(after.snr).toBeLessThan(before.snr)
  })

  it.each(['nowhere', '__proto__', 4_000_000])('is refused for the mode %s', async (mode) => {
    expect(Object.keys((await refused(expose(mode))).fieldErrors)).toEqual(['mode'])
  })
})

describe('observability', () => {
  const find = (query: string) =>
    findObservability(
      ctx,
      readAsked(new URLSearchParams(`FACILITY=telescope-${scenario.tag}&POS=52,-27.8&${query}`)),
    )

  it('is found for a telescope or for all of a site', async () => {
    const found = await find('TIME=61430/61440')
    expect(found.rows.length).toBeGreaterThan(8)
    expect(new Set(found.rows.map(({ facility }) => facility))).toEqual(
      new Set([`Telescope ${scenario.tag}`]),
    )
    const [second = 0] = await db()('telescopes').insert({
      site_id: scenario.siteId,
      slug: `b-${scenario.tag}`,
      name: `B ${scenario.tag}`,
    })
    await db()('telescope_records').insert({
      ...{ telescope_id: second, record_version: 1, valid_from: '2020-01-01' },
      ...{ aperture_m: 3.8, collecting_area_m2: 10.2, highest_altitude_deg: null },
    })
    const both = await findObservability(
      ctx,
      readAsked(new URLSearchParams(`POS=52,-27.8&TIME=61430/61440&FACILITY=observatory ${scenario.tag}`)),
    )
    expect(both.rows).toHaveLength(2 * found.rows.length)
    const starts = both.rows.map(({ startMjd }) => startMjd)
    expect(starts).toEqual(starts.toSorted((a, b) => a - b))
    const elsewhere = readAsked(new URLSearchParams('POS=1,2&FACILITY=nowhere'))
    expect((await refused(findObservability(ctx, elsewhere))).fieldErrors).toHaveProperty('FACILITY')
  })

  it('is cut at MAXREC, told as an overflow only when something was left out', async () => {
    const whole = await find('TIME=61430/61440')
    const count = whole.rows.length
    expect(whole.isOverflow).toBe(false)
    expect(await find(`TIME=61430/61440&MAXREC=${count}`)).toMatchObject({ isOverflow: false })
    const cut = await find(`TIME=61430/61440&MAXREC=${count - 1}`)
    expect(cut.isOverflow).toBe(true)
    expect(cut.rows).toEqual(whole.rows.slice(0, -1))
    expect(await find('TIME=61430/61440&MAXREC=0')).toMatchObject({ rows: [], isOverflow: true })
  })

  it('leaves out windows shorter than MIN_OBS', async () => {
    const seconds = (await find('TIME=61430/61440')).rows.map(
      ({ startMjd, stopMjd }) => (stopMjd - startMjd) * 86_400,
    )
    const longest = Math.max(...seconds)
    expect((await find(`TIME=61430/61440&MIN_OBS=${(longest - 0.001).toFixed(6)}`)).rows).toHaveLength(1)
    expect((await find(`TIME=61430/61440&MIN_OBS=${(longest + 0.001).toFixed(6)}`)).rows).toEqual([])
  })

  it('begins now and ends a year on when left open, and looks through 400 days at most', async () => {
    const open = await find('MAXREC=1')
    expect(Math.abs(open.fromMjd - (Date.now() / 86_400_000 + 40_587))).toBeLessThan(1)
    expect(open.toMjd - open.fromMjd).toBe(365)
    expect(await find('TIME=61430/70000&MAXREC=1')).toMatchObject({ toMjd: 61_830, isCutShort: true })
    expect((await refused(find('TIME=/50000'))).fieldErrors).toHaveProperty('TIME')
  })

  it('is available while the database answers', async () => {
    expect(await describeAvailability(ctx)).toContain('<vosi:available>true</vosi:available>')
    const down = {
      ...ctx,
      db: Object.assign(() => null, { raw: () => Promise.reject(new Error('down')) }) as never,
    }
    const told = await describeAvailability(down)
    expect(told).toContain('<vosi:available>false</vosi:available><vosi:note>')
  })
})
