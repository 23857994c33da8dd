import { NO_BREAK_SPACE } from './glyphs'

const part = (amount: number, unit: string) => `${amount}${NO_BREAK_SPACE}${unit}`

/**
 * Time left, rounded down so that nobody is promised a minute too many:
 * `13 d 19 h 45 min`, `12 h 19 min`, `8 min`; seconds only in the last minute; `0 s` once it has passed.
 * `parts` limits how many units are shown, largest first.
 */
export function formatCountdown(milliseconds: number, parts = 3): string {
  const seconds = Math.max(0, Math.floor(milliseconds / 1000))
  if (seconds < 60) return part(seconds, 's')
  const days = Math.floor(seconds / 86_400)
  const hours = Math.floor((seconds % 86_400) / 3600)
  const minutes = Math.floor((seconds % 3600) / 60)
  const all = [part(days, 'd'), part(hours, 'h'), part(minutes, 'min')]
  const first = days > 0 ? 0 : hours > 0 ? 1 : 2
  return all.slice(first, first + parts).join(' ')
}
