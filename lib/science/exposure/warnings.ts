import type { ExposureInput } from './exposure'
import type { Regime } from './report'

interface Facts {
  readonly peakFraction: number
  readonly regime: Regime
  readonly regimeShare: number
  readonly frames: number
}

/** Sentences on what an astronomer should look at before trusting an exposure. */
export function exposureWarnings({ mode, conditions }: ExposureInput, facts: Facts): string[] {
  const found: string[] = []
  const percent = (share: number): string => `${Math.round(100 * share)} %`
  if (facts.peakFraction > 1) {
    found.push(`The brightest pixel saturates: it fills ${percent(facts.peakFraction)} of what it holds.`)
  } else if (facts.peakFraction > 0.801) {
    found.push(
      `The brightest pixel fills ${percent(facts.peakFraction)} of what it holds, past the linear range.`,
    )
  }
  if (facts.regime === 'read') {
    found.push(`Read noise and dark current make ${percent(facts.regimeShare)} of the noise.`)
  }
  if (facts.regime === 'floor') {
    found.push(
      'What is left of the sky after subtraction makes most of the noise; a lower S/N takes far less time.',
    )
  }
  const { best10 } = conditions.site.seeingQuantilesArcsec
  if (conditions.seeingArcsec < best10) {
    found.push(
      `Seeing of ${conditions.seeingArcsec}″ is better than the site’s best tenth of nights, ${best10}″.`,
    )
  }
  if (facts.frames > 1000) found.push(`${facts.frames} sub-exposures are a great many.`)
  for (const part of ['telescope', 'instrument', 'detector']) {
    if (!mode.throughputIncludes.includes(part)) {
      found.push(`The mode’s throughput leaves out the ${part}, so times come out too short.`)
    }
  }
  return found
}
