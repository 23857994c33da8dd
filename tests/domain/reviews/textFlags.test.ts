import { describe, expect, it } from 'vitest'
import type { KnownNames } from '@/lib/domain/reviews/namePlaces'
import { textFlags } from '@/lib/domain/reviews/textFlags'

const nobody: KnownNames = { people: [], institutes: [] }
const flags = (text: string, score: number | null = null, readers: KnownNames = nobody) =>
  textFlags(text, { score, readers }).map(({ kind, words }) => [kind, words])

describe('textFlags', () => {
  it.each([
    ['As we have shown, our sample is larger.', 'gives-away', ['As we have shown', 'our sample']],
    [
      'This is nonsense, and a waste of telescope time!!',
      'tone',
      ['nonsense', 'waste of telescope time', '!!'],
    ],
    ['She leaves the completeness open; a junior PI should ask.', 'person', ['She', 'junior PI']],
    ['Reviewer 3 scored it 7.5 and it ranked 12.', 'scores', ['Reviewer 3', 'scored it 7.5', 'ranked 12']],
  ])('%s', (text, kind, words) => {
    expect(flags(text)).toEqual(words.map((found) => [kind, found]))
  })

  it.each([
    'The line is weak in the third target; a deeper exposure would show it.',
    'The sample is small, but each object answers the question by itself.',
    'The theory behind this measurement is clear. Other surveys reach 20 targets in 10 nights.',
    'There is nothing here that the hours do not cover: 7.5 h are asked for 12 objects.',
  ])('leaves plain words alone: %s', (text) => {
    expect(flags(text, 6, { people: ['Ada Holm'], institutes: ['Ostbury College'] })).toEqual([])
  })

  it('finds blame beside a high score and praise beside a low one, and neither where both stand', () => {
    const blame = 'The method is flawed.'
    const praise = 'An outstanding idea.'
    expect(flags(blame, 8)).toEqual([['contradicts', 'flawed']])
    expect(flags(blame, 5)).toEqual([])
    expect(flags(praise, 3)).toEqual([['contradicts', 'outstanding']])
    expect(flags(praise, 9)).toEqual([])
    expect(flags(`${praise} ${blame}`, 9)).toEqual([])
    expect(flags('It is not compelling.', 2)).toEqual([])
    expect(flags(blame, null)).toEqual([])
  })

  it('finds readers by family name and institutes by their whole name, as whole words', () => {
    const readers = { people: ['Ada Holm', 'Jo (O.) Li+'], institutes: ['Ostbury College'] }
    expect(flags('Holm and others at Ostbury College did this.', null, readers)).toEqual([
      ['names', 'Holm'],
      ['names', 'Ostbury College'],
    ])
    expect(flags('A college at Ostbury, and Holmgren.', null, readers)).toEqual([])
  })

  it('says where, in the order of the text', () => {
    const text = 'Rubbish. It scored 3, as we showed.'
    const found = textFlags(text, { score: null, readers: nobody })
    expect(found.map(({ at, words }) => text.slice(at, at + words.length) === words)).toEqual([
      true,
      true,
      true,
    ])
    expect(found.map(({ at }) => at)).toEqual([...found.map(({ at }) => at)].sort((a, b) => a - b))
  })
})
