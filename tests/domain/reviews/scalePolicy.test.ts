import { describe, expect, it } from 'vitest'
import { histogram } from '@/components/charts/geometry/histogram'
import { whyScaleAlone } from '@/lib/domain/reviews/scalePolicy'
import { scaleUse } from '@/lib/panel/statistics'

describe('the use of the scale', () => {
  it('counts each half point, from 0 to 10', () => {
    const counts = scaleUse([0, 13, 13, 20])
    expect(counts).toHaveLength(21)
    expect([counts[0], counts[13], counts[20], counts.reduce((a, b) => a + b)]).toEqual([1, 2, 1, 4])
  })

  it.each([
    ['review', null, /once the decisions are known/],
    ['ranking', 12, /once the decisions are known/],
    ['decided', 3, /Too few others/],
    ['decided', 4, null],
    ['archived', 12, null],
  ] as const)('in %s with %s others', (phase, others, words) => {
    const why = whyScaleAlone(phase, others)
    if (words === null) expect(why).toBeNull()
    else expect(why).toMatch(words)
  })

  it('is drawn with the highest share at full height', () => {
    const plot = histogram(4, { width: 100, height: 50, ground: 60 }, 0.5)
    expect([plot.x(2), plot.step, plot.height(0.5), plot.height(0)]).toEqual([50, 25, 50, 0])
    expect(plot.outline([0.5, 0, 0, 0.25])).toBe('M0 60V10H25V60H50V60H75V35H100V60')
  })
})
