import { describe, expect, it } from 'vitest'
import { clipped } from '@/pdf/writing/clipped'
import { matrixOf, moved, pathOf, segmentsOf, times } from '@/pdf/writing/outline'
import { typesetFormula } from '@/pdf/writing/typesetFormula'

const numbers = (path: string) => (path.match(/-?\d+(\.\d+)?/g) ?? []).map(Number)

// Seen to fail: with transforms applied in the wrong order, with a background drawn as an outline.
describe('a formula as an outline', () => {
  it('has the width, height and depth it is drawn in', async () => {
    const shape = await typesetFormula(
      '\\frac{\\Delta T}{T} = \\sqrt{\\frac{1}{2\\pi}} \\int_0^\\infty e^{-x^2}\\,dx',
      true,
    )
    expect(shape).not.toBeNull()
    if (!shape) return
    const all = numbers(shape.path)
    const [xs, ys] = [all.filter((_, i) => i % 2 === 0), all.filter((_, i) => i % 2 === 1)]
    expect(Math.min(...xs)).toBeGreaterThanOrEqual(-50)
    expect(Math.max(...xs)).toBeLessThanOrEqual(shape.widthEm * 1000 + 50)
    expect(Math.min(...ys)).toBeGreaterThanOrEqual(-shape.heightEm * 1000 - 50)
    expect(Math.max(...ys)).toBeLessThanOrEqual(shape.depthEm * 1000 + 50)
    expect(shape.widthEm).toBeGreaterThan(8)
    expect(shape.heightEm).toBeGreaterThan(1.2)
    expect(shape.depthEm).toBeGreaterThan(0.6)
  })

  // Seen to fail: with lines broken inside formulas, which gives one drawing for each part.
  it('is whole, also inside a line', async () => {
    const inline = await typesetFormula('z = 2.3 \\pm 0.1', false)
    expect(inline?.widthEm).toBeCloseTo(5.58, 1)
  })

  it('joins the parts of a long brace', async () => {
    const shape = await typesetFormula('\\underbrace{aaaaaaaaaaa}', false)
    const bars =
      (shape?.path ?? '').match(/M[^Z]*Z/g)?.map((part) => numbers(part).filter((_, i) => i % 2 === 0)) ?? []
    const [left, right] = bars.slice(-2).map((xs) => [Math.min(...xs), Math.max(...xs)])
    expect(left).toEqual([932, 1978])
    expect(right).toEqual([3841, 4888])
  })

  it.each([
    '\\underbrace{a+b+c+d+e+f+g}_{x}',
    '\\left\\{\\begin{matrix}a\\\\b\\\\c\\\\d\\\\e\\\\f\\end{matrix}\\right.',
  ])('keeps long braces inside: %s', async (tex) => {
    const shape = await typesetFormula(tex, true)
    const all = numbers(shape?.path ?? '')
    const ys = all.filter((_, i) => i % 2 === 1)
    expect(all.length).toBeGreaterThan(100)
    expect(Math.min(...ys)).toBeGreaterThanOrEqual(-(shape?.heightEm ?? 0) * 1000 - 60)
    expect(Math.max(...ys)).toBeLessThanOrEqual((shape?.depthEm ?? 0) * 1000 + 60)
  })

  it.each([
    '\\odot',
    'M_\\odot',
    '10^{42}\\,\\mathrm{erg\\,s^{-1}}',
    '\\boldsymbol{\\alpha}',
    '\\text{größer als}',
    '\\lesssim',
    '\\mathcal{L}',
  ])('sets %s', async (tex) => expect((await typesetFormula(tex, false))?.widthEm).toBeGreaterThan(0.3))

  it.each(['\\nosuchmacro', '\\frac{1', '\\text{漢}'])(
    'is null for %s, whose TeX is printed then',
    async (tex) => {
      expect(await typesetFormula(tex, false)).toBeNull()
    },
  )
})

describe('outlines', () => {
  it('read every stroke a glyph has', () => {
    expect(pathOf(segmentsOf('M1-2H3V4Q5 6 7 8T9 10C1 2 3 4 5 6L.5.5 7 7Z'))).toBe(
      'M1 -2L3 -2L3 4Q5 6 7 8Q9 10 9 10C1 2 3 4 5 6L0.5 0.5L7 7Z',
    )
    expect(() => segmentsOf('m1 2')).toThrow()
  })

  it('are moved first by the inner transform', () => {
    const both = times(matrixOf('translate(10,0)'), matrixOf('scale(2)'))
    expect(pathOf(moved(segmentsOf('M1 1'), both))).toBe('M12 2')
    expect(() => matrixOf('rotate(3)')).toThrow()
  })

  it('are squeezed where they reach out of their window, and only there', () => {
    const bar = segmentsOf('M0-100L10-100L10 300L0 300Z')
    expect(pathOf(clipped(bar, { x: 0, y: 0, width: 10, height: 200 }))).toBe('M0 0L10 0L10 200L0 200Z')
    expect(pathOf(clipped(bar, { x: -5, y: -200, width: 50, height: 900 }))).toBe(pathOf(bar))
  })
})
