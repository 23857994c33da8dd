import { describe, expect, it } from 'vitest'
import { windowsOf } from '@/lib/domain/nights/windowsOf'
import { contents, observation, slitMode, target } from '../../support/contents'

const hours = (over: Partial<typeof slitMode.telescope>) => {
  const modes = [{ ...slitMode, telescope: { ...slitMode.telescope, ...over } }]
  const windows = windowsOf(
    contents({ targets: [target()], observations: [observation()], modes }),
    observation(),
  )
  return [...(windows?.values() ?? [])].flat().reduce((sum, [from, to]) => sum + (to - from) / 3_600_000, 0)
}

// Seen to fail with the telescope left out.
describe('when an observation may be made', () => {
  const free = hours({})

  it('is not when the target stands behind what is around the telescope', () => {
    expect(free).toBeGreaterThan(10)
    const wall = [
      { azimuthDeg: 0, altitudeDeg: 45 },
      { azimuthDeg: 180, altitudeDeg: 45 },
    ]
    const behind = hours({ horizon: wall })
    expect(behind).toBeGreaterThan(0)
    expect(behind).toBeLessThan(free)
    expect(hours({ horizon: wall.map((row) => ({ ...row, altitudeDeg: 89 })) })).toBe(0)
  })

  it('is not when it stands in the blind spot of the telescope', () => {
    expect(hours({ highestAltitudeDeg: 40 })).toBeLessThan(free)
  })
})
