import { describe, expect, it } from 'vitest'
import {
  mayEditProposal,
  mayManagePeople,
  mayReadProposal,
  maySendProposal,
} from '@/lib/domain/proposals/policy'
import type { Decision } from '@/lib/auth/decision'
import { actorOf, closesAt, opensAt, subjectWith } from '../../support/proposalSubject'

// Seen to fail: letting readers act, and `<=` for `<` at the deadline, each break rows here.
const during = new Date('2027-03-18T02:14:07Z')
const word = (decision: Decision) => (decision.allowed ? 'yes' : decision.because)

const who = {
  pi: actorOf(1),
  reader: actorOf(2),
  editor: actorOf(3),
  deputy: actorOf(4),
  stranger: actorOf(9),
  office: actorOf(8, 'office'),
  reviewer: actorOf(7, 'reviewer', 'chair', 'instrument-scientist'),
}

describe('who may do what with a draft in an open call', () => {
  it.each<[keyof typeof who, string, string, string, string]>([
    //             read      edit      send      people
    ['pi', 'yes', 'yes', 'yes', 'yes'],
    ['deputy', 'yes', 'yes', 'yes', 'yes'],
    ['editor', 'yes', 'yes', 'role', 'role'],
    ['reader', 'yes', 'role', 'role', 'role'],
    ['office', 'yes', 'role', 'role', 'role'],
    ['stranger', 'unseen', 'unseen', 'unseen', 'unseen'],
    ['reviewer', 'unseen', 'unseen', 'unseen', 'unseen'],
  ])('%s', (name, read, edit, send, people) => {
    const subject = subjectWith()
    expect(word(mayReadProposal(who[name], subject))).toBe(read)
    expect(word(mayEditProposal(who[name], subject, during))).toBe(edit)
    expect(word(maySendProposal(who[name], subject, during))).toBe(send)
    expect(word(mayManagePeople(who[name], subject, during))).toBe(people)
  })
})

describe('when the principal investigator may change it', () => {
  const moment = (iso: string) => new Date(iso)
  it.each([
    ['as the call opens', {}, opensAt, 'yes'],
    ['a moment before it opens', {}, new Date(opensAt.getTime() - 1), 'window'],
    ['a moment before the deadline', {}, new Date(closesAt.getTime() - 1), 'yes'],
    ['exactly at the deadline', {}, closesAt, 'window'],
    ['sent', { state: 'submitted' as const }, during, 'window'],
    ['sent and reopened', { state: 'submitted' as const, isReopened: true }, during, 'yes'],
    ['reopened, after the deadline', { state: 'submitted' as const, isReopened: true }, closesAt, 'window'],
    ['put away', { state: 'withdrawn' as const }, during, 'window'],
    ['under review', { state: 'under-review' as const }, during, 'window'],
    [
      'an own, later deadline',
      { closesAt: moment('2027-04-02T22:00:00Z') },
      moment('2027-04-01T22:00:00Z'),
      'yes',
    ],
    [
      'past its own deadline',
      { closesAt: moment('2027-04-02T22:00:00Z') },
      moment('2027-04-02T22:00:00Z'),
      'window',
    ],
  ])('%s', (_, more, at, expected) => {
    const subject = subjectWith(more)
    expect(word(mayEditProposal(who.pi, subject, at))).toBe(expected)
    expect(word(maySendProposal(who.pi, subject, at))).toBe(expected)
    expect(word(mayManagePeople(who.pi, subject, at))).toBe(expected)
  })

  it('takes a kind’s own deadline before that of the call', () => {
    const base = subjectWith()
    const subject = subjectWith({ kind: { ...base.kind, closesAt: moment('2027-03-10T00:00:00Z') } })
    expect(word(mayEditProposal(who.pi, subject, during))).toBe('window')
  })

  it('says when it closed', () => {
    const decision = mayEditProposal(who.pi, subjectWith(), closesAt)
    expect(decision).toMatchObject({
      sentence: expect.stringContaining('22:00:00 UTC on 31 March 2027') as string,
    })
  })

  it('stops in a call under review, whatever the dates', () => {
    const base = subjectWith()
    const subject = subjectWith({ call: { ...base.call, stage: 'review' } })
    expect(word(mayEditProposal(who.pi, subject, during))).toBe('window')
  })
})
