import { darkSeconds, type Site } from '@/lib/science/sky'
import { eveningsBetween } from './evenings'
import type { NightBlock } from './nightBlock'

/**
 * The night calendar of a new season after the pattern of an earlier one: the n-th night of a telescope is for what
 * the n-th was then, part for part, and its dark time is computed from the real sky.
 */
export function nightsLike(
  pattern: readonly NightBlock[],
  site: Site,
  from: string,
  to: string,
): NightBlock[] {
  const evenings = eveningsBetween(from, to)
  const telescopes = [...new Set(pattern.map((block) => block.telescopeId))]
  return telescopes.flatMap((telescopeId) => {
    const own = pattern.filter((block) => block.telescopeId === telescopeId)
    const nights = [...new Set(own.map((block) => block.eveningDate))].sort()
    return evenings.flatMap((eveningDate, index) => {
      const like = nights[index % nights.length]
      return own
        .filter((block) => block.eveningDate === like)
        .map((block) => ({
          ...block,
          eveningDate,
          darkSeconds: darkSeconds({ site, date: eveningDate, from: block.from, to: block.to }),
        }))
    })
  })
}
