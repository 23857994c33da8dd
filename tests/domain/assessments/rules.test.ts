import { describe, expect, it } from 'vitest'
import { fieldErrorsOf } from '@/lib/fieldErrorsOf'
import { hoursProblem } from '@/lib/domain/assessments/rules'
import { assessRequestSchema } from '@/lib/domain/assessments/schema'

describe('hoursProblem', () => {
  it.each([
    ['accepted', 72_000, 75_600, null],
    ['accepted', 75_600, 75_600, null],
    ['accepted', 75_601, 75_600, 'more than the 21.0'],
    ['accepted', 0, 75_600, 'truly'],
    ['change', 90_000, 75_600, null],
    ['not-possible', 0, 75_600, null],
  ] as const)('%s, %i of %i', (verdict, trueSeconds, asked, start) => {
    const problem = hoursProblem(verdict, trueSeconds, asked)
    if (start === null) expect(problem).toBeNull()
    else expect(problem?.replace(/\u00a0/g, ' ')).toContain(start)
  })
})

const good = {
  requestId: 1,
  over: null,
  verdict: 'accepted',
  trueHours: '20.2',
  reason: 'Fine.',
  panelNote: '',
}

describe('assessRequestSchema', () => {
  it('keeps hours as whole seconds and the reason in one line', () => {
    expect(
      assessRequestSchema.parse({ ...good, trueHours: ' 20,25 ', reason: ' Two\nlines ' }),
    ).toMatchObject({
      trueHours: 72_900,
      reason: 'Two lines',
    })
  })

  it.each([
    ['verdict', { verdict: '' }],
    ['trueHours', { trueHours: '' }],
    ['trueHours', { trueHours: '-2' }],
    ['trueHours', { trueHours: '1e3' }],
    ['trueHours', { trueHours: 'abc' }],
    ['trueHours', { trueHours: '20.255' }],
    ['reason', { reason: '  ' }],
    ['reason', { reason: 'x'.repeat(161) }],
    ['panelNote', { panelNote: 'x'.repeat(2001) }],
  ])('a message at %s for %j', (field, over) => {
    const result = assessRequestSchema.safeParse({ ...good, ...over })
    expect(result.success ? [] : Object.keys(fieldErrorsOf(result.error))).toEqual([field])
  })
})
