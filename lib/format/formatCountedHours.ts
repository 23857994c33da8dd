import { formatNumber } from './formatNumber'

/** Hours as they count in a sum: '2.0', '3 × 2.0' where they count so often, and '(2.0)' where they add nothing. */
export function formatCountedHours(seconds: number, times: number): string {
  const hours = formatNumber(seconds / 3600, 1)
  if (times === 0) return `(${hours})`
  return times === 1 ? hours : `${times} × ${hours}`
}
