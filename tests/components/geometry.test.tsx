import { describe, expect, it } from 'vitest'
import { bandColour } from '@/components/charts/geometry/bandColour'
import { crossings } from '@/components/charts/geometry/crossings'
import { hoursBar } from '@/components/charts/geometry/hoursBar'
import { lineChart } from '@/components/charts/geometry/lineChart'
import { monthSums } from '@/components/charts/geometry/monthSums'
import { nightBandGeometry } from '@/components/charts/geometry/nightBand'
import { nightStops } from '@/components/charts/geometry/nightStops'
import { rankScale } from '@/components/charts/geometry/rankInterval'
import { hourLabels } from '@/components/charts/geometry/seasonLabels'
import { targetShape } from '@/components/charts/geometry/seasonTarget'
import { skyColour } from '@/components/charts/geometry/skyColour'
import { spectrumStrip } from '@/components/charts/geometry/spectrumStrip'
import { upBar } from '@/components/charts/geometry/upBar'
import { valueAt } from '@/components/charts/geometry/valueAt'
import { nightAt, sunAltitudeDeg } from '@/lib/science/sky'

// Seen to fail with the interpolation of crossings replaced by the nearer sample.

describe('the colour of the sky', () => {
  it.each([
    [12, 'var(--sky-0)'],
    [0, 'var(--sky-0)'],
    [-1, 'var(--sky-1)'],
    [-18, 'var(--sky-6)'],
    [-2.5, 'color-mix(in srgb, var(--sky-2) 50%, var(--sky-1))'],
    [-80, 'var(--sky-7)'],
  ])('for the Sun at %s degrees', (altitude, colour) => {
    expect(skyColour(altitude)).toBe(colour)
  })

  it('melts into the ground of dark pages near the horizon only', () => {
    expect(bandColour(-3)).toBe(skyColour(-3))
    expect(bandColour(-0.7)).toContain('calc(var(--band-mixing) * 50%)')
    expect(bandColour(2)).toContain('calc(var(--band-mixing) * 100%)')
  })
})

describe('crossings of a level', () => {
  it('are found between samples, going down and coming up', () => {
    expect(crossings([18, 19, 20, 21], [4, -4, -4, 12], 0)).toEqual({ down: 18.5, up: 20.25 })
  })
  it('are absent where the level is never met', () => {
    expect(crossings([18, 19], [4, 3], 0)).toEqual({ down: null, up: null })
  })
  it('make the stops of a night, evening to morning', () => {
    const stops = nightStops([18, 19, 20, 21, 22], [1, -9, -20, -9, 1])
    expect(stops.map(({ hour }) => hour)).toEqual([...stops.map(({ hour }) => hour)].sort((a, b) => a - b))
    expect(stops[0]).toEqual({ hour: 18.1, colour: 'var(--sky-0)' })
    expect(stops.at(-1)?.colour).toBe('var(--sky-0)')
  })
})

describe('the band of a night', () => {
  const ridge = { latitudeDeg: -37.4, longitudeDeg: -70.2, elevationM: 2390 }
  const night = nightAt(ridge, '2027-03-17')
  const band = nightBandGeometry(night, -3, (at) => sunAltitudeDeg(ridge, at))

  it('reaches from 14 minutes before sunset to 14 after sunrise in 32 steps', () => {
    expect(band.fromMs).toBe((night.sunset?.getTime() ?? 0) - 14 * 60_000)
    expect(band.toMs).toBe((night.sunrise?.getTime() ?? 0) + 14 * 60_000)
    expect(band.stops).toHaveLength(32)
    expect(Math.min(...band.stops.map(({ sunAltitudeDeg: altitude }) => altitude))).toBeLessThan(-40)
  })
  it('has hours only in the dark, even ones named', () => {
    expect(band.ticks.map(({ name }) => name).filter(Boolean)).toEqual(['02', '04', '06', '08'])
    expect(band.ticks.every(({ share }) => share > 0 && share < 1)).toBe(true)
  })
  it('draws the Moon within the night, thicker as it fills', () => {
    expect(band.moonBars.every(({ from, to }) => from >= 0 && to <= 1 && to > from)).toBe(true)
    expect(band.moonThickness).toBeCloseTo(Math.max(1, 5 * night.moonIllumination), 9)
  })
  it('cuts a night without sunset at the site’s evening', () => {
    const polar = {
      ...night,
      sunset: null,
      sunrise: null,
      moonUp: [],
      eveningTwilight: { ...night.eveningTwilight, astronomical: null },
    }
    const cut = nightBandGeometry(polar, -3, () => 5)
    expect(new Date(cut.fromMs).toISOString()).toBe('2027-03-17T20:46:00.000Z')
    expect(cut.ticks).toEqual([])
  })
})

