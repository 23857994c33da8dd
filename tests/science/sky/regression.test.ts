import { describe, expect, it } from 'vitest'
import { createAlmanac, nightAt, sharedAlmanac, visibility } from '../../../lib/science/sky'

const ridge = { latitudeDeg: -37.4, longitudeDeg: -70.2, elevationM: 2390 }

describe('regression', () => {
  it('a half-year at 37.4 S: 184 nights, 1,546.1 h of astronomical night', () => {
    const { nights } = visibility({
      site: ridge,
      targets: [],
      from: '2027-07-01',
      to: '2027-12-31',
      maxAirmass: 2,
    })
    expect(nights).toHaveLength(184)
    expect(nights.reduce((sum, night) => sum + night.darkHours, 0)).toBeCloseTo(1546.1, 1)
  })

  it('a fresh almanac and the shared one give the same night', () => {
    expect(nightAt(ridge, '2027-09-01', -18, createAlmanac())).toEqual(
      nightAt(ridge, '2027-09-01', -18, sharedAlmanac),
    )
  })

  it('longitudes east of 180 degrees are the same places', () => {
    const east = { ...ridge, longitudeDeg: 289.8 }
    expect(nightAt(east, '2027-09-01').sunset).toEqual(nightAt(ridge, '2027-09-01').sunset)
  })

  it('a darker twilight limit leaves fewer hours', () => {
    const hours = [-6, -12, -18].map((limit) => nightAt(ridge, '2027-12-21', limit).darkHours)
    expect(hours[0]).toBeGreaterThan(hours[1] ?? 24)
    expect(hours[1]).toBeGreaterThan(hours[2] ?? 24)
  })
})
