import { seededUniform } from '../random'
import { wilsonInterval } from '../statistics/wilsonInterval'
import { lostNights } from './lostNights'
import { SeasonRunner } from './seasonRunner'
import type { AwardOutlook, SeasonPlan } from './seasonTypes'

/** An award that lacks less than this is observed in full. */
const withinSeconds = 1

/** The value below which a share of sorted values lies: the nearest rank. */
const quantile = (sorted: Float64Array, share: number): number =>
  sorted[Math.min(sorted.length - 1, Math.max(0, Math.ceil(share * sorted.length) - 1))] ?? 0

/**
 * What becomes of each award over seasons of weather drawn from a seed: the same seed, the same answer. `onSeason`, told
 * how many are done, is called a hundred times at most.
 */
export function simulateSeasons(
  plan: SeasonPlan,
  { seed, seasons }: { seed: number; seasons: number },
  onSeason?: (done: number) => void,
): AwardOutlook[] {
  const uniform = seededUniform(seed)
  const runner = new SeasonRunner(plan)
  const observed = plan.awards.map(() => new Float64Array(seasons))
  const every = Math.ceil(seasons / 100)
  for (let season = 0; season < seasons; season += 1) {
    const seconds = runner.run(lostNights(plan.lost, plan.persistence, uniform))
    observed.forEach((own, award) => (own[season] = seconds[award] ?? 0))
    if ((season + 1) % every === 0) onSeason?.(season + 1)
  }
  return plan.awards.map(({ proposal, instrument, parts }, award): AwardOutlook => {
    const sorted = (observed[award] as Float64Array).sort()
    const whole = parts.reduce((sum, part) => sum + part.seconds, 0)
    const full = sorted.filter((seconds) => seconds > whole - withinSeconds).length
    return {
      proposal,
      instrument,
      chance: seasons > 0 ? full / seasons : 0,
      ...wilsonInterval(full, seasons),
      seconds10: quantile(sorted, 0.1),
      seconds50: quantile(sorted, 0.5),
      seconds90: quantile(sorted, 0.9),
    }
  })
}
