import { z } from 'zod'

/** How nights may be divided. */
export const nightsPolicy = z.enum(['rank', 'merit'])
export type NightsPolicy = z.output<typeof nightsPolicy>

export const policyNames: Readonly<Record<NightsPolicy, string>> = {
  rank: 'By rank, then fill',
  merit: 'Most merit above the line',
}
