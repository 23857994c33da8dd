import type { SeasonPicture } from './geometry/season'
import type { SeasonTarget } from './geometry/seasonTarget'

/** A new or full Moon above the chart: which night, and the day of the month. */
export interface SeasonMoon {
  night: number
  kind: 'new' | 'full'
  day: number
}

/** Words on the chart, at a night and a local hour. */
export interface SeasonNote {
  night: number
  hour: number
  words: string
  /** Lit in the target's colour, plain on the night, or dark on the veil. */
  tone?: 'target' | 'night' | 'veil'
  align?: 'left' | 'centre' | 'right'
}

export interface SeasonChartProps {
  /** What screen readers hear: the chart in a sentence. */
  label: string
  picture: SeasonPicture
  moons: readonly SeasonMoon[]
  target?: SeasonTarget
  notes?: readonly SeasonNote[]
  /** Under each month: `138.3 h`. */
  monthValues?: readonly string[]
}
