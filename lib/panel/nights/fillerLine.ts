import type { BinnedLine, NightBin } from './binTypes'

/** A line that may only have time under a bright Moon. */
export function fillerLine(line: BinnedLine, bins: readonly NightBin[]): BinnedLine {
  const parts = line.parts.map(({ seconds, usable }) => ({
    seconds,
    usable: new Map([...usable].filter(([bin]) => bins[bin]?.moon === 'bright')),
  }))
  return { ...line, parts }
}
