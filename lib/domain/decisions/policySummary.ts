import { z } from 'zod'
import type { BinnedPlan } from '@/lib/panel/nights/binTypes'
import { nightsPolicy, type NightsPolicy } from './policyWords'

/** What a policy comes to: proposals given time, seconds given, and merit times hours above the line. */
export const policySummary = z.object({
  policy: nightsPolicy,
  awarded: z.number(),
  seconds: z.number(),
  meritHours: z.number(),
  /** How far from what no plan can exceed, as a share; null where the rule is met exactly. */
  gap: z.number().nullable(),
  /** Why there is no plan, where there is none. */
  why: z.string().nullable(),
})
export type PolicySummary = z.output<typeof policySummary>

export function summaryOf(
  policy: NightsPolicy,
  plan: BinnedPlan | null,
  found: {
    above: ReadonlySet<number>
    merit: ReadonlyMap<number, number>
    gap: number | null
    why: string | null
  },
): PolicySummary {
  const given = plan?.given ?? []
  return {
    policy,
    awarded: new Set(given.map(({ proposal }) => proposal)).size,
    seconds: given.reduce((sum, { seconds }) => sum + seconds, 0),
    meritHours: given
      .filter(({ proposal }) => found.above.has(proposal))
      .reduce((sum, { proposal, seconds }) => sum + ((found.merit.get(proposal) ?? 0) * seconds) / 3600, 0),
    gap: plan ? found.gap : null,
    why: plan ? null : found.why,
  }
}
