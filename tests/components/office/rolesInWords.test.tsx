import { describe, expect, it } from 'vitest'
import { rolesInWords } from '@/components/office/rolesInWords'

// Seen to fail with calls named once each time they are held.

const held = (role: string, call: number | null = null, instrument: string | null = null) => ({
  role,
  call,
  instrument,
})

describe('rolesInWords', () => {
  it.each([
    ['nothing', [], ''],
    ['one call', [held('reviewer', 13)], 'reviewer, call 13'],
    [
      'several calls, each once and in order',
      [held('reviewer', 14), held('chair', 13), held('reviewer', 12), held('reviewer', 14)],
      'reviewer, calls 12 and 14; chair, call 13',
    ],
    [
      'instruments and the office',
      [held('instrument-scientist', null, 'EMBER'), held('office')],
      'instrument scientist, EMBER; office',
    ],
  ])('%s', (_name, roles, words) => {
    expect(rolesInWords(roles)).toBe(words)
  })
})
