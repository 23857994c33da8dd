import { describe, expect, it } from 'vitest'
import type { Actor } from '@/lib/domain/actor'
import { interestInWords, whyNotAssigned, whyNotReminded, reminderDue } from '@/lib/domain/assignments/rules'
import { outcomeOf, overAwards, whyNotReleased } from '@/lib/domain/decisions/rules'
import { awardSchema } from '@/lib/domain/decisions/schema'
import { statementFrom } from '@/lib/domain/decisions/statementFrom'
import { canLeadPanel } from '@/lib/domain/panels/policy'
import { whyNotRanked, whyNotStartRanking, whyNotStartReview } from '@/lib/domain/panels/stages'
import { moveTo, stepLine, visibleLine } from '@/lib/domain/rankings/order'
import { clearTail, greyZone } from '@/lib/domain/rankings/rules'
import { shiftSentence } from '@/lib/domain/rankings/shiftSentence'

const actor = (grants: Actor['grants']): Actor => ({
  personId: 1,
  name: 'A',
  email: 'a@b.example',
  timeZone: 'UTC',
  grants,
})
const chair = { role: 'chair', callId: 3, panelId: 7, instrumentId: null } as const

describe('who leads a panel', () => {
  it.each([
    ['chair by role and seat', [chair], 'chair', true],
    ['deputy by role and seat', [chair], 'deputy', true],
    ['role and a member’s seat', [chair], 'member', false],
    ['role without a seat', [chair], null, false],
    ['seat without the role', [], 'chair', false],
    ['chair of another panel', [{ ...chair, panelId: 8 }], 'chair', false],
    ['chair of another call', [{ ...chair, callId: 4 }], 'chair', false],
    ['a reviewer in the seat', [{ ...chair, role: 'reviewer' as const }], 'chair', false],
  ] as const)('%s: %#', (_what, grants, seat, allowed) => {
    expect(canLeadPanel(actor(grants), { id: 7, callId: 3, seat }).allowed).toBe(allowed)
  })
})

describe('stages', () => {
  it.each([
    ['planned', false],
    ['open', false],
    ['closed', true],
    ['review', false],
    ['ranking', false],
    ['decided', false],
    ['archived', false],
  ] as const)('the review starts from %s: %s', (phase, may) => {
    expect(whyNotStartReview(phase) === null).toBe(may)
  })

  it.each([
    ['closed', false, 9, false],
    ['review', false, 9, true],
    ['review', false, 0, false],
    ['review', true, 9, false],
    ['ranking', false, 9, true],
    ['decided', false, 9, false],
  ] as const)('a ranking begins at %s (list %s, %i reviews): %s', (phase, has, finished, may) => {
    expect(whyNotStartRanking(phase, has, finished) === null).toBe(may)
  })

  it.each([
    ['review', true, true],
    ['ranking', true, true],
    ['ranking', false, false],
    ['decided', true, false],
    ['archived', true, false],
  ] as const)('places change at %s (list %s): %s', (phase, has, may) => {
    expect(whyNotRanked(phase, has) === null).toBe(may)
  })

  it.each([
    [{ phase: 'ranking', isFrozen: true, undecided: 3, unready: 0, unapproved: 0 }, null],
    [{ phase: 'ranking', isFrozen: false, undecided: 3, unready: 0, unapproved: 0 }, /Freeze/],
    [{ phase: 'ranking', isFrozen: true, undecided: 3, unready: 1, unapproved: 0 }, /not prepared/],
    [{ phase: 'ranking', isFrozen: true, undecided: 3, unready: 0, unapproved: 1 }, /second person/],
    [{ phase: 'ranking', isFrozen: true, undecided: 0, unready: 0, unapproved: 0 }, /already/],
    [{ phase: 'review', isFrozen: true, undecided: 3, unready: 0, unapproved: 0 }, /every panel/],
    [{ phase: 'decided', isFrozen: true, undecided: 3, unready: 0, unapproved: 0 }, /already/],
  ] as const)('release of %o', (facts, words) => {
    const why = whyNotReleased(facts)
    if (words === null) expect(why).toBeNull()
    else expect(why).toMatch(words)
  })
})

