import { describe, expect, it } from 'vitest'
import { findConflicts } from '@/lib/domain/conflicts/findConflicts'
import type { NamedInvestigator } from '@/lib/domain/conflicts/types'

const named = (proposalId: number, personId: number | null, institute: string): NamedInvestigator => ({
  proposalId,
  personId,
  name: `Person ${personId}`,
  sortName: null,
  institute,
})

const judge = { personId: 7, institutes: ['Institute of Deep Fields', ''] }

describe('findConflicts', () => {
  // Tried: comparing institutes without folding them fails the third row.
  it.each([
    ['own proposal', [named(1, 7, 'Elsewhere')], [[1, 'investigator']]],
    ['same institute', [named(1, 8, 'Institute of Deep Fields')], [[1, 'institute']]],
    ['same institute, spelt otherwise', [named(1, 8, '  INSTITUTE of Déep-Fields ')], [[1, 'institute']]],
    [
      'being named weighs more than the institute, first',
      [named(1, 7, 'X'), named(1, 8, 'Institute of Deep Fields')],
      [[1, 'investigator']],
    ],
    ['and last', [named(1, 8, 'Institute of Deep Fields'), named(1, 7, 'X')], [[1, 'investigator']]],
    ['an empty institute matches nobody', [named(1, 8, ''), named(1, null, ' . ')], []],
    ['someone without an account is no match by key', [named(1, null, 'Elsewhere')], []],
    [
      'each proposal once',
      [named(1, 7, 'X'), named(1, 7, 'X'), named(2, 7, 'X')],
      [
        [1, 'investigator'],
        [2, 'investigator'],
      ],
    ],
  ] as const)('%s', (_, people, expected) => {
    const found = findConflicts(people, [judge])
    expect(found.map(({ proposalId, kind }) => [proposalId, kind])).toEqual(expected)
    expect(found.every(({ personId, source }) => personId === 7 && source === 'matched')).toBe(true)
  })

  it.each([
    [
      'a proposal of someone named with the judge in this call',
      [named(1, 7, 'X'), named(1, 8, 'Y'), named(2, 8, 'Y')],
      [],
      [
        [1, 'investigator'],
        [2, 'collaborator'],
      ],
    ],
    ['or in a call before', [named(2, 8, 'Y')], [named(9, 7, 'X'), named(9, 8, 'Y')], [[2, 'collaborator']]],
    [
      'without an account, by name and institute',
      [named(2, null, 'Ý')],
      [named(9, 7, 'X'), named(9, null, 'y')],
      [[2, 'collaborator']],
    ],
    [
      'not whoever is named with that colleague',
      [named(3, 10, 'Z')],
      [named(9, 7, 'X'), named(9, 8, 'Y'), named(8, 8, 'Y'), named(8, 10, 'Z')],
      [],
    ],
    [
      'it weighs more than the institute',
      [named(2, 8, 'Institute of Deep Fields')],
      [named(9, 7, 'X'), named(9, 8, 'Y')],
      [[2, 'collaborator']],
    ],
    ['past proposals themselves are no part of the call', [], [named(9, 7, 'X'), named(9, 8, 'Y')], []],
  ] as const)('%s', (_, people, before, expected) => {
    const found = findConflicts(people, [judge], before)
    expect(found.map(({ proposalId, kind }) => [proposalId, kind])).toEqual(expected)
  })
})
