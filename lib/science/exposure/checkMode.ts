import { ScienceError } from '../ScienceError'
import type { ModeRecord } from './types'

/** Records are never changed once made, so each is looked at once. */
const sound = new WeakSet<ModeRecord>()

/** Throws where a record of a mode cannot be computed with: no range, or a throughput table that is empty or disordered. */
export function checkMode(mode: ModeRecord): void {
  if (sound.has(mode)) return
  const refuse = (words: string): never => {
    throw new ScienceError('bad-mode', words)
  }
  if (!(mode.wavelengthMaxA > mode.wavelengthMinA)) refuse('The range of this mode ends before it begins.')
  const rows = mode.throughput
  if (rows.length < 2) refuse('The throughput table of this mode is empty.')
  rows.forEach(({ wavelengthA, efficiency }, index) => {
    if (index > 0 && !(wavelengthA > (rows[index - 1]?.wavelengthA ?? Infinity)))
      refuse('The wavelengths of this mode’s throughput table must grow from row to row.')
    if (!(efficiency >= 0 && efficiency <= 1)) refuse('A throughput lies between 0 and 1.')
  })
  sound.add(mode)
}
