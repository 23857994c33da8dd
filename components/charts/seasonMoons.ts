import type { SeasonMoon } from './seasonTypes'

const day = 86_400_000

/**
 * New and full Moons placed on the nights of a season. A phase belongs to the night whose local noon-to-noon day
 * holds it; its number is the day of the month of that instant in UTC.
 */
export function seasonMoons(
  phases: readonly { phase: string; at: Date }[],
  firstDate: string,
  nightCount: number,
  utcOffsetHours: number,
): SeasonMoon[] {
  const firstNoon = Date.parse(`${firstDate}T12:00:00Z`) - utcOffsetHours * 3_600_000
  return phases.flatMap(({ phase, at }) => {
    const night = Math.floor((at.getTime() - firstNoon) / day)
    const shown = (phase === 'new' || phase === 'full') && night >= 0 && night < nightCount
    return shown ? [{ night, kind: phase, day: at.getUTCDate() }] : []
  })
}
