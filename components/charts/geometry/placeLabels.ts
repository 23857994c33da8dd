export interface LabelledLine {
  id: string
  words: string
  /** In the plot's own pixels, in order of x. */
  points: readonly (readonly [number, number])[]
}

export interface PlacedLabel {
  id: string
  /** Where the words begin, on their baseline. */
  x: number
  y: number
}

export interface Box {
  left: number
  right: number
  top: number
  bottom: number
}

/** Width of a letter at 13 px, px. */
export const LETTER = 7.1
const HEIGHT = 15
/** Left free beside words, px. */
const CLEAR = 4
/** Shares of a line's length that are tried, its end first. */
const PLACES = [1, 0.94, 0.88, 0.8, 0.72, 0.64, 0.56, 0.48, 0.4, 0.3, 0.2, 0.1]

/** The box of small words beginning at a point, moved left where they would leave the plot. */
export function wordBox(x: number, baseline: number, text: string, width: number): Box {
  const length = [...text].length * 6.3 + 6
  const left = Math.max(0, Math.min(x, width - length))
  return { left, right: left + length, top: baseline - HEIGHT, bottom: baseline + 4 }
}

/** What each place beside a point costs, in the order of `boxesAt`. */
const sideCosts = [0, 0, 1, 1, 6, 6, 8, 11, 14]

const overlaps = (a: Box, b: Box) =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom

/** How many steps of a line pass through a box. */
function crossed(points: LabelledLine['points'], box: Box): number {
  let count = 0
  for (let i = 1; i < points.length; i += 1) {
    const [x0, y0] = points[i - 1] as readonly [number, number]
    const [x1, y1] = points[i] as readonly [number, number]
    const inX = Math.max(x0, x1) >= box.left - CLEAR && Math.min(x0, x1) <= box.right + CLEAR
    if (inX && Math.max(y0, y1) >= box.top && Math.min(y0, y1) <= box.bottom + 1) count += 1
  }
  return count
}

/** Places for words at a point: above and below it, at its left and right, then further and further off. */
function boxesAt([x, y]: readonly [number, number], length: number, width: number): Box[] {
  const right = Math.min(width, Math.max(length, x + length * 0.3))
  const box = (left: number, baseline: number): Box => ({
    left,
    right: left + length,
    top: baseline - HEIGHT + 3,
    bottom: baseline + 3,
  })
  return [
    box(right - length, y - 8),
    box(right - length, y + 19),
    box(Math.max(0, x - length - 9), y + 4),
    box(Math.min(width - length, x + 9), y + 4),
    box(right - length, y - 24),
    box(right - length, y + 36),
    box(right - length, y - 42),
    box(right - length, y - 66),
    box(right - length, y - 92),
  ]
}

/**
 * A place for the name of every line, as near its end as leaves all lines and names in sight: above or below the
 * line, where the fewest lines pass under the words. `taken` are boxes of words that already stand there.
 */
export function placeLabels(
  lines: readonly LabelledLine[],
  width: number,
  height: number,
  taken: readonly Box[] = [],
): PlacedLabel[] {
  const placed: Box[] = [...taken]
  return lines.map(({ id, words, points }) => {
    const length = [...words].length * LETTER
    let best = { cost: Infinity, box: { left: 0, right: length, top: 0, bottom: HEIGHT } }
    PLACES.forEach((share, order) => {
      const point = points[Math.round((points.length - 1) * share)]
      if (!point) return
      boxesAt(point, length, width).forEach((box, side) => {
        const outside = box.top < -16 || box.bottom > height ? 500 : 0
        const covered = placed.filter((other) => overlaps(box, other)).length * 40
        const under = lines.reduce((sum, line) => sum + Math.min(14, crossed(line.points, box) * 3), 0)
        const cost = outside + covered + under + order * 0.6 + (sideCosts[side] ?? 0)
        if (cost < best.cost) best = { cost, box }
      })
    })
    placed.push(best.box)
    return { id, x: best.box.left, y: best.box.bottom - 3 }
  })
}
