import { describe, expect, it } from 'vitest'
import {
  plannedInWords,
  termsInWords,
  visitSuggestedInWords,
  whyNotInWords,
} from '@/components/nights/nightsWords'
import type { NightsLine } from '@/lib/domain/decisions/nightsView'
import { eveningsInWords } from '@/lib/domain/visits/eveningsInWords'
import { eveningsText, eveningsTyped } from '@/lib/domain/visits/readEvenings'
import { visitInWords } from '@/lib/domain/wishes/visitWords'

// Seen to fail with runs of nights not joined, with halves taken for nights, and with the source of the least left out.

const h = 3600
const why = (whyNot: Partial<NonNullable<NightsLine['whyNot']>>, leastBy: NightsLine['leastBy'] = 'half') =>
  whyNotInWords({
    whyNot: { reason: 'too-little-left', left: 4 * h, displaces: [], nights: null, ...whyNot },
    ...{ leastSeconds: 10 * h, leastBy, assessment: null },
  })
const halves = (text: string) => eveningsTyped.parse(text)

describe('why a visit has no nights', () => {
  it('tells nights that do not suit it from nights that others have', () => {
    expect(why({ reason: 'below-line' })).toBe('below the line: visits are given nights down to it')
    expect(why({ reason: 'no-nights', nights: { most: 1, least: 2 } })).toBe(
      'one night suits its visit, two nights are the least',
    )
    expect(why({ reason: 'no-nights', nights: { most: 0, least: 1 } })).toBe(
      'no night suits its visit, one night is the least',
    )
    expect(
      why({
        reason: 'nights-taken',
        nights: { most: 3, least: 3 },
        displaces: [{ reviewNumber: '14-071', seconds: 20 * h }],
      }),
    ).toBe('other visits have its nights, three nights are the least; displaces 20.0\u00a0h of 14-071')
  })

  it('names who says what is the least', () => {
    expect(why({}, 'chair')).toBe('4.0\u00a0h left, 10.0\u00a0h is the least, as the chair set')
    expect(why({}, 'investigators')).toBe('4.0\u00a0h left, 10.0\u00a0h is the least, as they say')
  })
})

describe('the nights of a visit', () => {
  it('are typed with commas, and read back the same', () => {
    const text = '2027-08-03, 2027-08-04, 2027-08-09 first'
    expect(halves(text)).toHaveLength(5)
    expect(eveningsText(halves(text))).toBe(text)
    expect(eveningsText(halves('2027-08-04 second; 2027-08-03, 2027-08-04 first'))).toBe(
      '2027-08-03, 2027-08-04',
    )
    expect(halves('')).toEqual([])
  })

  it('are joined in words where they follow one another in the same part', () => {
    expect(eveningsInWords(halves('2027-08-03, 2027-08-04, 2027-08-05, 2027-08-09 first'))).toBe(
      'the nights of 3 August 2027 to 5 August 2027 and the first half of the night of 9 August 2027',
    )
    expect(eveningsInWords(halves('2027-08-31 second, 2027-09-01 second, 2027-09-02'))).toBe(
      'the second halves of the nights of 31 August 2027 to 1 September 2027 and the night of 2 September 2027',
    )
  })

  it('are said with how many were asked for, where they are fewer', () => {
    const visit = { nights: 2, part: 'whole' as const, together: true }
    expect(visitInWords(visit)).toBe('two nights in a row')
    expect(visitInWords({ nights: 1, part: 'first', together: true })).toBe('one first half of a night')
    expect(visitSuggestedInWords({ suggestedEvenings: '2027-08-03', visit })).toBe(
      ', visit on 2027-08-03, one of two nights',
    )
    expect(visitSuggestedInWords({ suggestedEvenings: '2027-08-03, 2027-08-04', visit })).toBe(
      ', visit on 2027-08-03, 2027-08-04',
    )
    expect(
      termsInWords({ isReserve: false, service: 'visitor', evenings: '2027-08-03 first', conditions: '' }),
    ).toBe(', visitor on 2027-08-03 first')
    expect(
      plannedInWords(
        { plannedSeconds: 60 * h, visitSeconds: 20 * h, heldSeconds: 0, heldReason: '' },
        { isRecorded: true, lostShare: 0 },
      ),
    ).toBe('60.0\u00a0h to plan with: no weather counted, 20.0\u00a0h for visits.')
  })
})
