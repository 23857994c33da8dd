import type { StandingHalf } from '@/db/queries/visits'
import { halvesOf, type DarkSpans } from './nightHalves'
import type { NightHalf } from './types'

/** Halves of nights as they are kept, with their moments by the season's own darkness. */
export function datedHalves(kept: readonly StandingHalf[], dark: DarkSpans): NightHalf[] {
  return kept.flatMap(({ telescopeId: telescope, date, half, seconds }) => {
    const span = dark.get(date)
    const stretch = span && halvesOf(span)[half === 'first' ? 0 : 1]
    return stretch ? [{ telescope, date, half, from: stretch[0], to: stretch[1], seconds }] : []
  })
}
