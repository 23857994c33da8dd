import { describe, expect, it } from 'vitest'
import { seasonSchema, type SeasonInput } from '@/lib/domain/tools/schema'

const asked: SeasonInput = {
  ra: '00 50 27.83',
  dec: '−17 40 08.8',
  airmass: '1.8',
  from: '2027-07-01',
  to: '2027-12-31',
  moon: 'any',
  separation: '30',
  telescope: 'fennel',
}
const sentences = (change: Partial<Record<keyof SeasonInput, string>>): Record<string, string> => {
  const result = seasonSchema.safeParse({ ...asked, ...change })
  return Object.fromEntries(
    (result.error?.issues ?? []).map(({ path, message }) => [path.join('.'), message]),
  )
}

// Seen to fail with 31 February read as 3 March.
describe('a season as asked', () => {
  it('is taken as it stands', () => {
    expect(sentences({})).toEqual({})
    expect(sentences({ from: '2028-02-29', to: '2028-02-29' })).toEqual({})
  })

  it.each<[Partial<Record<keyof SeasonInput, string>>, Record<string, string>]>([
    [{ from: '2027-02-31' }, { from: 'Write a date as 2027-08-01.' }],
    [{ telescope: 'x'.repeat(41) }, { telescope: 'There is no such telescope.' }],
    [{ from: '1 July' }, { from: 'Write a date as 2027-08-01.' }],
    [
      { from: '1750-01-01', to: '1750-02-01' },
      {
        from: 'Sun and Moon are computed from 1900 to 2100.',
        to: 'Sun and Moon are computed from 1900 to 2100.',
      },
    ],
    [{ to: '2027-06-30' }, { to: 'The last evening comes before the first.' }],
    [{ to: '2029-01-01' }, { to: 'At most 400 nights at once.' }],
    [{ ra: '25:61:00' }, { ra: expect.stringMatching(/60|24h/) as unknown as string }],
    [{ separation: '200' }, { separation: 'A distance from the Moon lies between 0 and 180.' }],
    [{ airmass: 'low' }, { airmass: 'An airmass is a number.' }],
  ])('%o is answered at its field', (change, expected) => {
    expect(sentences(change)).toEqual(expected)
  })
})
