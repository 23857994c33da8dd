import { expect, it } from 'vitest'
import { suggestionWords, type SolvedSuggestion } from '@/lib/domain/assignments/suggestionWords'

const best: SolvedSuggestion = {
  meanPages: 23.5,
  tolerancePages: 6,
  outside: [],
  worst: { value: 2.5, bound: 2.5 },
  sum: { value: 80, bound: 80 },
  worstNumber: '4-12',
  readers: 3,
  whyNotLinked: null,
}
const known = { silent: 0, strange: [] }
const loads = { leastPages: 21, mostPages: 26 }

it.each([
  [
    'the best there is',
    { pairs: [], short: [], loads, known, best },
    'Loads from 21 to 26 pages; wanted 23.5 within 6; 4-12 is served worst, with an affinity of 2.50 of 3; no assignment serves them better.',
  ],
  [
    'a gap, a load outside, a group apart and readers lacking',
    {
      pairs: [],
      short: [{ reviewNumber: '4-07', lacking: 1 }],
      loads,
      known: { silent: 2, strange: ['4-09', '4-12'] },
      best: {
        ...best,
        sum: { value: 76, bound: 80 },
        outside: [{ name: 'Ada Thorn', pages: 40 }],
        whyNotLinked: 'The interests leave no proposal.',
      },
    },
    'Loads from 21 to 26 pages; wanted 23.5 within 6; 4-12 is served worst, with an affinity of 2.50 of 3; within 5\u00a0% of what no assignment can exceed; outside those loads Ada Thorn (40 pages); not all reviewers are linked by shared proposals (the interests leave no proposal); nobody who may read them knows the subject of 4-09 and 4-12; two reviewers have not said what they know and count as knowing none of it; too few may read 4-07 (1 short).',
  ],
  [
    'no answer of the solver',
    {
      pairs: [],
      short: [],
      loads,
      known: { silent: 1, strange: [] },
      best: { why: 'No answer was found in 30 seconds.' },
    },
    'Loads from 21 to 26 pages; dealt out one proposal after the other, as the solver gave no answer (no answer was found in 30 seconds); one reviewer has not said what they know and counts as knowing none of it.',
  ],
  [
    'nothing said of what they know',
    { pairs: [], short: [], loads, known: null, best },
    'Loads from 21 to 26 pages; wanted 23.5 within 6; no assignment serves them better; no reviewer has said what they know, so the loads decide.',
  ],
])('says in one sentence: %s', (_what, suggestion, words) => {
  expect(suggestionWords(suggestion)).toBe(words)
})