describe('assignments', () => {
  const ready = {
    phase: 'review' as const,
    state: 'under-review' as const,
    reviewNumber: '14-083',
    reviewer: { name: 'Ayla Stroud', mayReview: true },
    interest: null,
  }
  it.each([
    [{}, null],
    [{ phase: 'open' as const }, /once the call has closed/],
    [{ phase: 'ranking' as const }, /nothing more is assigned/],
    [{ state: 'withdrawn' as const }, /no longer under review/],
    [{ reviewer: null }, /does not sit/],
    [{ reviewer: { name: 'Ayla Stroud', mayReview: false } }, /does not hold/],
    [
      { interest: { kind: 'family' as const, source: 'declared' as const } },
      /Ayla Stroud cannot read 14-083/,
    ],
  ])('%o', (change, words) => {
    const why = whyNotAssigned({ ...ready, ...change })
    if (words === null) expect(why).toBeNull()
    else expect(why).toMatch(words)
  })

  it('never tells the chair where an investigator works', () => {
    for (const kind of ['investigator', 'institute'] as const)
      for (const source of ['matched', 'declared'] as const)
        expect(interestInWords({ kind, source })).toMatch(/found by matching people and institutes/)
  })

  it('tells of a common proposal, and how far back it looks', () => {
    expect(interestInWords({ kind: 'collaborator', source: 'matched' })).toBe(
      'is named with one of its investigators on a proposal of this call or of the four calls before it',
    )
  })

  it.each([
    [0, null, false],
    [2, null, true],
    [2, '2027-05-01T23:59:00Z', true],
    [2, '2027-05-02T00:01:00Z', false],
  ] as const)('reminding of %i after %s: %s', (owed, last, may) => {
    const now = new Date('2027-05-02T12:00:00Z')
    expect(whyNotReminded(owed, last ? new Date(last) : null, now) === null).toBe(may)
  })
})

describe('the list with hidden places', () => {
  const full = [1, 2, 3, 4, 5]
  const hidden = new Set([2])
  it.each([
    [5, 1, [5, 1, 2, 3, 4]],
    [5, 2, [1, 2, 5, 3, 4]],
    [1, 2, [2, 3, 1, 4, 5]],
    [1, 4, [2, 3, 4, 5, 1]],
    [3, 99, [1, 2, 4, 5, 3]],
    [3, 2, full],
    [2, 1, full],
  ])('moves %i to %i', (id, place, expected) => {
    expect(moveTo(full, hidden, id, place)).toEqual(expected)
  })

  it.each([
    ['up', 3, 2],
    ['up', 2, 0],
    ['up', 0, 0],
    ['down', 1, 3],
    ['down', 5, 5],
  ] as const)('the line goes %s from %i to %i', (direction, from, to) => {
    expect(stepLine(full, hidden, from, direction)).toBe(to)
  })

  it('each step of the line is one step on screen', () => {
    for (let line = 0, shown = 0; shown < 4; shown += 1) {
      line = stepLine(full, hidden, line, 'down')
      expect(visibleLine(full, hidden, line)).toBe(shown + 1)
    }
  })
})

describe('the grey zone', () => {
  it.each([
    [[0.99, 0.8, 0.5, 0.1, 0.3, 0.01], { first: 2, last: 5 }],
    [[0.99, 0.01], null],
    [[null, null], null],
  ])('%o', (chances, zone) => expect(greyZone(chances)).toEqual(zone))

  it('a tail is clear up to the first that could belong above the line', () => {
    expect(clearTail([0.9, 0.5, 0.04, 0.02, 0.01], 2)).toBe(3)
    expect(clearTail([0.9, 0.02, 0.06, 0.01], 1)).toBe(1)
    expect(clearTail([0.01, 0.01], 2)).toBe(0)
    expect(clearTail([0.9, null], 1)).toBe(0)
  })
})

