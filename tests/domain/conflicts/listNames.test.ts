import { describe, expect, it } from 'vitest'
import { interestsToRecord } from '@/lib/domain/conflicts/interestsToRecord'
import { listNames } from '@/lib/domain/conflicts/listNames'
import type { NamedInvestigator } from '@/lib/domain/conflicts/types'

const named: NamedInvestigator[] = [
  { proposalId: 1, personId: 11, name: 'Vera Zandt', sortName: 'Zandt, Vera', institute: 'North' },
  { proposalId: 1, personId: null, name: 'Ada Brandt', sortName: null, institute: 'South' },
  { proposalId: 2, personId: 11, name: 'V. Zandt', sortName: 'Zandt, Vera', institute: 'North Institute' },
  { proposalId: 2, personId: null, name: 'Suharto', sortName: null, institute: '' },
  { proposalId: 3, personId: null, name: 'ada brandt', sortName: null, institute: 'SOUTH' },
  { proposalId: 3, personId: 7, name: 'Me Self', sortName: 'Self, Me', institute: 'Home' },
  { proposalId: 4, personId: 12, name: 'Ilse Home', sortName: 'Home, Ilse', institute: 'home' },
]
const judge = { personId: 7, institutes: ['Home'] }
// Zandt was on a proposal of the judge's before, and on one of somebody who asks for nothing now.
const before: NamedInvestigator[] = [
  { proposalId: 91, personId: 7, name: 'Me Self', sortName: 'Self, Me', institute: 'Home' },
  { proposalId: 91, personId: 11, name: 'Vera Zandt', sortName: 'Zandt, Vera', institute: 'North' },
  { proposalId: 91, personId: 14, name: 'Past Only', sortName: 'Only, Past', institute: 'West' },
]

describe('listNames', () => {
  const list = listNames(5, named, judge, [{ kind: 'rival', note: 'Suharto; Ada Brandt, South' }], before)

  it('shows each person once, by family name, whatever the proposals', () => {
    expect(list.map(({ name }) => name)).toEqual([
      'Ada Brandt',
      'Ilse Home',
      'Me Self',
      'Suharto',
      'Vera Zandt',
    ])
  })

  it('knows oneself, people on the same proposals, the own institute, and what was declared before', () => {
    expect(list.map(({ foundAs, declaredAs }) => foundAs ?? declaredAs)).toEqual([
      'collaborator',
      'institute',
      'investigator',
      'rival',
      'collaborator',
    ])
    expect(listNames(5, named, judge, [], []).map(({ foundAs }) => foundAs)).toEqual([
      'collaborator',
      'institute',
      'investigator',
      null,
      null,
    ])
  })

  it('gives keys that differ by person and by call', () => {
    const other = listNames(6, named, judge, [], before)
    expect(new Set([...list, ...other].map(({ key }) => key)).size).toBe(10)
    expect(list.every(({ key }) => /^n[0-9a-f]{16}$/.test(key))).toBe(true)
  })

  it('turns a ticked name into an interest in every proposal it stands on', () => {
    const zandt = list.find(({ name }) => name === 'Vera Zandt')
    const brandt = list.find(({ name }) => name === 'Ada Brandt')
    if (!zandt || !brandt) throw new Error('not listed')
    const rows = interestsToRecord(
      judge,
      named,
      [
        { person: zandt.person, kind: 'collaborator' },
        { person: brandt.person, kind: 'collaborator' },
      ],
      [],
    )
    expect(rows.map(({ proposalId, kind, source, note }) => [proposalId, kind, source, note])).toEqual([
      [1, 'collaborator', 'declared', 'Vera Zandt, North; Ada Brandt, South'],
      [2, 'collaborator', 'declared', 'Vera Zandt, North'],
      [3, 'collaborator', 'declared', 'Ada Brandt, South'],
      [3, 'investigator', 'matched', ''],
      [4, 'institute', 'matched', ''],
      [1, 'collaborator', 'matched', ''],
    ])
  })
})
