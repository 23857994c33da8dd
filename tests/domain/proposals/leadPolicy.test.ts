import { describe, expect, it } from 'vitest'
import type { Decision } from '@/lib/auth/decision'
import { mayAskForWaiver } from '@/lib/domain/fees/policy'
import { cannotLead, mayAnswerLeadOffer, mayOfferLead } from '@/lib/domain/proposals/leadPolicy'
import {
  mayEditProposal,
  mayManagePeople,
  mayPutAway,
  mayReadProposal,
  maySendProposal,
} from '@/lib/domain/proposals/policy'
import { mayReopenProposal, mayWithdrawProposal } from '@/lib/domain/submission/policy'
import { actorOf, investigator, subjectWith } from '../../support/proposalSubject'

const word = (decision: Decision) => (decision.allowed ? 'yes' : decision.because)
const during = new Date('2027-03-18T02:14:07Z')
const who = { pi: actorOf(1), editor: actorOf(3), deputy: actorOf(4), stranger: actorOf(9) }

// Seen to fail: with a deputy let in, and with the state not asked.
describe('asking somebody else to lead', () => {
  it.each<[keyof typeof who, string]>([
    ['pi', 'yes'],
    ['deputy', 'role'],
    ['editor', 'role'],
    ['stranger', 'unseen'],
  ])('%s: %s', (name, expected) => {
    expect(word(mayOfferLead(who[name], subjectWith()))).toBe(expected)
  })

  it.each([
    ['draft', 'yes'],
    ['submitted', 'yes'],
    ['under-review', 'yes'],
    ['awarded', 'yes'],
    ['reserve', 'yes'],
    ['declined', 'window'],
    ['withdrawn', 'window'],
    ['lapsed', 'window'],
  ] as const)('in state %s: %s', (state, expected) => {
    expect(word(mayOfferLead(who.pi, subjectWith({ state })))).toBe(expected)
    expect(word(mayAnswerLeadOffer(who.editor, subjectWith({ state }), 3))).toBe(expected)
  })

  it('is answered by the one asked alone', () => {
    expect(word(mayAnswerLeadOffer(who.editor, subjectWith(), 3))).toBe('yes')
    expect(word(mayAnswerLeadOffer(who.editor, subjectWith(), 4))).toBe('role')
    expect(word(mayAnswerLeadOffer(who.editor, subjectWith(), null))).toBe('role')
    expect(word(mayAnswerLeadOffer(who.stranger, subjectWith(), 9))).toBe('unseen')
  })

  it('goes to somebody who has agreed', () => {
    expect(cannotLead(investigator(3))).toBeNull()
    expect(cannotLead(investigator(3, { confirmedAt: null }))).toContain('has yet to agree')
    expect(cannotLead(investigator(1, { role: 'pi' }))).toContain('leads the proposal already')
  })
})

// Seen to fail: with the agreement not asked in `mayLead`, and in `mayAct`.
describe('somebody named who has yet to agree', () => {
  const people = [investigator(1, { role: 'pi' }), investigator(4, { access: 'deputy', confirmedAt: null })]
  const draft = subjectWith({ people })
  const sent = subjectWith({ people, state: 'submitted' })
  it('reads, and does nothing else, whatever was meant for them', () => {
    expect(word(mayReadProposal(who.deputy, draft))).toBe('yes')
    const refused = [
      mayEditProposal(who.deputy, draft, during),
      maySendProposal(who.deputy, draft, during),
      mayManagePeople(who.deputy, draft, during),
      mayPutAway(who.deputy, draft),
      mayReopenProposal(who.deputy, sent, during),
      mayWithdrawProposal(who.deputy, sent),
      mayAskForWaiver(who.deputy, sent),
    ]
    expect(refused.map(word)).toEqual(refused.map(() => 'role'))
    expect(refused.map((one) => (one.allowed ? '' : one.sentence))).toEqual(
      refused.map(() => 'Agree to be named first, under People.'),
    )
  })
})

describe('a deputy who has agreed', () => {
  it('sends, reopens, withdraws, names people, puts away and asks for a waiver', () => {
    const sent = subjectWith({ state: 'submitted' })
    expect([
      word(maySendProposal(who.deputy, subjectWith(), during)),
      word(mayManagePeople(who.deputy, subjectWith(), during)),
      word(mayPutAway(who.deputy, subjectWith())),
      word(mayReopenProposal(who.deputy, sent, during)),
      word(mayWithdrawProposal(who.deputy, sent)),
      word(mayAskForWaiver(who.deputy, sent)),
    ]).toEqual(Array(6).fill('yes'))
  })

  it('does what an editor may not', () => {
    const sent = subjectWith({ state: 'submitted' })
    expect([
      word(maySendProposal(who.editor, subjectWith(), during)),
      word(mayReopenProposal(who.editor, sent, during)),
      word(mayWithdrawProposal(who.editor, sent)),
    ]).toEqual(['role', 'role', 'role'])
  })
})
