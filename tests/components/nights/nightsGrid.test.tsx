import { describe, expect, it } from 'vitest'
import { nightsGrid, type GridBin } from '@/components/charts/geometry/nightsGrid'

const bin = (half: number, siderealFromH: number, more: Partial<GridBin> = {}): GridBin => ({
  half,
  siderealFromH,
  moon: 'dark',
  seconds: 3600,
  usedSeconds: 0,
  ...more,
})

describe('the grid of a season', () => {
  it('climbs from the row after the longest gap, through midnight of sidereal time', () => {
    const grid = nightsGrid([bin(0, 20), bin(0, 22), bin(1, 0), bin(2, 2), bin(2, 16)], 3, 300)
    expect(grid.rows.map(({ siderealFromH }) => siderealFromH)).toEqual([16, 18, 20, 22, 0, 2])
    expect(grid.rows.map(({ y }) => y)).toEqual([85, 68, 51, 34, 17, 0])
    expect(grid.height).toBe(102)
  })

  it('keeps all twelve rows where each has hours', () => {
    const all = Array.from({ length: 12 }, (_, k) => bin(0, 2 * k))
    expect(nightsGrid(all, 1, 100).rows.map(({ siderealFromH }) => siderealFromH)).toEqual([
      12, 14, 16, 18, 20, 22, 0, 2, 4, 6, 8, 10,
    ])
  })

  it('makes the fullest cell as wide as its column, parts side by side, filled as far as used', () => {
    const grid = nightsGrid(
      [
        bin(0, 0, { seconds: 7200, usedSeconds: 3600 }),
        bin(0, 0, { moon: 'bright', seconds: 3600, usedSeconds: 3600 }),
        bin(1, 0, { seconds: 5400 }),
      ],
      2,
      104.8,
    )
    expect(grid.fullHours).toBe(3)
    const [full, other] = grid.cells
    expect(
      full?.parts.map(({ moon, x, width, used }) => [moon, ...[x, width, used].map(Math.round)]),
    ).toEqual([
      ['dark', 0, 33, 17],
      ['bright', 33, 17, 17],
    ])
    expect(other?.parts[0]?.x).toBeCloseTo(52.4, 9)
    expect(other?.parts[0]?.width).toBeCloseTo(25, 9)
  })

  it('is empty without nights', () => {
    expect(nightsGrid([], 0, 100)).toMatchObject({ rows: [], cells: [], height: 0 })
  })
})
