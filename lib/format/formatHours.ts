import { formatQuantity } from './formatQuantity'

/** Hours with one decimal: `21.0 h`. */
export function formatHours(hours: number | null | undefined): string {
  return formatQuantity(hours, 1, 'h')
}
