import { formatNumber } from '@/lib/format'
import type { ModeRecord } from '@/lib/domain/facility/types'
import { airToVacuumA, restLines } from '@/lib/science/light'

/** Lines of the list as choices: first those the mode sees at this redshift, with where they fall. */
export function featureOptions(mode: ModeRecord | undefined, redshift: number | null) {
  const edge = (wavelengthA: number) => (mode?.medium === 'air' ? airToVacuumA(wavelengthA) : wavelengthA)
  const seen = restLines.filter(({ vacuumA }) => {
    if (!mode || redshift === null) return false
    const at = vacuumA * (1 + redshift)
    return at >= edge(mode.wavelengthMinA) && at <= edge(mode.wavelengthMaxA)
  })
  const option = ({ id, name, vacuumA }: (typeof restLines)[number]) => ({
    value: id,
    label: redshift === null ? name : `${name}, at ${formatNumber(vacuumA * (1 + redshift))} Å`,
  })
  return {
    seen: seen.map(option),
    others: restLines.filter((line) => !seen.includes(line)).map(option),
  }
}
