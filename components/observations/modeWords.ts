import { formatNumber, formatQuantity } from '@/lib/format'
import type { ModeRecord } from '@/lib/domain/facility/types'

/** The facts of a mode that decide whether it suits, in a line. */
export function modeFacts(mode: ModeRecord): string {
  const range = `${formatNumber(mode.wavelengthMinA)} to ${formatNumber(mode.wavelengthMaxA)} Å in ${mode.medium}`
  const scale = `${formatNumber(mode.pixelScaleArcsec, 2)}″ a pixel`
  const power = mode.resolvingPower ? `R = ${formatNumber(mode.resolvingPower)}` : null
  const frame = `sub-exposures to ${formatQuantity(mode.maxSubExposureS, 0, 's')}`
  const setUp = `${formatQuantity(mode.overheads.acquisitionS, 0, 's')} to set up`
  return [range, power, scale, frame, setUp].filter(Boolean).join('; ')
}

/** Modes as choices, under telescope and instrument. */
export const modeOptions = (modes: readonly ModeRecord[]) =>
  modes.map((mode) => ({
    value: String(mode.modeId),
    label: mode.name,
    group: `${mode.instrument.name} on ${mode.telescope.name}`,
  }))
