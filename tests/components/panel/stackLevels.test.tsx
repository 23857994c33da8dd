import { describe, expect, it } from 'vitest'
import { stackLevels } from '@/components/charts/geometry/stackLevels'

// Seen to fail with the gap taken from the level below alone.

describe('stackLevels', () => {
  it.each([
    ['nothing', [], []],
    ['far apart, all on the axis', [10, 60, 200], [0, 0, 0]],
    ['equal places, in the order given', [50, 50, 50], [0, 1, 2]],
    ['given in any order', [200, 12, 10], [0, 1, 0]],
    ['back on the axis once there is room', [10, 20, 40, 50], [0, 1, 0, 1]],
    ['exactly the gap apart', [10, 40], [0, 0]],
  ])('%s', (_name, places, levels) => {
    expect(stackLevels(places, 30)).toEqual(levels)
  })

  it('never sets two of a level nearer than the gap', () => {
    const places = Array.from({ length: 60 }, (_, index) => (index * 37) % 101)
    const levels = stackLevels(places, 15)
    for (const [i, a] of places.entries())
      for (const [j, b] of places.entries())
        if (i < j && levels[i] === levels[j]) expect(Math.abs(a - b)).toBeGreaterThanOrEqual(15)
  })
})
