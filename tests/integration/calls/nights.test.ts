import { beforeEach, describe, expect, it } from 'vitest'
import { importNights } from '@/lib/domain/calendar/importNights'
import { readCalendar } from '@/lib/domain/calendar/readCalendar'
import { calendarCsv } from '@/lib/domain/calendar/calendarFileView'
import { setNights } from '@/lib/domain/calendar/setNights'
import type { NightPart } from '@/lib/domain/calendar/types'
import type { ActingContext } from '@/lib/domain/context'
import { testContext } from '../../support/context'
import { useRolledBackDatabase } from '../../support/database'
import { memoryStore } from '../../support/memoryStore'
import { refused } from '../../support/refused'
import { makeScenario, type Scenario } from '../../support/scenario'
import { makeCall } from '../../support/scenario/call'
import { sendIn } from '../../support/sendIn'

// Seen to fail: with awarded time left out of the guard, and with nights outside the stretch cleared.

const db = useRolledBackDatabase()
let scenario: Scenario
let office: ActingContext

beforeEach(async () => {
  const storage = memoryStore()
  scenario = await makeScenario(db(), { storage, currency: null })
  office = testContext(db(), scenario.office, { storage })
})

const whole: NightPart = { from: 0, to: 1, useFor: 'science', instrumentId: null, note: '' }
const version = async () =>
  (await db()('calls').where({ id: scenario.callId }).first('version'))?.version ?? 0
const telescope = async () => {
  const { telescopes } = await readCalendar(office, scenario.callSlug)
  const own = telescopes.find(({ id }) => id === scenario.telescopeId)
  if (!own) throw new Error('no telescope')
  return own
}

async function set(
  from: string,
  to: string,
  parts: NightPart[],
  over: { mayTakePromised?: boolean } = {},
  ctx = office,
) {
  await setNights(ctx, {
    slug: scenario.callSlug,
    version: await version(),
    telescopeId: scenario.telescopeId,
    from,
    to,
    parts,
    mayTakePromised: false,
    ...over,
  })
}

