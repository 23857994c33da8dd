import { sharedAlmanac, type Almanac } from './almanac'
import { darkPart } from './darkPart'
import { createNightSky } from './nightSky'
import { createObserver } from './observer'
import type { Site } from './types'

export interface DarkSecondsInput {
  readonly site: Site
  /** Date of the evening, `2027-08-01`. */
  readonly date: string
  /** The part of the dark time that counts, fractions of it from 0 to 1; all of it unless given. */
  readonly from?: number
  readonly to?: number
  /** The Sun's altitude under which it counts as dark, degrees. */
  readonly twilightLimitDeg?: number
  readonly almanac?: Almanac
}

/** Dark time in a part of one night, whole seconds; 0 where it does not get dark. Good to half a minute. */
export function darkSeconds(input: DarkSecondsInput): number {
  const { site, date, from = 0, to = 1, twilightLimitDeg = -18, almanac = sharedAlmanac } = input
  const dark = createNightSky(createObserver(site, almanac), almanac, date).darkness(twilightLimitDeg)
  const days = darkPart(dark, from, to).reduce((sum, [start, end]) => sum + end - start, 0)
  return Math.round(days * 86_400)
}
