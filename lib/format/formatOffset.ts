import { TRUE_MINUS } from './glyphs'

/** A zone by its distance from UTC: `UTC−3`, `UTC+5:30`, `UTC`. */
export function formatOffset(offsetHours: number): string {
  if (offsetHours === 0) return 'UTC'
  const size = Math.abs(offsetHours)
  const minutes = Math.round((size % 1) * 60)
  const clock =
    minutes === 0 ? String(Math.trunc(size)) : `${Math.trunc(size)}:${String(minutes).padStart(2, '0')}`
  return `UTC${offsetHours < 0 ? TRUE_MINUS : '+'}${clock}`
}
