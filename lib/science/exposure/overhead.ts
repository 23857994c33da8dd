import type { ModeRecord } from './types'

/** Time beside the open shutter, seconds, as the mode defines it; frames of blank sky take as long as those of the source. */
export function overheadOf(mode: ModeRecord, frames: number, openS: number): number {
  const { acquisitionS, readoutS, ditherS, calibrationFraction } = mode.overheads
  const isTwice = mode.skySubtraction === 'blank-sky'
  const taken = isTwice ? 2 * frames : frames
  return (
    acquisitionS +
    taken * readoutS +
    (taken - 1) * ditherS +
    calibrationFraction * openS +
    (isTwice ? openS : 0)
  )
}
