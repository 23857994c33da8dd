import { beforeEach, describe, expect, it } from 'vitest'
import { databaseNow } from '@/db/queries/clock'
import type { Actor } from '@/lib/domain/actor'
import type { ActingContext } from '@/lib/domain/context'
import { listModes } from '@/lib/domain/calculations/listModes'
import { openCall } from '@/lib/domain/calls/openCall'
import { planCall } from '@/lib/domain/calls/planCall'
import { readCall } from '@/lib/domain/calls/readCall'
import { readOffer } from '@/lib/domain/calls/readOffer'
import { saveOffer } from '@/lib/domain/calls/saveOffer'
import { createInstrument } from '@/lib/domain/facility/createInstrument'
import { keepInService } from '@/lib/domain/facility/keepInService'
import { readCarriers } from '@/lib/domain/facility/readCarriers'
import { readModeRecord } from '@/lib/domain/facility/readModeRecord'
import { readOverview } from '@/lib/domain/facility/readOverview'
import { readRetirement } from '@/lib/domain/facility/readRetirement'
import { readTelescopes } from '@/lib/domain/facility/readTelescopes'
import { retire } from '@/lib/domain/facility/retire'
import type { FacilityKind } from '@/lib/domain/facility/types'
import { readContents } from '@/lib/domain/proposals/readContents'
import { readToolModes } from '@/lib/domain/tools/readToolModes'
import { testContext } from '../../support/context'
import { useRolledBackDatabase } from '../../support/database'
import { refused } from '../../support/refused'
import { makeScenario, type Scenario } from '../../support/scenario'
import { makeSecondMode } from '../../support/scenario/secondMode'

// Seen to fail with what an open call offers let go, with `before` not compared, with only the mode itself looked at,
// and with retired modes copied into a new call.

const db = useRolledBackDatabase()
let scenario: Scenario
let office: ActingContext
let today: string

const kinds: readonly FacilityKind[] = ['site', 'telescope', 'instrument', 'mode']
const as = (actor: Actor): ActingContext => ({ ...office, actor })
const own = (kind: string) => `${kind}-${scenario.tag}`
const retireOn = (kind: FacilityKind, retiredFrom: string, before: string | null = null, ctx = office) =>
  retire(ctx, { kind, slug: own(kind), before, retiredFrom })
const keep = (kind: FacilityKind, before: string | null, ctx = office) =>
  keepInService(ctx, { kind, slug: own(kind), before })
const listed = async () => (await listModes(office)).some(({ slug }) => slug === own('mode'))
/** Closes the call of the scenario, which offers its mode to 31 July 2027. */
const close = (stage: 'published' | 'review' = 'published') =>
  db()('calls')
    .where({ id: scenario.callId })
    .update({ closes_at: new Date(Date.now() - 60_000), stage })

beforeEach(async () => {
  scenario = await makeScenario(db())
  office = testContext(db(), scenario.office)
  today = (await databaseNow(db())).toISOString().slice(0, 10)
})

