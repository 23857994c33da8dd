import { describe, expect, it } from 'vitest'
import { leftOut, namedOnSending } from '@/lib/domain/proposals/namedOnSending'
import { peopleFinding } from '@/lib/domain/proposals/sections/people'
import type { Investigator } from '@/lib/domain/proposals/types'
import { contents } from '../../support/contents'
import { investigator } from '../../support/proposalSubject'

const lead = (more: Partial<Investigator> = {}) => investigator(1, { role: 'pi', ...more })
const second = (more: Partial<Investigator> = {}) => investigator(2, more)
const lacking = (...people: Investigator[]) => {
  const base = contents()
  const kind = { ...base.kind, title: 'Thesis', needsStudent: true }
  return peopleFinding({ ...base, kind, people }).missing.map(({ sentence }) => sentence)
}

// Seen to fail: with students and supervisors counted before they agree, and with one person counted as both.
describe('a kind that is for students', () => {
  it.each<[string, Investigator[], string[]]>([
    ['nobody marked', [lead(), second()], ['Thesis: name a student.']],
    [
      'a student alone',
      [lead({ isStudent: true }), second()],
      ['Thesis: name the supervisor of the student.'],
    ],
    ['a student led by the supervisor', [lead({ isSupervisor: true }), second({ isStudent: true })], []],
    ['a student who leads', [lead({ isStudent: true }), second({ isSupervisor: true })], []],
    [
      'one person as both',
      [lead({ isStudent: true, isSupervisor: true }), second()],
      ['Thesis: name the supervisor of the student.'],
    ],
    [
      'a supervisor who has yet to agree',
      [lead({ isStudent: true }), second({ isSupervisor: true, confirmedAt: null })],
      ['Thesis: name the supervisor of the student, who must have agreed.'],
    ],
    [
      'a student who has yet to agree',
      [lead({ isSupervisor: true }), second({ isStudent: true, confirmedAt: null })],
      ['Thesis: name a student, who must have agreed.'],
    ],
  ])('%s', (_, people, expected) => {
    expect(lacking(...people)).toEqual(expected)
  })

  it('asks nothing of the other kinds', () => {
    expect(peopleFinding(contents({ people: [lead()] })).missing).toEqual([])
  })
})

describe('who a version names', () => {
  it('is who has agreed, in their order; the others are left out', () => {
    const people = [lead(), second({ confirmedAt: null }), investigator(3)]
    expect(namedOnSending(people).map(({ id }) => id)).toEqual([1, 3])
    expect(leftOut(people).map(({ id }) => id)).toEqual([2])
  })
})
