/**
 * Marks that would lie on each other are stacked: for each place, px, the level it stands on, 0 at the axis, so that
 * no two on one level are nearer than `gapPx`. Equal places are stacked in the order given.
 */
export function stackLevels(placesPx: readonly number[], gapPx: number): number[] {
  const levels = placesPx.map(() => 0)
  const lastPx: number[] = []
  const order = placesPx.map((px, index) => ({ px, index })).sort((a, b) => a.px - b.px || a.index - b.index)
  for (const { px, index } of order) {
    const free = lastPx.findIndex((last) => px - last >= gapPx)
    const level = free === -1 ? lastPx.length : free
    lastPx[level] = px
    levels[index] = level
  }
  return levels
}
