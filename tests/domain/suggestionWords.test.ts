import { expect, it } from 'vitest'
import { suggestionWords, type SolvedSuggestion } from '@/lib/domain/assignments/suggestionWords'

const best: SolvedSuggestion = {
  meanPages: 23.5,
  tolerancePages: 6,
  outside: [],
  worst: { value: 2.5, bound: 2.5 },
  sum: { value: 80, bound: 80 },
  readers: 3,
  whyNotLinked: null,
}
const loads = { leastPages: 21, mostPages: 26 }

it.each([
  [
    'the best there is',
    { pairs: [], short: [], loads, best },
    'Loads from 21 to 26 pages; wanted 23.5 within 6; the proposal served worst has an affinity of 2.50 of 3; no assignment serves them better.',
  ],
  [
    'a gap, a load outside, a group apart and readers lacking',
    {
      pairs: [],
      short: [{ reviewNumber: '4-07', lacking: 1 }],
      loads,
      best: {
        ...best,
        sum: { value: 76, bound: 80 },
        outside: [{ name: 'Ada Thorn', pages: 40 }],
        whyNotLinked: 'The interests leave no proposal.',
      },
    },
    'Loads from 21 to 26 pages; wanted 23.5 within 6; the proposal served worst has an affinity of 2.50 of 3; within 5\u00a0% of what no assignment can exceed; outside those loads Ada Thorn (40 pages); not all reviewers are linked by shared proposals (the interests leave no proposal); too few may read 4-07 (1 short).',
  ],
  [
    'no answer of the solver',
    { pairs: [], short: [], loads, best: { why: 'No answer was found in 30 seconds.' } },
    'Loads from 21 to 26 pages; dealt out one proposal after the other, as the solver gave no answer (no answer was found in 30 seconds).',
  ],
])('says in one sentence: %s', (_what, suggestion, words) => {
  expect(suggestionWords(suggestion)).toBe(words)
})
