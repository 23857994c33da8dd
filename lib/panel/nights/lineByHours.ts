import type { AskedLine } from './types'

/**
 * Where the line falls if hours alone draw it: after the last proposal, from the top, whose asking still fits
 * what is offered on every telescope.
 */
export function lineByHours(
  asked: readonly (readonly AskedLine[])[],
  offered: ReadonlyMap<number, number>,
): number {
  const left = new Map(offered)
  let line = 0
  for (const lines of asked) {
    for (const { telescope, seconds } of lines) left.set(telescope, (left.get(telescope) ?? 0) - seconds)
    if ([...left.values()].some((seconds) => seconds < 0)) break
    line += 1
  }
  return line
}
