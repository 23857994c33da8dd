'use client'

import { SeasonChartTurned } from './SeasonChartTurned'
import { SeasonChartWide } from './SeasonChartWide'
import type { SeasonChartProps } from './seasonTypes'

/**
 * A season of nights: twilight and Moon of every night, and the window of a target. Nights run across, and down on
 * narrow screens, where the same picture is turned.
 */
export function SeasonChart(props: SeasonChartProps) {
  return (
    <figure className="m-0" role="img" aria-label={props.label}>
      <div className="max-lg:hidden" aria-hidden="true">
        <SeasonChartWide {...props} />
      </div>
      <div className="lg:hidden" aria-hidden="true">
        <SeasonChartTurned {...props} />
      </div>
    </figure>
  )
}
