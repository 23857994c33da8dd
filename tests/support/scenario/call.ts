import type { Database } from '@/db/client'
import { makeBilling } from './billing'
import type { ScenarioFacility } from './facility'

export interface ScenarioCallOptions {
  /** Null: a call without a fee. */
  currency?: string | null
  feeMinor?: number
  opensAt?: Date
  closesAt?: Date
  graceUntil?: Date
  /** Month of its nights, of 31 days; two calls of one telescope cannot have the same. */
  month?: string
  stage?: 'planned' | 'published' | 'review' | 'ranking' | 'decided' | 'archived'
}

export interface ScenarioCall {
  callId: number
  callNumber: number
  callSlug: string
  kindId: number
  panelId: number
  criterionIds: number[]
  closesAt: Date
  graceUntil: Date
}

const day = 24 * 3600_000
const inDays = (days: number) => new Date(Math.floor(Date.now() / 1000) * 1000 + days * day)

const criteria = [
  ['Science', 'What would be known that is not known now?', 50],
  ['Method', 'Does the plan answer the question?', 30],
  ['Use of time', 'Are the hours well spent?', 20],
] as const

/** An open call with one kind, one panel, three criteria and one month of nights. */
export async function makeCall(
  db: Database,
  tag: string,
  facility: ScenarioFacility,
  options: ScenarioCallOptions = {},
): Promise<ScenarioCall> {
  const last = await db('calls').max({ number: 'number' }).first()
  const callNumber = Number(last?.number ?? 100) + 1
  const callSlug = `call-${tag}`
  const month = options.month ?? '2027-07'
  const closesAt = options.closesAt ?? inDays(10)
  const graceUntil = options.graceUntil ?? new Date(closesAt.getTime() + 14 * day)
  const [callId = 0] = await db('calls').insert({
    number: callNumber,
    slug: callSlug,
    title: `Call ${callNumber}`,
    summary: 'One month of nights on one telescope.',
    site_id: facility.siteId,
    stage: options.stage ?? 'published',
    season_from: `${month}-01`,
    season_to: `${month}-31`,
    opens_at: options.opensAt ?? inDays(-10),
    closes_at: closesAt,
    grace_until: graceUntil,
    assessments_due_at: inDays(24),
    reviews_due_at: inDays(47),
    panel_meets_at: inDays(53),
    letters_at: inDays(67),
    currency: options.currency === undefined ? 'EUR' : options.currency,
  })
  await makeBilling(db)
  const [panelId = 0] = await db('panels').insert({
    call_id: callId,
    name: 'Galaxies and cosmology',
    quorum: 3,
  })
  const [kindId = 0] = await db('call_kinds').insert({
    call_id: callId,
    kind: 'regular',
    title: 'Regular',
    page_limit: 4,
    abstract_limit: 1500,
    max_seconds: 60 * 3600,
    fee_minor: options.feeMinor ?? 12_000,
    panel_id: panelId,
  })
  const criterionIds: number[] = []
  for (const [index, [title, prompt, weight]] of criteria.entries()) {
    const [id = 0] = await db('call_criteria').insert({
      call_id: callId,
      position: index + 1,
      title,
      prompt,
      weight,
    })
    criterionIds.push(id)
  }
  await db('call_modes').insert({ call_id: callId, mode_id: facility.modeId })
  for (let night = 1; night <= 31; night += 1)
    await db('night_blocks').insert({
      call_id: callId,
      telescope_id: facility.telescopeId,
      evening_date: `${month}-${String(night).padStart(2, '0')}`,
      use_for: 'science',
      dark_seconds: 39_600,
    })
  return { callId, callNumber, callSlug, kindId, panelId, criterionIds, closesAt, graceUntil }
}
