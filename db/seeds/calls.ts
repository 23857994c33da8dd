import { nightAt } from '../../lib/science/sky/index.ts'
import type { Database } from '../client.ts'
import { callDates, type SeedCallDates } from './callDates.ts'
import { modes, site } from './facilityData.ts'

const criteria = [
  ['Worth of the question', 'Would the answer change what others do next?', 4],
  ['Will this answer it', 'Sample, method, and what could go wrong.', 3],
  ['Good use of this telescope', 'Hours, instrument, Moon; see the checks.', 2],
  ['Afterwards', 'Reduction, release and follow-up.', 1],
] as const

const kinds = [
  {
    kind: 'regular',
    title: 'Regular proposal',
    page_limit: 4,
    word_limit: 2000,
    abstract_limit: 1500,
    max_seconds: 120 * 3600,
    fee_minor: 18_000,
  },
  {
    kind: 'large',
    title: 'Large programme',
    page_limit: 8,
    word_limit: 4000,
    abstract_limit: 2000,
    max_seconds: 250 * 3600,
    fee_minor: 36_000,
  },
  {
    kind: 'thesis',
    title: 'Thesis proposal',
    page_limit: 4,
    word_limit: 2000,
    abstract_limit: 1500,
    max_seconds: 80 * 3600,
    fee_minor: 0,
    needs_student: 1,
  },
  {
    kind: 'opportunity',
    title: 'Target of opportunity',
    page_limit: 4,
    abstract_limit: 1500,
    max_seconds: 40 * 3600,
    fee_minor: 12_000,
    takes_awaited: 1,
  },
] as const

/** Kinds that the open call takes for the first time. */
const newKinds = [
  {
    kind: 'monitoring',
    title: 'Monitoring',
    page_limit: 3,
    word_limit: 1500,
    abstract_limit: 1500,
    max_seconds: 60 * 3600,
    fee_minor: 12_000,
    target_limit: 12,
    needs_cadence: 1,
  },
  {
    kind: 'discretion',
    title: 'Director’s discretion',
    page_limit: 2,
    word_limit: 800,
    figure_limit: 2,
    abstract_limit: 1000,
    max_seconds: 10 * 3600,
    fee_minor: 0,
    target_limit: 3,
    needs_last_night: 1,
  },
] as const

/** What cannot wait is taken after the others have closed, up to four days before assessments are due. */
const lateUntil = ({ assessments_due_at }: SeedCallDates) =>
  new Date(assessments_due_at.getTime() - 4 * 24 * 3_600_000)

export interface SeededCall {
  id: number
  number: number
  panelId: number
  kindIds: Map<string, number>
  dates: SeedCallDates
}

export interface Facility {
  siteId: number
  telescopeIds: Map<string, number>
  instrumentIds: Map<string, number>
  modeIds: Map<string, number>
}

/** Evenings from one date to another, both inclusive. */
function evenings(from: string, to: string): string[] {
  const list: string[] = []
  for (let t = Date.parse(from); t <= Date.parse(to); t += 86_400_000)
    list.push(new Date(t).toISOString().slice(0, 10))
  return list
}

/**
 * The night calendar: one night of the Aldous in eighteen and one of the Fennel in thirty is offered in the call; the
 * rest is promised to partners, and one bright night a month is kept for engineering.
 */
async function seedNights(
  db: Database,
  callId: number,
  facility: Facility,
  dates: SeedCallDates,
): Promise<void> {
  const place = {
    latitudeDeg: site.latitude_deg,
    longitudeDeg: site.longitude_deg,
    elevationM: site.elevation_m,
  }
  const rows = evenings(dates.season_from, dates.season_to).flatMap((evening_date, index) => {
    const night = nightAt(place, evening_date)
    const isEngineering = night.moonIllumination > 0.97 && index % 2 === 0
    const block = (telescope: string, isOffered: boolean) => ({
      call_id: callId,
      telescope_id: facility.telescopeIds.get(telescope) as number,
      evening_date,
      use_for: isEngineering ? 'engineering' : isOffered ? 'science' : 'promised',
      dark_seconds: Math.round(night.darkHours * 3600),
    })
    return [block('aldous', index % 18 === 1), block('fennel', index % 30 === 1)]
  })
  await db.batchInsert('night_blocks', rows as never, 200)
}

/** Members pay two thirds, partners five sixths; who sends late under an extension pays a sixth more of the full fee. */
async function seedRates(db: Database, callKindId: number, fullMinor: number): Promise<void> {
  const shares = { member: 4, partner: 5, other: 6 } as const
  for (const [name, sixths] of Object.entries(shares))
    await db('fee_rates').insert({
      call_kind_id: callKindId,
      affiliation_class: name as keyof typeof shares,
      amount_minor: (fullMinor * sixths) / 6,
      late_minor: fullMinor / 6,
    })
}

export async function seedCall(
  db: Database,
  facility: Facility,
  call: { number: number; dates: SeedCallDates; summary: string; isOpen?: true },
): Promise<SeededCall> {
  const [callId] = (await db('calls').insert({
    number: call.number,
    slug: `call-${call.number}`,
    title: `Call ${call.number}`,
    summary: call.summary,
    site_id: facility.siteId,
    stage: 'published',
    currency: 'EUR',
    ...call.dates,
  })) as [number]
  const [panelId] = (await db('panels').insert({ call_id: callId, name: 'Distant universe', quorum: 5 })) as [
    number,
  ]
  const kindIds = new Map<string, number>()
  for (const kind of call.isOpen ? [...kinds, ...newKinds] : kinds) {
    const closes_at = kind.kind === 'discretion' ? lateUntil(call.dates) : null
    const [id] = (await db('call_kinds').insert({
      ...kind,
      closes_at,
      call_id: callId,
      panel_id: panelId,
    })) as [number]
    kindIds.set(kind.kind, id)
    await seedRates(db, id, kind.fee_minor)
  }
  for (const [index, [title, prompt, weight]] of criteria.entries())
    await db('call_criteria').insert({ call_id: callId, position: index + 1, title, prompt, weight })
  for (const mode of modes)
    await db('call_modes').insert({ call_id: callId, mode_id: facility.modeIds.get(mode.slug) as number })
  await seedNights(db, callId, facility, call.dates)
  return { id: callId, number: call.number, panelId, kindIds, dates: call.dates }
}

/** One decided call, one in review, one open: dated around the day of the first start. */
export async function seedCalls(
  db: Database,
  facility: Facility,
  anchor: Date,
): Promise<{ decided: SeededCall; inReview: SeededCall; open: SeededCall }> {
  const dates = callDates(anchor)
  const summary =
    'Time on the Aldous 3.8 m with LANTERN, SPINDLE and EMBER, and on the Fennel 1.5 m with WICK, for targets at cosmological distances. Proposals are judged without names.'
  return {
    decided: await seedCall(db, facility, { number: 12, dates: dates.decided, summary }),
    inReview: await seedCall(db, facility, { number: 13, dates: dates.inReview, summary }),
    open: await seedCall(db, facility, { number: 14, dates: dates.open, summary, isOpen: true }),
  }
}