describe('setting nights', () => {
  it('divides a stretch of them, with hours from the real darkness', async () => {
    await set('2027-07-10', '2027-07-12', [
      { ...whole, to: 0.25, instrumentId: scenario.instrumentId },
      { ...whole, from: 0.25, useFor: 'promised', note: 'partners' },
    ])
    const { nights, halves, total } = await telescope()
    const of = (date: string) => nights.find((night) => night.date === date)
    expect(of('2027-07-09')?.parts).toMatchObject([{ from: 0, to: 1, darkSeconds: 39_600 }])
    expect(of('2027-07-13')?.parts).toMatchObject([{ from: 0, to: 1, darkSeconds: 39_600 }])
    const eleventh = of('2027-07-11')
    expect(eleventh?.parts).toMatchObject([
      { to: 0.25, instrumentId: scenario.instrumentId, useFor: 'science' },
      { from: 0.25, useFor: 'promised', note: 'partners' },
    ])
    const [first, second] = eleventh?.parts ?? []
    expect((first?.darkSeconds ?? 0) / (eleventh?.darkSeconds ?? 1)).toBeCloseTo(0.25, 3)
    expect((first?.darkSeconds ?? 0) + (second?.darkSeconds ?? 0)).toBeCloseTo(eleventh?.darkSeconds ?? 0, -1)
    expect(halves.map(({ from, to }) => [from, to])).toEqual([
      ['2027-07-01', '2027-07-15'],
      ['2027-07-16', '2027-07-31'],
    ])
    expect(total.boundSeconds).toBeGreaterThan(0)
    const entry = await db()('logbook').where({ action: 'call.nights' }).first()
    expect(JSON.parse(entry?.before_value ?? '')).toMatchObject({ scienceHours: 33, promisedHours: 0 })
    expect(JSON.parse(entry?.after_value ?? '')).toMatchObject({ from: '2027-07-10', to: '2027-07-12' })
  })

  it('refuses overlaps, strange instruments, and nights that are not of the call', async () => {
    const overlap = set('2027-07-10', '2027-07-10', [whole, { ...whole, from: 0.5, useFor: 'engineering' }])
    expect((await refused(overlap)).message).toMatch(/Two parts of a night overlap/)
    const strange = set('2027-07-10', '2027-07-10', [{ ...whole, instrumentId: 999_999 }])
    expect((await refused(strange)).message).toMatch(/not on this telescope/)
    expect((await refused(set('2027-06-30', '2027-07-02', [whole]))).fieldErrors.from).toMatch(
      /run from 1 July 2027/,
    )
    expect((await refused(set('2027-07-30', '2027-08-01', [whole]))).fieldErrors.to).toMatch(
      /to 31 July 2027/,
    )
    expect((await refused(set('2027-07-12', '2027-07-10', [whole]))).fieldErrors.to).toMatch(
      /before the first/,
    )
  })

  it('takes promised time only when those it was promised to agree', async () => {
    await set('2027-07-10', '2027-07-10', [{ ...whole, useFor: 'promised' }])
    const refusal = await refused(set('2027-07-10', '2027-07-10', [whole]))
    expect(refusal.fieldErrors.mayTakePromised).toMatch(/takes 11\.\d.h of .* from time that is promised/)
    await set('2027-07-10', '2027-07-10', [whole], { mayTakePromised: true })
    expect((await telescope()).total.promisedSeconds).toBe(0)
  })

  it('never leaves less for science than is awarded', async () => {
    await sendIn(testContext(db(), scenario.pi, { storage: office.storage }), scenario.reference)
    await db()('proposals').where({ id: scenario.proposalId }).update({ state: 'awarded' })
    const [decision_id = 0] = await db()('decisions').insert({
      proposal_id: scenario.proposalId,
      decision_version: 1,
      outcome: 'awarded',
      statement: 'Awarded as asked.',
    })
    await db()('award_lines').insert({
      decision_id,
      instrument_id: scenario.instrumentId,
      seconds: 30 * 39_600,
    })
    await set('2027-07-10', '2027-07-10', [{ ...whole, useFor: 'engineering' }])
    expect((await telescope()).awardedSeconds).toBe(30 * 39_600)
    const refusal = await refused(set('2027-07-11', '2027-07-11', [{ ...whole, useFor: 'engineering' }]))
    expect(refusal.message).toMatch(/would offer 319\.0.h for science, and 330\.0.h are awarded/)
  })

  it('is the office’s alone, and ends when the call is archived', async () => {
    expect(
      (await refused(set('2027-07-10', '2027-07-10', [whole], {}, testContext(db(), scenario.chair)))).kind,
    ).toBe('forbidden')
    expect((await refused(readCalendar(testContext(db(), scenario.pi), scenario.callSlug))).kind).toBe(
      'forbidden',
    )
    await db()('calls').where({ id: scenario.callId }).update({ stage: 'archived' })
    expect((await refused(set('2027-07-10', '2027-07-10', [whole]))).message).toMatch(/archived/)
  })
})

describe('nights from a file', () => {
  const take = async (text: string, mayTakePromised = false) =>
    importNights(office, { slug: scenario.callSlug, version: await version(), text, mayTakePromised })

  it('may not overlap themselves, in whatever order', async () => {
    const { name } = await telescope()
    const lines = [`${name},2027-07-20,0.4,1,engineering`, `${name},2027-07-20,0,0.5,science`]
    for (const ordered of [lines, lines.toReversed()]) {
      const refusal = await refused(take(['telescope,evening,from,to,use', ...ordered].join('\n')))
      expect(refusal.fieldErrors.text).toMatch(/^Nothing was taken\. Line 3: Two parts of a night overlap/)
    }
    expect((await telescope()).nights.every(({ parts }) => parts.length === 1)).toBe(true)
  })

  it('become what it says; others stay; written out and taken back they are the same', async () => {
    const name = (await telescope()).name
    const head = 'telescope,evening,from,to,use'
    expect(
      await take(`${head}\n${name},2027-07-20,0,0.5,engineering\n${name},2027-07-21,0,1,none\n`),
    ).toEqual({ nights: 2 })
    const before = await telescope()
    expect(before.nights.filter(({ parts }) => parts.length === 0).map(({ date }) => date)).toEqual([
      '2027-07-21',
    ])
    expect(before.total.engineeringSeconds).toBeGreaterThan(0)
    expect(await take(calendarCsv([before]))).toEqual({ nights: 31 })
    const after = await telescope()
    const parts = ({ nights }: typeof after) =>
      nights.map((night) => night.parts.map(({ darkSeconds: _, ...part }) => part))
    expect(parts(after)).toEqual(parts(before))
  })

  it('are taken all or not at all', async () => {
    const { name } = await telescope()
    const refusal = await refused(
      take(`telescope,evening,from,to,use\n${name},2027-07-20,0,1,none\n${name},2027-09-20,0,1,none`),
    )
    expect(refusal.fieldErrors.text).toMatch(/^Nothing was taken. Line 3: 2027-09-20 is no night/)
    expect((await telescope()).nights.every(({ parts }) => parts.length === 1)).toBe(true)
  })
})

