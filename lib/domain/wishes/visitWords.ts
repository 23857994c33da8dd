import { countInWords } from '@/lib/format'
import type { VisitWish } from '../proposals/types'

const parts = {
  whole: ['night', 'nights'],
  first: ['first half of a night', 'first halves of nights'],
  second: ['second half of a night', 'second halves of nights'],
} as const

/** `three nights in a row`, `two first halves of nights`. */
export function visitInWords({ nights, part, together }: VisitWish): string {
  const [one, many] = parts[part]
  return `${countInWords(nights, one, many)}${nights > 1 && together ? ' in a row' : ''}`
}
