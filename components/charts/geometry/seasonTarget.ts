/** A target's windows night by night, in local hours counted from midnight before the evening. */
export interface SeasonTarget {
  windows: readonly (readonly (readonly [number, number])[])[]
  /** Where it stands highest, if shown. */
  transits?: readonly (number | null)[]
}

export interface TargetShape {
  /** Each window piece as an outline through the nights, to be filled or cut out. */
  areas: string[]
  /** The two edges of each piece, to be stroked. */
  edges: string[]
  transit: string
}

type Place = (night: number, hour: number) => [number, number]

const text = (points: readonly (readonly [number, number])[]) =>
  points.map(([x, y]) => `${x.toFixed(1)} ${y.toFixed(1)}`).join('L')

/**
 * Outlines of a target's windows. `place` turns (night, hour) into coordinates, so that the same shape serves the
 * chart with nights across and the one with nights down.
 */
export function targetShape(target: SeasonTarget, place: Place): TargetShape {
  const areas: string[] = []
  const edges: string[] = []
  for (const run of runs(target.windows)) {
    const starts = run.map(({ night, window }) => place(night, window[0]))
    const ends = run.map(({ night, window }) => place(night, window[1]))
    areas.push(`M${text([...starts, ...ends.reverse()])}Z`)
    edges.push(`M${text(starts)}`, `M${text([...ends].reverse())}`)
  }
  const transit = runs((target.transits ?? []).map((hour) => (hour === null ? [] : [[hour, hour] as const])))
    .map((run) => `M${text(run.map(({ night, window }) => place(night, window[0])))}`)
    .join('')
  return { areas, edges, transit }
}

type Window = readonly [number, number]
type Run = { night: number; window: Window }[]

/** A jump of hours between two nights is another piece, not a steep edge. */
const JUMP_HOURS = 2

const apart = (a: Window, b: Window) => Math.max(Math.abs(a[0] - b[0]), Math.abs(a[1] - b[1]))

/**
 * Unbroken runs of windows; each night counts from its left edge to its right. Where a night has several pieces, as
 * beside a blind spot or over a ridge, each goes on from the one of the night before that it lies nearest to.
 */
function runs(windows: readonly (readonly Window[])[]): Run[] {
  const found: Run[] = []
  let open: Run[] = []
  windows.forEach((pieces, night) => {
    const left = [...open]
    open = pieces.map((window) => {
      const distance = (run: Run) => apart(run.at(-1)?.window ?? [Infinity, Infinity], window)
      const [nearest] = left.sort((a, b) => distance(a) - distance(b))
      if (nearest && distance(nearest) < JUMP_HOURS) {
        left.shift()
        nearest[nearest.length - 1] = { night: night + 0.5, window }
        nearest.push({ night: night + 1, window })
        return nearest
      }
      const begun: Run = [
        { night, window },
        { night: night + 1, window },
      ]
      found.push(begun)
      return begun
    })
  })
  return found
}
