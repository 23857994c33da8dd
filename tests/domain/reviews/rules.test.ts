import { describe, expect, it } from 'vitest'
import { givesAway } from '@/lib/domain/reviews/giveawayWords'
import {
  partsScored,
  reviewGaps,
  weightedMean,
  whyNotReopened,
  whySheetIsShut,
} from '@/lib/domain/reviews/rules'

const sheet = (...scores: (number | null)[]) =>
  scores.map((halfPoints, index) => ({
    id: index + 1,
    title: `C${index + 1}`,
    weight: 4 - index,
    halfPoints,
  }))

describe('weightedMean', () => {
  it.each([
    [[16, 15, 14, null], 7.611],
    [[null, null, null, null], null],
    [[0, null, null, null], 0],
    [[20, 20, 20, 20], 10],
  ] as const)('%j is %s', (scores, mean) => {
    const result = weightedMean(sheet(...scores))
    if (mean === null) expect(result).toBeNull()
    else expect(result).toBeCloseTo(mean, 3)
  })

  it('counts the parts scored', () => {
    expect(partsScored(sheet(16, 15, 14, null))).toEqual({ scored: 9, all: 10 })
  })
})

describe('reviewGaps', () => {
  const long = 'The sample is small, but each object answers it alone.'
  it.each([
    ['whole', sheet(1, 2), long, []],
    ['a criterion open', sheet(1, null), long, ['score-2']],
    ['a score of nought is a score', sheet(0, 0), long, []],
    ['no text', sheet(1, 2), '   ', ['investigators']],
    ['49 characters', sheet(1, 2), 'x'.repeat(49), ['investigators']],
    ['50 characters', sheet(1, 2), 'x'.repeat(50), []],
    ['blanks do not count', sheet(1, 2), `${'x'.repeat(49)}   `, ['investigators']],
  ])('%s', (_, criteria, text, fields) => {
    expect(Object.keys(reviewGaps(criteria, text))).toEqual(fields)
  })
})

const at = (day: number) => new Date(Date.UTC(2027, 4, day))
const call = {
  stage: 'review' as const,
  opensAt: at(1),
  closesAt: at(5),
  reviewsDueAt: at(10),
  panelMeetsAt: at(15),
}

describe('whySheetIsShut', () => {
  it.each([
    ['in time', call, null, 8, null],
    ['late, before the panel meets', call, null, 12, null],
    ['exactly when the panel meets', call, null, 15, 'The panel is meeting'],
    ['finished', call, at(7), 8, 'This review is finished'],
    ['published and closed', { ...call, stage: 'published' as const }, null, 8, null],
    ['the call still open', { ...call, stage: 'published' as const }, null, 4, 'Reviews begin'],
    ['ranking', { ...call, stage: 'ranking' as const }, null, 8, 'The panel has met'],
  ])('%s', (_, given, finished, day, start) => {
    const why = whySheetIsShut(given, finished, at(day))
    if (start === null) expect(why).toBeNull()
    else expect(why).toContain(start)
  })
})

describe('whyNotReopened', () => {
  it.each([
    ['before it is due', at(7), 8, null],
    ['at the due moment', at(7), 10, 'Reviews were due'],
    ['not finished', null, 8, 'open already'],
  ])('%s', (_, finished, day, start) => {
    const why = whyNotReopened(call, finished, at(day))
    if (start === null) expect(why).toBeNull()
    else expect(why).toContain(start)
  })
})

describe('givesAway', () => {
  it.each([
    ['As we have shown, the lenses are few.', ['As we have shown']],
    ['This repeats my recent work.', ['my recent work']],
    ['We published in this journal that it fails.', ['We published in']],
    ['The sample answers the question.', []],
    ['Show your results by band.', []],
  ])('%s', (text, found) => {
    expect(givesAway(text)).toEqual(found)
  })
})
