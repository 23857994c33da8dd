import { describe, expect, it } from 'vitest'
import { fieldErrorsOf } from '@/lib/fieldErrorsOf'
import {
  hoursProblem,
  targetHours,
  countedSeconds,
  trueSecondsByTarget,
} from '@/lib/domain/assessments/rules'
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

const target = (id: number, need: 'required' | 'backup' = 'required') => ({
  id,
  name: `T${id}`,
  need,
  group: null,
})
const mode = (modeId: number, instrumentId: number) => ({
  modeId,
  name: `mode ${modeId}`,
  instrument: { id: instrumentId, slug: 'i', name: 'I' },
})
const asked = (id: number, targetId: number, modeId: number) => ({
  id,
  targetId,
  modeId,
  askedSeconds: 100 * id,
})
const computed = (
  observationId: number,
  open: number,
  over: number,
  verdict: 'feasible' | 'marginal',
  times = 1,
) => ({
  observationId,
  neededSeconds: open + over,
  openShutterSeconds: open,
  overheadSeconds: over,
  verdict,
  times,
})

describe('targetHours', () => {
  const rows = targetHours(
    {
      groups: [],
      targets: [target(1), target(2, 'backup'), target(3)],
      observations: [asked(1, 1, 10), asked(2, 1, 11), asked(3, 2, 10), asked(4, 3, 20)],
      modes: [mode(10, 5), mode(11, 5), mode(20, 6)],
      computed: [
        computed(1, 40, 10, 'feasible'),
        computed(2, 80, 30, 'marginal'),
        computed(3, 200, 0, 'feasible'),
      ],
    },
    5,
  )

  it('adds up the observations on one instrument, target by target, with the worst verdict', () => {
    expect(rows).toMatchObject([
      {
        targetId: 1,
        modes: ['mode 10', 'mode 11'],
        openSeconds: 120,
        overheadSeconds: 40,
        neededSeconds: 160,
        askedSeconds: 300,
        verdict: 'marginal',
      },
      { targetId: 2, need: 'backup', neededSeconds: 200, askedSeconds: 300, verdict: 'feasible' },
    ])
  })

  it('shares true hours over the overheads and keeps the open shutter', () => {
    expect(trueSecondsByTarget(rows, 400)).toEqual([200, 200])
    expect(trueSecondsByTarget(rows, 360)).toEqual([160, 200])
    expect(trueSecondsByTarget(rows, 0)).toEqual([0, 200])
  })

  it('leaves what is not counted out of sums and shares, and takes all triggers together', () => {
    const counted = targetHours(
      {
        groups: [],
        targets: [target(1), target(2, 'backup')],
        observations: [asked(1, 1, 10), asked(2, 2, 10)],
        modes: [mode(10, 5)],
        computed: [computed(1, 40, 10, 'feasible', 3), computed(2, 80, 30, 'feasible', 0)],
      },
      5,
    )
    expect(counted.map(({ askedSeconds, neededSeconds }) => [askedSeconds, neededSeconds])).toEqual([
      [300, 150],
      [200, 110],
    ])
    expect(countedSeconds(counted, 'askedSeconds')).toBe(300)
    expect(trueSecondsByTarget(counted, 180)).toEqual([180, 110])
  })
})
