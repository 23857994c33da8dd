import { crossings } from './crossings'
import { skyColour, skyKnotsDeg } from './skyColour'

export interface NightStop {
  hour: number
  colour: string
}

/**
 * The sky through one night as gradient stops where the Sun passes the altitudes at which its colour is given,
 * so that the gradient between two stops is exact. Hours are local, counted from midnight before the evening.
 */
export function nightStops(hours: readonly number[], sunAltitudesDeg: readonly number[]): NightStop[] {
  const lowest = Math.min(...sunAltitudesDeg)
  const lowestAt = hours[sunAltitudesDeg.indexOf(lowest)] ?? 24
  const evening: NightStop[] = []
  const morning: NightStop[] = []
  for (const knot of skyKnotsDeg) {
    const { down, up } = crossings(hours, sunAltitudesDeg, knot)
    if (down !== null) evening.push({ hour: down, colour: skyColour(knot) })
    if (up !== null) morning.unshift({ hour: up, colour: skyColour(knot) })
  }
  return [...evening, { hour: lowestAt, colour: skyColour(lowest) }, ...morning]
}
