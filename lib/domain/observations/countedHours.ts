import { formatNumber } from '@/lib/format'

/** Hours asked for a target as they count: '2.0', for each of several triggers '3 × 2.0', and '(2.0)' where they add nothing. */
export function countedHours(seconds: number, times: number): string {
  const hours = formatNumber(seconds / 3600, 1)
  if (times === 0) return `(${hours})`
  return times === 1 ? hours : `${times} × ${hours}`
}
