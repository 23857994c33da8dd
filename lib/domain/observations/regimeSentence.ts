import { formatNumber, formatPercent } from '@/lib/format'
import type { ExposureFacts } from './types'

const limits: Readonly<Record<ExposureFacts['regime'], string>> = {
  source: 'the light of the source itself',
  sky: 'the sky',
  read: 'read noise and dark current',
  floor: 'what is left of the sky after subtraction',
}

type Facts = Pick<
  ExposureFacts,
  'regime' | 'regimeShare' | 'timeExponentOfFlux' | 'timeExponentOfDistance' | 'cosmologyMatters'
>

/** What limits an exposure and how the time grows with distance, never a bare square. */
export function regimeSentence(facts: Facts): string {
  const limited = `Limited by ${limits[facts.regime]}, ${formatPercent(facts.regimeShare, 0)} of the noise.`
  if (facts.regime === 'floor') return `${limited} More time hardly helps.`
  return facts.cosmologyMatters
    ? `${limited} The time goes as the luminosity distance to the power ${formatNumber(facts.timeExponentOfDistance, 2)}.`
    : `${limited} The time goes as the flux to the power ${formatNumber(facts.timeExponentOfFlux, 2)}.`
}

/** Whether the choice of cosmology changes this exposure. */
export function cosmologySentence(cosmologyMatters: boolean, magnitude: string): string {
  return cosmologyMatters
    ? `Cosmology matters here: ${magnitude} was predicted from a luminosity, so the distance changes it.`
    : `Cosmology makes no difference here: ${magnitude} was observed, so the exposure stays as it is.`
}
