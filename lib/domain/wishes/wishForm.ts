import type { ServiceWish } from '../proposals/types'
import type { WishRow } from './schema'

/** A wish as its form shows it; null where nothing was said. */
export function wishRow(wish: Pick<ServiceWish, 'leastSeconds' | 'visit'> | null): WishRow {
  const { leastSeconds = null, visit = null } = wish ?? {}
  return {
    least: leastSeconds === null ? '' : String(Math.round((leastSeconds / 3600) * 1000) / 1000),
    service: visit ? 'visitor' : 'queue',
    nights: visit ? String(visit.nights) : '',
    part: visit?.part ?? 'whole',
    together: visit?.together ?? true,
  }
}
