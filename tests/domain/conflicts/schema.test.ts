import { describe, expect, it } from 'vitest'
import { fieldErrorsOf } from '@/lib/fieldErrorsOf'
import { declareInterestsSchema } from '@/lib/domain/conflicts/schema'

const key = 'n0123456789abcdef'
const input = (names: Record<string, unknown>, wentThrough = true) => ({
  callSlug: 'call-14',
  names,
  wentThrough,
})

describe('declareInterestsSchema', () => {
  it('keeps what is ticked and leaves the rest', () => {
    const other = 'nfedcba9876543210'
    const parsed = declareInterestsSchema.parse(
      input({ [key]: { ticked: true, kind: 'family' }, [other]: { ticked: false, kind: 'rival' } }),
    )
    expect(parsed.names).toEqual([{ key, kind: 'family' }])
  })

  it.each([
    [
      'a tick without a kind',
      input({ [key]: { ticked: true, kind: '' } }),
      `names.${key}.kind`,
      'Say which kind of interest it is.',
    ],
    [
      'a kind nobody may choose',
      input({ [key]: { ticked: true, kind: 'investigator' } }),
      `names.${key}.kind`,
      'Say which kind of interest it is.',
    ],
    [
      'the box at the end left empty',
      input({}, false),
      'wentThrough',
      'Go through the whole list first, then tick this.',
    ],
  ])('%s', (_, given, field, message) => {
    const result = declareInterestsSchema.safeParse(given)
    expect(result.success ? {} : fieldErrorsOf(result.error)).toEqual({ [field]: message })
  })

  it('refuses keys of another shape', () => {
    expect(
      declareInterestsSchema.safeParse(input({ __proto__x: { ticked: true, kind: 'rival' } })).success,
    ).toBe(false)
  })
})
