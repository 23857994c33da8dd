import type { ExposureFacts } from './types'

/**
 * Signal-to-noise against open shutter, from the electrons of the exposure needed: signal and noise grow with time,
 * what is left of the sky after subtraction with its square, so that the curve flattens there.
 */
export function snrCurve(
  { signalE, variance }: Pick<ExposureFacts, 'signalE' | 'variance'>,
  openSeconds: number,
  untilSeconds: number,
  points = 60,
): [hours: number, snr: number][] {
  const random = variance.source + variance.sky + variance.dark + variance.read
  return Array.from({ length: points + 1 }, (_, index) => {
    const seconds = (untilSeconds * index) / points
    const share = seconds / openSeconds
    const noise = Math.sqrt(random * share + variance.floor * share ** 2)
    return [seconds / 3600, noise > 0 ? (signalE * share) / noise : 0]
  })
}