// Seen to fail: without the look at other calls, and with a call that kept what it had given up.
describe('a night that another call offers', () => {
  const offered = /^Call \d+ offers Telescope .* on the night of 10 July 2027 already\. /

  /** A later call of the same telescope, over a season that contains July, with no nights in July of its own. */
  async function later() {
    const { callId, callSlug } = await makeCall(db(), `${scenario.tag}b`, scenario, { month: '2027-08' })
    await db()('calls').where({ id: callId }).update({ season_from: '2027-07-01' })
    const setTo = async (parts: NightPart[], evening = '2027-07-10') => {
      const row = await db()('calls').where({ id: callId }).first('version')
      const on = { slug: callSlug, version: row?.version ?? 0, telescopeId: scenario.telescopeId }
      await setNights(office, { ...on, from: evening, to: evening, parts, mayTakePromised: false })
    }
    return { callId, callSlug, setTo }
  }

  it('is refused where it is set, and free once that call gives it up', async () => {
    const { callId, setTo } = await later()
    const refusal = await refused(setTo([whole]))
    expect(refusal.fieldErrors.from).toMatch(offered)
    expect(refusal.fieldErrors.from).toContain(`Call ${scenario.callNumber} `)
    const july = () => db()('night_blocks').where({ call_id: callId, evening_date: '2027-07-10' })
    expect(await july()).toEqual([])
    await setTo([{ ...whole, useFor: 'engineering' }])
    await setTo([])

    await set('2027-07-10', '2027-07-10', [{ ...whole, to: 0.5 }])
    expect((await refused(setTo([whole]))).fieldErrors.from).toMatch(offered)
    await setTo([{ ...whole, from: 0.5 }])
    expect((await refused(set('2027-07-10', '2027-07-10', [whole]))).fieldErrors.from).toMatch(/already/)
    await set('2027-07-10', '2027-07-10', [])
    await setTo([whole])
    expect(await july()).toMatchObject([{ use_for: 'science', fraction_to: '1.000' }])
  })

  it('is refused in a file, all of it, and shown in the calendar', async () => {
    const { callId, callSlug } = await later()
    const { name } = await telescope()
    const row = await db()('calls').where({ id: callId }).first('version')
    const text = `telescope,evening,from,to,use\n${name},2027-08-02,0,1,none\n${name},2027-07-10,0,1,science`
    const on = { slug: callSlug, version: row?.version ?? 0, mayTakePromised: false }
    const refusal = await refused(importNights(office, { ...on, text }))
    expect(refusal.fieldErrors.text).toMatch(/^Nothing was taken\. Call \d+ offers .* 10 July 2027 already/)
    expect(await db()('night_blocks').where({ call_id: callId, evening_date: '2027-08-02' })).toHaveLength(1)
    const { telescopes } = await readCalendar(office, callSlug)
    const { elsewhere } = telescopes.find(({ id }) => id === scenario.telescopeId) ?? expect.fail('none')
    expect(elsewhere).toHaveLength(31)
    expect(elsewhere[0]).toEqual({
      eveningDate: '2027-07-01',
      from: 0,
      to: 1,
      callNumber: scenario.callNumber,
    })
  })
})