describe('a target in a season', () => {
  const place = (night: number, hour: number): [number, number] => [night * 10, hour]
  it('is one outline while its window lasts, another after a gap', () => {
    const shape = targetShape({ windows: [[[20, 22]], [[20.1, 22.1]], [], [[20, 21]]] }, place)
    expect(shape.areas).toHaveLength(2)
    expect(shape.edges).toHaveLength(4)
    expect(shape.areas[0]).toBe('M0.0 20.0L15.0 20.1L20.0 20.1L20.0 22.1L15.0 22.1L0.0 22.0Z')
  })
  it('breaks where a window jumps by hours', () => {
    expect(targetShape({ windows: [[[20, 22]], [[26, 28]]] }, place).areas).toHaveLength(2)
  })
  it('goes on from the piece it lies nearest to where a blind spot begins or ends', () => {
    const windows = [[[19, 22] as const, [23, 28] as const], [[22.9, 27.9] as const], [[22.8, 27.8] as const]]
    const { areas } = targetShape({ windows }, place)
    expect(areas).toHaveLength(2)
    expect(areas[0]).toBe('M0.0 19.0L10.0 19.0L10.0 22.0L0.0 22.0Z')
    expect(areas[1]).toContain('M0.0 23.0L15.0 22.9L25.0 22.8L30.0 22.8L30.0 27.8')
    expect(targetShape({ windows: windows.toReversed() }, place).areas).toHaveLength(2)
  })
  it('has no shape when it never rises', () => {
    expect(targetShape({ windows: [[], []] }, place)).toEqual({ areas: [], edges: [], transit: '' })
  })
})

describe('lines', () => {
  const chart = lineChart({
    width: 400,
    height: 200,
    series: [
      {
        id: 'a',
        name: 'A',
        tone: 's1',
        points: [
          [0, 0],
          [2, 100],
        ],
      },
      {
        id: 'b',
        name: 'B',
        tone: 's2',
        points: [
          [0, 0],
          [2, 99],
        ],
      },
    ],
  })
  it('run over the whole plot', () => {
    expect(chart.paths[0]?.d).toBe('M0,200L400,0')
  })
  it('keep their names apart and inside', () => {
    const [a, b] = chart.paths.map(({ label }) => label.y)
    expect(Math.abs((a ?? 0) - (b ?? 0))).toBeGreaterThanOrEqual(16)
  })
  it('are read by interpolation, and not beyond their ends', () => {
    expect(
      valueAt(
        [
          [0, 0],
          [2, 100],
        ],
        0.5,
      ),
    ).toBe(25)
    expect(
      valueAt(
        [
          [0, 0],
          [2, 100],
        ],
        2.1,
      ),
    ).toBeNull()
  })
})

describe('small marks', () => {
  it('label the hours on both clocks', () => {
    expect(hourLabels(-3, 3)[0]).toEqual({ hour: 18, local: '18', utc: '21' })
    expect(hourLabels(-3, 3).at(-1)).toEqual({ hour: 33, local: '09', utc: '12' })
  })
  it('sum nights into months', () => {
    expect(monthSums(['2027-07-30', '2027-07-31', '2027-08-01'], [1, 2, 4])).toEqual([
      { month: '2027-07', sum: 3 },
      { month: '2027-08', sum: 4 },
    ])
  })
  it('fill a row up to its height and no further', () => {
    expect(upBar([0, 5, 20], 100, 20, 10).line).toBe('M0,20L50,10L100,0')
  })
  it('place hours and ranks', () => {
    expect(hoursBar({ asked: 50, given: 25, least: 10 }, 100, 200)).toEqual({
      asked: 100,
      given: 50,
      least: 20,
    })
    expect(hoursBar({ asked: 500, given: 0 }, 100, 200)).toEqual({ asked: 200, given: 0, least: null })
    expect(rankScale(24, 240)(12.5)).toBe(120)
  })
  it('keep a spectrum to its axis', () => {
    const strip = spectrumStrip({
      from: 9500,
      to: 14500,
      width: 1000,
      height: 150,
      model: [
        [9000, 1],
        [10000, 1],
        [11000, 2],
      ],
      skyLines: [
        { at: 9000, strength: 9 },
        { at: 10000, strength: 1 },
        { at: 12000, strength: 2 },
      ],
    })
    expect(strip.model).toBe('M100,67.5L300,22.5')
    expect(strip.skyLines.map(({ x, tall }) => [x, tall])).toEqual([
      [100, 10.5],
      [500, 18],
    ])
  })
})
