import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { compareTexts } from '@/lib/writing/compareTexts'

const shown = (before: string, after: string) =>
  compareTexts(before, after)
    .map(({ kind, text }) => (kind === 'same' ? text : kind === 'gone' ? `[-${text}-]` : `[+${text}+]`))
    .join('')

// Seen to fail: with lines compared only whole, with the last place left out.
describe('what changed from one text to another', () => {
  it.each([
    ['one two three', 'one 2 three', 'one [-two-][+2+] three'],
    ['a\nb\nc', 'a\nc', 'a\n[-b\n-]c'],
    ['', 'new', '[+new+]'],
    ['old', '', '[-old-]'],
    ['same', 'same', 'same'],
    ['a b\n\nkept line\n', 'kept line\nadded\n', '[-a b\n\n-]kept line\n[+added\n+]'],
  ])('%j to %j', (before, after, expected) => expect(shown(before, after)).toBe(expected))

  it('gives both texts back, whatever they are', () => {
    const text = fc.array(fc.constantFrom('a', 'b', 'cc', ' ', '\n', '  ')).map((parts) => parts.join(''))
    fc.assert(
      fc.property(text, text, (before, after) => {
        const all = compareTexts(before, after)
        const without = (kind: string) =>
          all
            .filter((one) => one.kind !== kind)
            .map((one) => one.text)
            .join('')
        return without('new') === before && without('gone') === after
      }),
    )
  })

  it('takes texts of any length', () => {
    const words = (seed: string) => Array.from({ length: 9000 }, (_, n) => `${seed}${n}`).join(' ')
    expect(compareTexts(words('a'), words('b')).map(({ kind }) => kind)).toEqual(['gone', 'new'])
  })
})
