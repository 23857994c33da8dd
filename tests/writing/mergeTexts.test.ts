import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { mergeTexts, type Passage } from '@/lib/writing/mergeTexts'

const joinedBy = (passages: readonly Passage[], whose: 'theirs' | 'mine') =>
  passages.map((passage) => (passage.kind === 'settled' ? passage.text : passage[whose])).join('')

const base = 'Why.\n\nHow.\n\nWhen.'

// Seen to fail with what only the other changed taken from here, and with passages both changed alike asked for.
describe('two versions of one text', () => {
  it('keeps both changes where each changed another passage', () => {
    const passages = mergeTexts(base, 'Why now.\n\nHow.\n\nWhen.', 'Why.\n\nHow.\n\nWhen, and where.')
    expect(passages).toEqual([{ kind: 'settled', text: 'Why now.\n\nHow.\n\nWhen, and where.' }])
  })

  it('leaves a passage that both changed to be chosen, and only that', () => {
    const passages = mergeTexts(base, 'Why.\n\nSo.\n\nWhen.', 'Why not.\n\nThus.\n\nWhen.')
    expect(passages).toEqual([
      { kind: 'settled', text: 'Why not.\n\n' },
      { kind: 'both', theirs: 'So.\n', mine: 'Thus.\n' },
      { kind: 'settled', text: '\nWhen.' },
    ])
  })

  it('asks for nothing that both changed alike', () => {
    expect(mergeTexts(base, 'Why.\n\nSo.\n\nWhen.', 'Why.\n\nSo.\n\nWhen.')).toEqual([
      { kind: 'settled', text: 'Why.\n\nSo.\n\nWhen.' },
    ])
  })

  it('takes an end that one added though the other took the end off', () => {
    expect(mergeTexts('One.', '', 'One.\nTwo.')).toEqual([{ kind: 'both', theirs: '', mine: 'One.\nTwo.' }])
  })

  const text = fc
    .array(fc.constantFrom('a\n', 'b\n', 'c\n', '\n', 'd'), { maxLength: 12 })
    .map((pieces) => pieces.join(''))

  it('gives back a version that alone was changed, whole', () => {
    fc.assert(
      fc.property(text, text, (from, to) => {
        expect(joinedBy(mergeTexts(from, to, from), 'mine')).toBe(to)
        expect(joinedBy(mergeTexts(from, from, to), 'theirs')).toBe(to)
      }),
    )
  })

  it('loses no line of mine that was not there before, whatever they did', () => {
    fc.assert(
      fc.property(text, text, fc.integer({ min: 0, max: 12 }), (from, theirs, at) => {
        const own = from.split(/(?<=\n)/)
        own.splice(Math.min(at, own.length), 0, 'mine alone\n')
        const mine = own.join('')
        expect(joinedBy(mergeTexts(from, theirs, mine), 'mine')).toContain('mine alone\n')
      }),
    )
  })
})
