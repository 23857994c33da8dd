import { describe, expect, it } from 'vitest'
import { MOST_ROWS, parseRedshifts } from '@/lib/domain/tools/yardstick/parseRedshifts'

// Seen to fail with the rounding of ranges left out, with `>=` of the last redshift as `>`, and with the count of
// what is beyond left out.

describe('a list of redshifts', () => {
  it.each([
    ['0.407\n0.657\n1.29', [0.407, 0.657, 1.29]],
    ['1 2 3', [1, 2, 3]],
    ['1, 2;3 | 4\t5', [1, 2, 3, 4, 5]],
    ['redshift\n0.5\n0.5', [0.5, 0.5]],
    ['z = 3', [3]],
    ['0.1..0.5 step 0.1', [0.1, 0.2, 0.3, 0.4, 0.5]],
    ['0.1..0.5 by 0.15 2', [0.1, 0.25, 0.4, 2]],
    ['−0.5 0', [-0.5, 0]],
    ['1100 999999998', [1100, 999_999_998]],
  ])('reads %j', (text, redshifts) => {
    expect(parseRedshifts(text)).toEqual({ redshifts, troubles: [], beyond: 0 })
  })

  it.each([
    ['', 'Give a redshift, one a line, or a range such as 0.1..2 step 0.1.'],
    ['NaN', 'NaN: a redshift is a number, such as 0.158.'],
    ['Infinity', 'Infinity: a redshift is finite.'],
    ['-inf', '-inf: a redshift is finite.'],
    ['1e9', '1e9: the engine stops before z = 10⁹.'],
    ['-1', '-1: a redshift lies above −1.'],
    ['-7', '-7: a redshift lies above −1.'],
    ['0,158', '0,158: write 0.158 with a point, or part two redshifts with a space.'],
    ['0.1..5', '0.1..5: a range needs a step, 0.1..2 step 0.1.'],
    ['5..1 step 1', '5..1 step 1: a range goes from the smaller to the larger redshift.'],
    ['0..1 step 0', '0..1 step 0: the step must be above 0.'],
    ['0..1e10 step 1', '0..1e10 step 1: the engine stops before z = 10⁹.'],
  ])('says what is wrong with %j', (text, sentence) => {
    expect(parseRedshifts(text)).toEqual({ redshifts: [], troubles: [sentence], beyond: 0 })
  })

  it('keeps what can be read beside what cannot', () => {
    const read = parseRedshifts('0.5\nabout 2\n1.5')
    expect(read.redshifts).toEqual([0.5, 2, 1.5])
    expect(read.troubles).toEqual(['about: a redshift is a number, such as 0.158.'])
  })

  it('says at most five sentences', () => {
    expect(parseRedshifts('a b c d e f g h').troubles).toHaveLength(5)
  })

  it.each(['\n', ' ', ','])(
    'counts hundreds of thousands of values parted by %j, and shows a thousand',
    (mark) => {
      const read = parseRedshifts(Array.from({ length: 300_000 }, (_, i) => (i / 3e5).toFixed(6)).join(mark))
      expect(read.redshifts).toHaveLength(MOST_ROWS)
      expect(read.beyond).toBe(299_000)
      expect(read.troubles[0]).toMatch(
        /1,000 redshifts are shown and 299,000 more are not.*\/api\/v1\/cosmology/,
      )
    },
  )

  it('counts a long range without making it', () => {
    expect(parseRedshifts('0..1000 step 1e-6')).toMatchObject({ beyond: 999_999_001 })
  })
})
