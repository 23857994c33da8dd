export interface GridBin {
  half: number
  siderealFromH: number
  moon: 'dark' | 'grey' | 'bright'
  seconds: number
  usedSeconds: number
}

/** A class of moonlight within a cell: `width` as offered, of which `used` from the left is laid out. Pixels. */
export interface GridPart {
  moon: GridBin['moon']
  x: number
  width: number
  used: number
}

export interface NightsGrid {
  /** Two hours of sidereal time each, from the bottom up. */
  rows: { siderealFromH: number; y: number }[]
  cells: { half: number; siderealFromH: number; y: number; parts: GridPart[] }[]
  height: number
  /** Hours of a cell that fills its column. */
  fullHours: number
}

const rowHeight = 17
export const cellHeight = 15
const moons = ['dark', 'grey', 'bright'] as const

/** Sidereal rows in use, in the order in which a season climbs through them: it begins after the longest gap. */
function rowsOf(bins: readonly GridBin[]): number[] {
  const used = [...new Set(bins.map(({ siderealFromH }) => siderealFromH / 2))].sort((a, b) => a - b)
  const last = used.at(-1)
  if (last === undefined) return []
  if (used.length === 12) return Array.from({ length: 12 }, (_, i) => (12 + 2 * i) % 24)
  const gaps = used.map((row, i) => (row - (used[i - 1] ?? last - 12) + 12) % 12)
  const longest = Math.max(...gaps.map((gap) => (gap === 0 ? 12 : gap)))
  const start = used[gaps.findIndex((gap) => (gap === 0 ? 12 : gap) === longest)] ?? 0
  return Array.from({ length: 13 - longest }, (_, i) => (2 * (start + i)) % 24)
}

/** Cells of a telescope's season: half-months across, sidereal time up, as wide as the hours on offer. */
export function nightsGrid(bins: readonly GridBin[], halves: number, width: number): NightsGrid {
  const order = rowsOf(bins)
  const height = order.length * rowHeight
  const rows = order.map((siderealFromH, i) => ({ siderealFromH, y: height - (i + 1) * rowHeight }))
  const column = width / Math.max(1, halves)
  const inCell = (half: number, siderealFromH: number) =>
    bins.filter((bin) => bin.half === half && bin.siderealFromH === siderealFromH && bin.seconds > 0)
  const cells = rows
    .flatMap(({ siderealFromH, y }) =>
      Array.from({ length: halves }, (_, half) => ({
        half,
        siderealFromH,
        y,
        own: inCell(half, siderealFromH),
      })),
    )
    .filter(({ own }) => own.length > 0)
  const full = Math.max(1, ...cells.map(({ own }) => own.reduce((sum, { seconds }) => sum + seconds, 0)))
  const scale = (column - 2.4) / full
  return {
    rows,
    height,
    fullHours: full / 3600,
    cells: cells.map(({ half, siderealFromH, y, own }) => {
      let x = half * column
      const parts = moons.flatMap((moon): GridPart[] => {
        const bin = own.find((one) => one.moon === moon)
        if (!bin) return []
        const part = {
          moon,
          x,
          width: bin.seconds * scale,
          used: Math.min(bin.seconds, bin.usedSeconds) * scale,
        }
        x += part.width
        return [part]
      })
      return { half, siderealFromH, y, parts }
    }),
  }
}
