import { formatPercent, formatUtcMinute } from '@/lib/format'
import type { Night } from '@/lib/science/sky'

/** The facts of the night band as one sentence, for those who do not see it. */
export function nightInWords(night: Night): string {
  const dusk = night.eveningTwilight.astronomical
  const dawn = night.morningTwilight.astronomical
  const sun =
    night.sunset && night.sunrise
      ? `sunset ${formatUtcMinute(night.sunset)}, sunrise ${formatUtcMinute(night.sunrise)} UTC`
      : 'the Sun neither sets nor rises'
  const dark =
    dusk && dawn ? `dark from ${formatUtcMinute(dusk)} to ${formatUtcMinute(dawn)}` : 'no full darkness'
  const up = night.moonUp
    .map(([rise, set]) => `${formatUtcMinute(rise)} to ${formatUtcMinute(set)}`)
    .join(' and ')
  const moon = up ? `Moon ${formatPercent(night.moonIllumination)} lit, up ${up}` : 'no Moon'
  return `Tonight at the observatory: ${sun}; ${dark}; ${moon}.`
}
