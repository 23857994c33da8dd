import type { ModeRecord } from './types'

/** Pixels the sky is measured from: as many as the source covers where frames are subtracted from each other. */
export function backgroundPixels(mode: ModeRecord, pixels: number): number | undefined {
  return (mode.skySubtraction ?? 'around') === 'around' ? mode.backgroundPixels : pixels
}
