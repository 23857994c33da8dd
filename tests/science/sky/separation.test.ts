import { describe, expect, it } from 'vitest'
import { separationArcsec } from '@/lib/science/sky'
import reference from '../../reference/separation.json'

// Seen to fail: with the angles left in degrees, and with the arc cosine of the dot product, which has no small angles.
describe('independent code', () => {
  // Astropy's Vincenty formula; both work in doubles on angles of up to 360 degrees, whose last digit is 2e-10 arcsec.
  it.each(reference.rows)('$a and $b', ({ a, b, arcsec }) => {
    expect(Math.abs(separationArcsec(a, b) - arcsec)).toBeLessThan(1e-9 + 1e-12 * arcsec)
  })
})