describe('why merit differs', () => {
  const readers = [
    { number: 11, points: 0.9, error: 0.3 },
    { number: 8, points: 0.7, error: 0.3 },
    { number: 2, points: 0.1, error: 0.3 },
  ]
  it('names the reviewers, by number, who score apart in that direction', () => {
    expect(shiftSentence({ shift: -0.42, error: 0.4, corrected: true, readers })).toBe(
      'Two of its three reviewers, 8 and 11, score 0.8 above colleagues on shared proposals: −0.4, ± 0.4.',
    )
  })
  it('names nobody where leniency was left in', () => {
    expect(shiftSentence({ shift: 0.2, error: 0.4, corrected: false, readers })).toBe(
      'Drawn towards the mean of all proposals, as three reviews leave it uncertain: +0.2, ± 0.4.',
    )
  })
})

describe('awards', () => {
  it.each([
    [[], 'declined'],
    [[{ seconds: 0, isReserve: false }], 'declined'],
    [[{ seconds: 60, isReserve: true }], 'reserve'],
    [
      [
        { seconds: 60, isReserve: true },
        { seconds: 60, isReserve: false },
      ],
      'awarded',
    ],
  ] as const)('%o is %s', (lines, outcome) => expect(outcomeOf(lines)).toBe(outcome))

  const line = {
    instrument: 'EMBER',
    telescopeId: 1,
    telescope: 'Aldous',
    seconds: 3600,
    isReserve: false,
    most: 7200,
    possible: true,
  }
  it.each([
    ['fits', [line], 3600, []],
    ['one second too much', [line], 3599, [0]],
    ['reserve needs no room', [{ ...line, isReserve: true }], 0, []],
    ['more than asked', [{ ...line, seconds: 7201 }], 9999, [0]],
    ['not possible', [{ ...line, possible: false }], 9999, [0]],
    ['nothing given is never wrong', [{ ...line, seconds: 0, possible: false }], 0, []],
    ['two lines share the room', [line, line], 7199, [1]],
  ])('%s', (_what, lines, left, wrong) => {
    expect([...overAwards(lines, new Map([[1, left]])).keys()]).toEqual(wrong)
  })

  it.each([
    ['13.5', 48_600],
    ['13,5', 48_600],
    ['', 0],
    [' 2 ', 7200],
    ['-1', null],
    ['abc', null],
    ['1e3', null],
    ['99999', null],
  ])('hours typed as %o', (hours, seconds) => {
    const result = awardSchema.safeParse({
      panelId: 1,
      proposalId: 1,
      version: 0,
      lines: [{ instrumentId: 1, hours, isReserve: false, service: 'queue', evenings: '', conditions: '' }],
    })
    expect(result.success ? result.data.lines[0]?.hours : null).toBe(seconds)
  })

  it('a statement is the comments, each once', () => {
    expect(statementFrom([' One. ', 'Two.\n\n\n\nMore.', 'One.', ''])).toBe('One.\n\nTwo.\n\nMore.')
  })
})

describe('reminderDue', () => {
  const due = new Date('2027-03-10T12:00:00Z')
  const meets = new Date('2027-03-20T12:00:00Z')
  it.each([
    ['2027-03-03T11:59:59Z', null],
    ['2027-03-03T12:00:00Z', 'week'],
    ['2027-03-09T11:59:59Z', 'week'],
    ['2027-03-09T12:00:00Z', 'day'],
    ['2027-03-10T11:59:59Z', 'day'],
    ['2027-03-10T12:00:00Z', null],
    ['2027-03-11T12:00:00Z', 'late'],
    ['2027-03-20T11:59:59Z', 'late'],
    ['2027-03-20T12:00:00Z', null],
  ] as const)('at %s: %s', (now, kind) => {
    expect(reminderDue(due, meets, new Date(now))).toBe(kind)
  })
})
