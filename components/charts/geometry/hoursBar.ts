export interface HoursAwarded {
  asked: number
  given: number
  /** The least that is of use; a tick on the bar. */
  least?: number
}

/** Widths of the outline (asked), the fill (given) and the place of the tick, in pixels. */
export function hoursBar({ asked, given, least }: HoursAwarded, maxHours: number, width: number) {
  const scale = (hours: number) => Math.round((width * Math.min(hours, maxHours) * 10) / maxHours) / 10
  return { asked: scale(asked), given: scale(given), least: least === undefined ? null : scale(least) }
}
