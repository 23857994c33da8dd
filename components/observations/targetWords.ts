import type { Target } from '@/lib/domain/proposals/types'
import { formatNumber, formatPower } from '@/lib/format'

/** A target in a line: where it is, its redshift and its light; what is not known is left out. */
export function targetWords(target: Target, isForLine: boolean): string {
  const { raTyped, decTyped, redshift, redshiftTyped, brightness, line, magnification } = target
  const lineUnit = line?.kind === 'flux' ? 'erg/s/cm²' : 'erg/s'
  const parts = [
    `${raTyped} ${decTyped}`.trim(),
    redshift === null ? '' : `z = ${redshiftTyped}`,
    brightness ? `${brightness.band} = ${formatNumber(brightness.value, 1)} (${brightness.system})` : '',
    isForLine && line ? `${line.name} of ${formatPower(line.value)} ${lineUnit}` : '',
    magnification ? `magnified ${formatNumber(magnification, 1)} times` : '',
  ]
  return parts.filter(Boolean).join(', ')
}
