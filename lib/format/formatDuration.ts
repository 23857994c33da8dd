import { NO_BREAK_SPACE } from './glyphs'

/** How long something takes, in the two largest units that matter: `586 s`, `35 min`, `2 h 05 min`. */
export function formatDuration(seconds: number): string {
  const whole = Math.round(seconds)
  if (whole < 600) return `${whole}${NO_BREAK_SPACE}s`
  const minutes = Math.round(whole / 60)
  if (minutes < 60) return `${minutes}${NO_BREAK_SPACE}min`
  const rest = String(minutes % 60).padStart(2, '0')
  return `${Math.floor(minutes / 60)}${NO_BREAK_SPACE}h ${rest}${NO_BREAK_SPACE}min`
}