describe('retiring', () => {
  it.each(kinds)('a %s takes its modes out of calls and tools from that evening on', async (kind) => {
    await close()
    expect(await listed()).toBe(true)
    expect(await retireOn(kind, today)).toEqual({ retiredFrom: today })
    expect(await listed()).toBe(false)
    expect((await readToolModes(office))?.modes.map(({ slug }) => slug) ?? []).not.toContain(own('mode'))
    const entry = await db()('logbook').orderBy('id', 'desc').first()
    expect(entry).toMatchObject({
      action: 'facility.retire',
      subject_kind: kind,
      subject_id: own(kind),
      acting_as: 'office',
    })
    expect(JSON.parse(entry?.before_value ?? '{}')).toMatchObject({ retiredFrom: null })
    expect(JSON.parse(entry?.after_value ?? '{}')).toMatchObject({ retiredFrom: today })
    const overview = await readOverview(office)
    const shown = overview.instruments.flatMap(({ modes }) => modes.map(({ slug }) => slug))
    expect(shown).not.toContain(own('mode'))
    expect(overview.aside).toContainEqual(
      expect.objectContaining({ kind: 'mode', slug: own('mode'), retiredFrom: today }),
    )
    const isSeen = (await readTelescopes(office)).telescopes.some(({ slug }) => slug === own('telescope'))
    expect(isSeen).toBe(kind === 'instrument' || kind === 'mode')
  })

  it('leaves alone what cites it: the closed call, its proposals, and the record itself', async () => {
    await close()
    const before = await readContents(db(), scenario.reference)
    await retireOn('telescope', today)
    expect(await readContents(db(), scenario.reference)).toEqual(before)
    expect((await readCall(office, scenario.callSlug)).modes.map(({ slug }) => slug)).toEqual([own('mode')])
    const record = await readModeRecord(office, own('mode'))
    expect(record.newest.recordVersion).toBe(1)
    expect(record.retiredFrom).toBe(today)
    expect(await readRetirement(office, 'telescope', own('telescope'))).toMatchObject({
      retiredFrom: today,
      goesWithCarrier: null,
      modeCount: 1,
      instruments: [`INSTRUMENT ${scenario.tag}`],
      offers: [{ number: scenario.callNumber, isOpen: false, modes: ['Red, 1.0″ slit'] }],
    })
    expect(await readRetirement(office, 'mode', own('mode'))).toMatchObject({
      retiredFrom: null,
      goesWithCarrier: today,
    })
  })

  it('changes nothing until the evening comes', async () => {
    await close()
    await retireOn('mode', '2098-01-01')
    expect(await listed()).toBe(true)
    const { instruments, aside } = await readOverview(office)
    const modes = instruments.find(({ slug }) => slug === own('instrument'))?.modes
    expect(modes?.map(({ slug, retiredFrom }) => [slug, retiredFrom])).toEqual([[own('mode'), '2098-01-01']])
    expect(aside.filter(({ slug }) => slug === own('mode'))).toEqual([])
  })

  it.each(kinds)('a %s waits for what an open call offers to the end of its season', async (kind) => {
    const { season_to: seasonTo } = (await db()('calls').where({ id: scenario.callId }).first()) ?? {}
    const refusal = await refused(retireOn(kind, seasonTo ?? ''))
    expect(refusal.fieldErrors.retiredFrom).toMatch(
      new RegExp(`^Call ${scenario.callNumber} offers Red, 1.0″ slit to .*: take that off its offer first`),
    )
    const after = new Date(Date.parse(seasonTo ?? '') + 86_400_000).toISOString().slice(0, 10)
    expect(await retireOn(kind, after)).toEqual({ retiredFrom: after })
  })

  it('does not begin in the past', async () => {
    await close()
    const yesterday = new Date(Date.parse(today) - 86_400_000).toISOString().slice(0, 10)
    expect((await refused(retireOn('mode', yesterday))).fieldErrors).toEqual({
      retiredFrom: 'Something retires today or later.',
    })
  })

  it('is not written over unseen', async () => {
    await close()
    await retireOn('mode', '2098-01-01')
    const refusal = await refused(retireOn('mode', '2098-06-01'))
    expect(refusal.stale).toMatchObject({
      changedBy: scenario.office.name,
      theirs: { retiredFrom: '2098-01-01' },
    })
    expect((await refused(keep('mode', null))).kind).toBe('stale')
    expect(await retireOn('mode', '2098-06-01', '2098-01-01')).toEqual({ retiredFrom: '2098-06-01' })
    expect(await db()('facility_retirements').where({ mode_id: scenario.modeId })).toHaveLength(1)
  })

  it('can be taken back', async () => {
    await close()
    expect((await refused(keep('mode', null))).message).toBe('Red, 1.0″ slit does not retire.')
    await retireOn('mode', today)
    await keep('mode', today)
    expect(await listed()).toBe(true)
    const entry = await db()('logbook').orderBy('id', 'desc').first()
    expect(entry).toMatchObject({ action: 'facility.keep', subject_kind: 'mode', subject_id: own('mode') })
  })

  it('is the office’s alone', async () => {
    await close()
    for (const actor of [scenario.pi, scenario.scientist, scenario.chair]) {
      for (const kind of kinds) {
        expect((await refused(retireOn(kind, today, null, as(actor)))).kind).toBe('forbidden')
        expect((await refused(keep(kind, null, as(actor)))).kind).toBe('forbidden')
        expect((await refused(readRetirement(as(actor), kind, own(kind)))).kind).toBe('forbidden')
      }
    }
    expect(await listed()).toBe(true)
  })
})

describe('what is retired', () => {
  it('is not put on offer, nor taken over into a new call, which does not open with nothing to offer', async () => {
    const other = await makeSecondMode(db(), scenario)
    const offers = async () => (await readOffer(office, scenario.callSlug)).map(({ id }) => id)
    expect(await offers()).toEqual([scenario.modeId, other])
    await retire(office, {
      kind: 'mode',
      slug: `second-${scenario.tag}`,
      before: null,
      retiredFrom: '2027-07-20',
    })
    expect(await offers()).toEqual([scenario.modeId])
    const input = { slug: scenario.callSlug, before: [scenario.modeId], modeIds: [scenario.modeId, other] }
    expect((await refused(saveOffer(office, input))).message).toBe(
      'One of these modes is not at the site of the call, or is retired.',
    )

    await close('review')
    await retireOn('instrument', today)
    const day = (days: number) => new Date(Date.now() + days * 86_400_000)
    const { slug } = await planCall(office, {
      from: scenario.callSlug,
      seasonFrom: '2028-07-01',
      seasonTo: '2028-12-31',
      opensAt: day(10),
      closesAt: day(40),
      graceUntil: day(40),
      assessmentsDueAt: day(50),
      reviewsDueAt: day(60),
      panelMeetsAt: day(70),
      lettersAt: day(80),
    })
    expect((await readCall(office, slug)).modes).toEqual([])
    const { version } = (await db()('calls').where({ slug }).first('version')) ?? { version: 0 }
    expect((await refused(openCall(office, { slug, version }))).message).toBe(
      'It offers no mode to observe with yet. Say first what is on offer.',
    )
  })

  it('carries nothing new', async () => {
    await close()
    await retireOn('site', today)
    const { carriers } = await readCarriers(office, 'telescope')
    expect(carriers.map(({ slug }) => slug)).not.toContain(own('telescope'))
    const input = { name: 'NEW', slug: `new-${scenario.tag}`, of: own('telescope'), summary: 'an imager' }
    expect((await refused(createInstrument(office, input))).fieldErrors).toEqual({
      of: `Telescope ${scenario.tag} is retired.`,
    })
  })
})
