import { describe, expect, it } from 'vitest'
import type { Actor } from '@/lib/domain/actor'
import {
  canOpenReview,
  canReopenReview,
  canSeeReview,
  canWriteReview,
  type ReviewFacts,
} from '@/lib/domain/reviews/policy'

const at = (day: number) => new Date(Date.UTC(2027, 4, day))
const reviewer: Actor = {
  personId: 7,
  name: 'R',
  email: 'r@x.example',
  timeZone: 'UTC',
  grants: [{ role: 'reviewer', callId: 3, panelId: 4, instrumentId: null }],
}
const base: ReviewFacts = {
  assignment: { personId: 7, panelId: 4, finishedAt: null, withdrawnAt: null },
  proposalState: 'under-review',
  call: {
    id: 3,
    stage: 'review',
    opensAt: at(1),
    closesAt: at(5),
    reviewsDueAt: at(10),
    panelMeetsAt: at(15),
  },
  isBarred: false,
  hasDeclared: true,
  now: at(8),
}
const withCall = (over: Partial<ReviewFacts['call']>, now = 8) => ({
  call: { ...base.call, ...over },
  now: at(now),
})
const grant = (over: object): Actor => ({
  ...reviewer,
  grants: [{ role: 'reviewer', callId: 3, panelId: 4, instrumentId: null, ...over }],
})
const finished = { assignment: { ...base.assignment, finishedAt: at(7) } }

// see, open, write, reopen: yes, or the named no.
const table: [string, Actor, Partial<ReviewFacts>, [string, string, string, string]][] = [
  ['one’s own, declared', reviewer, {}, ['yes', 'yes', 'yes', 'window']],
  ['not declared', reviewer, { hasDeclared: false }, ['yes', 'conflict', 'conflict', 'conflict']],
  ['an interest', reviewer, { isBarred: true }, ['unseen', 'unseen', 'unseen', 'unseen']],
  [
    'an interest, not declared',
    reviewer,
    { isBarred: true, hasDeclared: false },
    ['unseen', 'unseen', 'unseen', 'unseen'],
  ],
  ['someone else’s', { ...reviewer, personId: 8 }, {}, ['unseen', 'unseen', 'unseen', 'unseen']],
  [
    'taken back',
    reviewer,
    { assignment: { ...base.assignment, withdrawnAt: at(7) } },
    ['unseen', 'unseen', 'unseen', 'unseen'],
  ],
  ['proposal withdrawn', reviewer, { proposalState: 'withdrawn' }, ['unseen', 'unseen', 'unseen', 'unseen']],
  ['proposal lapsed', reviewer, { proposalState: 'lapsed' }, ['unseen', 'unseen', 'unseen', 'unseen']],
  ['another role', grant({ role: 'chair' }), {}, ['unseen', 'unseen', 'unseen', 'unseen']],
  ['reviewer of another call', grant({ callId: 9 }), {}, ['unseen', 'unseen', 'unseen', 'unseen']],
  ['reviewer of another panel', grant({ panelId: 9 }), {}, ['unseen', 'unseen', 'unseen', 'unseen']],
  ['call open', reviewer, withCall({ stage: 'published' }, 4), ['unseen', 'unseen', 'unseen', 'unseen']],
  ['call archived', reviewer, withCall({ stage: 'archived' }), ['unseen', 'unseen', 'unseen', 'unseen']],
  ['call decided', reviewer, withCall({ stage: 'decided' }), ['yes', 'yes', 'window', 'window']],
  ['panel met', reviewer, withCall({}, 15), ['yes', 'yes', 'window', 'window']],
  ['finished', reviewer, finished, ['yes', 'yes', 'window', 'yes']],
  ['finished, due', reviewer, { ...finished, now: at(10) }, ['yes', 'yes', 'window', 'window']],
]

describe('policies of a review', () => {
  it.each(table)('%s', (_, actor, over, expected) => {
    const facts = { ...base, ...over }
    const answers = [canSeeReview, canOpenReview, canWriteReview, canReopenReview].map((policy) => {
      const decision = policy(actor, facts)
      return decision.allowed ? 'yes' : decision.because
    })
    expect(answers).toEqual(expected)
  })
})
