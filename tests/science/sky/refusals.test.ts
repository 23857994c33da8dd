import { describe, expect, it } from 'vitest'
import { moonPhases, nightAt, positionsAt, sunAltitudeDeg, visibility } from '../../../lib/science/sky'

const site = { latitudeDeg: -37.4, longitudeDeg: -70.2, elevationM: 2390 }
const target = { id: 'a', raDeg: 53.1, decDeg: -27.8 }
const asked = { site, targets: [target], from: '2027-07-01', to: '2027-07-02', maxAirmass: 2 }

describe('refusals are sentences', () => {
  it.each(['2027-02-30', '2027-7-1', 'tomorrow', '', '2027-07-01T00:00'])('date %s', (date) => {
    expect(() => nightAt(site, date)).toThrow(`“${date}” is not a date: write it as 2027-07-01.`)
  })

  it.each([
    [{ ...site, latitudeDeg: 91 }, 'A latitude lies between −90° and +90°.'],
    [{ ...site, latitudeDeg: NaN }, 'A latitude lies between −90° and +90°.'],
    [{ ...site, longitudeDeg: 400 }, 'A longitude lies between −180° and +180°, east positive.'],
    [{ ...site, elevationM: 20_000 }, 'An elevation lies between −500 and 10,000 m.'],
  ])('site %o', (place, sentence) => {
    expect(() => nightAt(place, '2027-07-01')).toThrow(sentence)
  })

  it('years, order, airmass, Moon, twilight, coordinates, moments', () => {
    expect(() => nightAt(site, '1850-07-01')).toThrow('The sky is computed for the years 1900 to 2200.')
    expect(() => visibility({ ...asked, to: '2027-06-30' })).toThrow('The last night lies before the first.')
    expect(() => visibility({ ...asked, to: '2127-06-30' })).toThrow('At most ten years of nights')
    expect(() => visibility({ ...asked, maxAirmass: 0.5 })).toThrow('An airmass lies between 1 and 31.7.')
    expect(() => visibility({ ...asked, moon: { maxIllumination: 2 } })).toThrow('between 0 and 1')
    expect(() => visibility({ ...asked, moon: { minSeparationDeg: -1 } })).toThrow('between 0° and 180°')
    expect(() => visibility({ ...asked, twilightLimitDeg: 5 })).toThrow('between −90° and 0°')
    expect(() => visibility({ ...asked, targets: [{ ...target, raDeg: 360 }] })).toThrow('right ascension')
    expect(() => visibility({ ...asked, targets: [{ ...target, decDeg: -91 }] })).toThrow('declination')
    expect(() => positionsAt({ site, targets: [target], instants: [new Date(NaN)] })).toThrow('not a moment')
    expect(() => sunAltitudeDeg(site, new Date('nonsense'))).toThrow('not a moment in time')
    expect(() => moonPhases(new Date('2027-01-02'), new Date('2027-01-01'))).toThrow('first date first')
  })
})
