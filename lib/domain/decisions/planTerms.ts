import { heldTime, standingChoices } from '@/db/queries/nightTerms'
import type { Database } from '@/db/client'
import { keptShares } from '@/lib/panel/nights/allowFor'
import type { Call } from '../calls/types'
import type { CallBins } from '../nights/callBins'
import { seasonWeather, type SeasonWeather } from '../nights/seasonWeather'
import type { NightChoice } from './choiceWords'
import type { Trial } from './trialSchema'

export interface TelescopeTerms {
  /** Share of its dark time that is on offer; 1 but in a trial. */
  offered: number
  heldSeconds: number
  heldReason: string
  /** Share of its time on offer that is held back. */
  heldShare: number
}

/** What a division is made under: as it stands, or as tried. */
export interface PlanTerms {
  choices: Map<number, { choice: NightChoice; reason: string }>
  byTelescope: Map<number, TelescopeTerms>
  weather: SeasonWeather
  /** Share of each bin that may be planned with. */
  kept: number[]
}

/** The terms of a call for some proposals, with what is tried put over them. */
export async function planTerms(
  db: Database,
  call: Call,
  season: CallBins,
  { proposalIds, trial }: { proposalIds: readonly number[]; trial: Trial | undefined },
): Promise<PlanTerms> {
  const [choices, held] = await Promise.all([standingChoices(db, proposalIds), heldTime(db, call.id)])
  for (const [id, choice] of Object.entries(trial?.choices ?? {})) {
    const proposal = Number(id)
    if (choice === 'rank' || !proposalIds.includes(proposal)) choices.delete(proposal)
    else if (choices.get(proposal)?.choice !== choice) choices.set(proposal, { choice, reason: '' })
  }
  const byTelescope = new Map<number, TelescopeTerms>()
  for (const id of new Set(season.bins.map(({ telescope }) => telescope))) {
    const dark = season.bins.reduce((sum, bin) => sum + (bin.telescope === id ? bin.seconds : 0), 0)
    const offered = (trial?.offeredPercent?.[id] ?? 100) / 100
    const tried = trial?.heldHours?.[id]
    const heldSeconds = tried === undefined ? (held.get(id)?.seconds ?? 0) : Math.round(tried * 3600)
    const heldShare = heldSeconds > 0 ? Math.min(1, heldSeconds / (dark * offered)) : 0
    byTelescope.set(id, {
      offered,
      heldSeconds,
      heldReason: tried === undefined ? (held.get(id)?.reason ?? '') : '',
      heldShare,
    })
  }
  const evenShare = trial?.lostPercent === undefined ? null : trial.lostPercent / 100
  const weather = seasonWeather(season.weather, { from: call.seasonFrom, to: call.seasonTo }, evenShare)
  const heldShare = new Map([...byTelescope].map(([id, terms]) => [id, terms.heldShare]))
  const kept = keptShares(season.bins, { lostByHalf: weather.lostByHalf, heldShare }).map(
    (share, at) => share * (byTelescope.get(season.bins[at]?.telescope ?? 0)?.offered ?? 1),
  )
  return { choices, byTelescope, weather, kept }
}
