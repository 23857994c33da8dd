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
  const depth = Math.max(0, ...target.windows.map((pieces) => pieces.length))
  const areas: string[] = []
  const edges: string[] = []
  for (let piece = 0; piece < depth; piece++) {
    for (const run of runs(target.windows.map((pieces) => pieces[piece] ?? null))) {
      const starts = run.map(({ night, window }) => place(night, window[0]))
      const ends = run.map(({ night, window }) => place(night, window[1]))
      areas.push(`M${text([...starts, ...ends.reverse()])}Z`)
      edges.push(`M${text(starts)}`, `M${text([...ends].reverse())}`)
    }
  }
  const transit = runs(
    (target.transits ?? []).map((hour) => (hour === null ? null : ([hour, hour] as const))),
  )
    .map((run) => `M${text(run.map(({ night, window }) => place(night, window[0])))}`)
    .join('')
  return { areas, edges, transit }
}

/** Unbroken runs of nights that have a window; each night counts from its left edge to its right. */
function runs(windows: readonly (readonly [number, number] | null)[]) {
  const found: { night: number; window: readonly [number, number] }[][] = []
  let open = false
  windows.forEach((window, night) => {
    const last = found[found.length - 1]
    // A jump of hours between two nights is another piece, not a steep edge.
    const before = open ? last?.[last.length - 1]?.window[0] : undefined
    if (!window) {
      open = false
      return
    }
    const entry = [
      { night, window },
      { night: night + 1, window },
    ]
    if (open && last && before !== undefined && Math.abs(before - window[0]) < 2) {
      last[last.length - 1] = { night: night + 0.5, window }
      last.push({ night: night + 1, window })
    } else {
      found.push(entry)
    }
    open = true
  })
  return found
}
