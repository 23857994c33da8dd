import { formatQuantity } from './formatQuantity'

/** Nights with two decimals: `2.50 nights`. */
export function formatNights(nights: number | null | undefined): string {
  return formatQuantity(nights, 2, nights === 1 ? 'night' : 'nights')
}
