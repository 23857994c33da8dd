import type { HorizonPoint } from '@/lib/domain/facility/types'
import { formatNumber } from '@/lib/format'

/** `level`, or from where to where it reaches: `8 to 24°, highest in the east`. */
export function horizonInWords(rows: readonly HorizonPoint[]): string {
  const altitudes = rows.map(({ altitudeDeg }) => altitudeDeg)
  const [least, most] = [Math.min(...altitudes), Math.max(...altitudes)]
  const top = rows.find(({ altitudeDeg }) => altitudeDeg === most)
  if (!top) return 'level'
  if (least === most) return `${formatNumber(most, 0)}° all around`
  const sides = ['north', 'north-east', 'east', 'south-east', 'south', 'south-west', 'west', 'north-west']
  const side = sides[Math.round(top.azimuthDeg / 45) % 8] ?? ''
  return `${formatNumber(least, 0)} to ${formatNumber(most, 0)}°, highest in the ${side}`
}
