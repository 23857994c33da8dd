import { describe, expect, it } from 'vitest'
import type { Actor } from '@/lib/domain/actor'
import {
  canAnswerQuestion,
  canAssess,
  canSeeRequest,
  type AnswerFacts,
  type RequestFacts,
} from '@/lib/domain/assessments/policy'

const at = (day: number) => new Date(Date.UTC(2027, 4, day))
const scientist = (instrumentId: number | null): Actor => ({
  personId: 7,
  name: 'S',
  email: 's@x.example',
  timeZone: 'UTC',
  grants: [{ role: 'instrument-scientist', callId: null, panelId: null, instrumentId }],
})
const base: RequestFacts = {
  instrumentId: 2,
  proposalState: 'submitted',
  call: { stage: 'published', opensAt: at(1), closesAt: at(5) },
  isBarred: false,
  now: at(8),
}
const said = (decision: ReturnType<typeof canAssess>) => (decision.allowed ? 'yes' : decision.because)

describe('policies of a request', () => {
  it.each([
    ['own instrument', scientist(2), {}, 'yes', 'yes'],
    ['every instrument', scientist(null), {}, 'yes', 'yes'],
    ['another instrument', scientist(3), {}, 'unseen', 'unseen'],
    ['an interest', scientist(2), { isBarred: true }, 'unseen', 'unseen'],
    ['withdrawn', scientist(2), { proposalState: 'withdrawn' as const }, 'unseen', 'unseen'],
    ['a draft', scientist(2), { proposalState: 'draft' as const }, 'unseen', 'unseen'],
    [
      'a moment before the deadline',
      scientist(2),
      { now: new Date(at(5).getTime() - 1) },
      'unseen',
      'unseen',
    ],
    ['at the deadline', scientist(2), { now: at(5) }, 'yes', 'yes'],
    ['in review', scientist(2), { call: { ...base.call, stage: 'review' as const } }, 'yes', 'yes'],
    ['ranking', scientist(2), { call: { ...base.call, stage: 'ranking' as const } }, 'yes', 'window'],
    ['archived', scientist(2), { call: { ...base.call, stage: 'archived' as const } }, 'unseen', 'unseen'],
  ])('%s', (_, actor, over, see, assess) => {
    const facts = { ...base, ...over }
    expect([said(canSeeRequest(actor, facts)), said(canAssess(actor, facts))]).toEqual([see, assess])
  })
})

describe('canAnswerQuestion', () => {
  const person = {
    personId: 7,
    role: 'co-investigator' as const,
    access: 'edit' as const,
    confirmedAt: at(1),
  }
  const facts: AnswerFacts = { people: [person], call: base.call, proposalState: 'submitted', now: at(8) }
  it.each([
    ['who may edit', {}, 'yes'],
    ['who may only read', { people: [{ ...person, access: 'read' as const }] }, 'role'],
    [
      'the principal investigator',
      { people: [{ ...person, role: 'pi' as const, access: 'read' as const }] },
      'yes',
    ],
    ['who has yet to agree', { people: [{ ...person, confirmedAt: null }] }, 'role'],
    ['a stranger', { people: [{ ...person, personId: 8 }] }, 'unseen'],
    ['someone without an account', { people: [{ ...person, personId: null }] }, 'unseen'],
    ['withdrawn', { proposalState: 'withdrawn' as const }, 'window'],
    ['ranking', { call: { ...base.call, stage: 'ranking' as const } }, 'window'],
  ])('%s', (_, over, expected) => {
    expect(said(canAnswerQuestion(scientist(2), { ...facts, ...over }))).toBe(expected)
  })
})
