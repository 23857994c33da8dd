import { describe, expect, it } from 'vitest'
import { clashes, type Claim } from '@/lib/domain/observations/clashes'
import { claimsOf, heldBy } from '@/lib/domain/observations/heldBy'
import { observation, slitMode, target } from '../../support/contents'

const claim = (over: Partial<Claim> = {}): Claim => ({
  raDeg: 53.1,
  decDeg: -27.8,
  modeId: 7,
  seconds: 3600,
  ...over,
})
const arcsec = 1 / 3600

// Seen to fail: with right ascension compared without the cosine of declination, with any mode, and with `>` for `>=`.
describe('whether a request is held already', () => {
  it.each<[string, Partial<Claim>, boolean]>([
    ['the same', {}, true],
    ['4.9″ north', { decDeg: -27.8 + 4.9 * arcsec }, true],
    ['5.1″ north', { decDeg: -27.8 + 5.1 * arcsec }, false],
    // One arcsecond of right ascension is 0.885″ on the sky at -27.8 degrees.
    ['5.5″ of right ascension east', { raDeg: 53.1 + 5.5 * arcsec }, true],
    ['5.8″ of right ascension east', { raDeg: 53.1 + 5.8 * arcsec }, false],
    ['another mode', { modeId: 8 }, false],
    ['half the time', { seconds: 1800 }, true],
    ['less than half the time', { seconds: 1799 }, false],
    ['longer', { seconds: 36_000 }, true],
    ['nothing at all', { seconds: 0 }, false],
  ])('%s', (_, over, expected) => {
    expect(clashes(claim(), claim(over))).toBe(expected)
  })

  it('holds across the meridian of 0 h', () => {
    const [east, west] = [claim({ raDeg: 0.0005, decDeg: 0 }), claim({ raDeg: 359.9995, decDeg: 0 })]
    expect(clashes(east, west)).toBe(true)
  })
})

describe('what a proposal holds', () => {
  const targets = [target({ id: 11, raDeg: 53.1, decDeg: -27.8 }), target({ id: 12, raDeg: null })]
  const observations = [
    { ...observation({ id: 1, targetId: 11, modeId: 7 }), askedSeconds: 7200 },
    { ...observation({ id: 2, targetId: 12, modeId: 7 }), askedSeconds: 7200 },
    { ...observation({ id: 3, targetId: 11, modeId: 8 }), askedSeconds: 3600 },
  ]
  const other = { ...slitMode, modeId: 8, instrument: { id: 4, slug: 'ember', name: 'EMBER' } }
  const said = { targets, observations, modes: [slitMode, other] }

  it('leaves out what has no position', () => {
    expect(claimsOf(said).map(({ observationId }) => observationId)).toEqual([1, 3])
  })

  it('is cut to the share each instrument was given', () => {
    // 7,200 s of the 14,400 s asked of instrument 3, and nothing of instrument 4.
    const held = heldBy(said, [{ instrumentId: 3, seconds: 7200 }])
    expect(held.map(({ modeId, seconds }) => [modeId, seconds])).toEqual([
      [7, 3600],
      [8, 0],
    ])
  })

  it('is never more than was asked', () => {
    expect(heldBy(said, [{ instrumentId: 3, seconds: 99_999 }])[0]?.seconds).toBe(7200)
  })
})
