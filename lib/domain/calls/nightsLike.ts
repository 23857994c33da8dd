import type { NightBlock } from '@/db/queries/callChanges'
import { nightAt, type Site } from '@/lib/science/sky'

/**
 * The night calendar of a new season after the pattern of an earlier one: the n-th night of a telescope is for what
 * the n-th was then, and its dark time is computed from the real sky.
 */
export function nightsLike(
  pattern: readonly NightBlock[],
  site: Site,
  from: string,
  to: string,
): NightBlock[] {
  const dark = new Map<string, number>()
  for (let t = Date.parse(from); t <= Date.parse(to); t += 86_400_000) {
    const date = new Date(t).toISOString().slice(0, 10)
    dark.set(date, Math.round(nightAt(site, date).darkHours * 3600))
  }
  const telescopes = [...new Set(pattern.map((block) => block.telescopeId))]
  return telescopes.flatMap((telescopeId) => {
    const own = pattern.filter((block) => block.telescopeId === telescopeId)
    return [...dark].flatMap(([eveningDate, darkSeconds], index) => {
      const model = own[index % own.length]
      return model ? [{ ...model, eveningDate, darkSeconds }] : []
    })
  })
}
