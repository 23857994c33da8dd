import { describe, expect, it } from 'vitest'
import { lineChart } from '@/components/charts/geometry/lineChart'
import { placeLabels, wordBox } from '@/components/charts/geometry/placeLabels'

// Seen to fail with names already placed left out of the cost, with words that stand on the plot left out, and with
// ticks of a logarithmic axis taken from its linear form.

const flat = (y: number) => Array.from({ length: 41 }, (_, i) => [i * 10, y] as const)
const lines = [
  { id: 'a', words: 'Planck 2018', points: flat(100) },
  { id: 'b', words: 'Local ladder', points: flat(108) },
  { id: 'c', words: 'Einstein–de Sitter', points: flat(116) },
]
const boxOf = ({ x, y }: { x: number; y: number }, words: string) => ({
  left: x,
  right: x + words.length * 7.1,
  top: y - 12,
  bottom: y + 3,
})
type Box = ReturnType<typeof boxOf>
const touch = (a: Box, b: Box) => a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom

describe('names at their lines', () => {
  it('never stand on one another, nor outside the plot', () => {
    const boxes = placeLabels(lines, 400, 200).map((label, index) => boxOf(label, lines[index]?.words ?? ''))
    boxes.forEach((box, index) => {
      expect(box.left).toBeGreaterThanOrEqual(0)
      expect(box.right).toBeLessThanOrEqual(401)
      expect(box.bottom).toBeLessThanOrEqual(200)
      for (const other of boxes.slice(index + 1)) expect(touch(box, other)).toBe(false)
    })
  })

  it('keep clear of words that stand there', () => {
    const taken = wordBox(300, 92, 'largest here: beyond', 400)
    const [label] = placeLabels(lines.slice(0, 1), 400, 200, [taken])
    if (!label) throw new Error('A line has a label.')
    expect(touch(boxOf(label, 'Planck 2018'), taken)).toBe(false)
  })
})

describe('a logarithmic axis of x', () => {
  it('has a tick a decade', () => {
    const { x, xTicks } = lineChart({
      series: [
        {
          id: 'a',
          name: 'a',
          tone: 's1',
          points: [
            [0.1, 1],
            [1000, 2],
          ],
        },
      ],
      width: 400,
      height: 200,
      xDomain: [0.1, 1000],
      xLog: true,
      labels: 'inside',
    })
    expect(xTicks.map((tick) => Number(tick.toPrecision(6)))).toEqual([0.1, 1, 10, 100, 1000])
    expect(x(10)).toBeCloseTo(200, 6)
  })

  it('takes the brief name where the name would fill the plot', () => {
    const name = 'Own: Ωm 0.30, ΩΛ 1.75 ends at its turn, z = 0.92'
    const series = [
      {
        id: 'a',
        name,
        brief: 'ends at its turn',
        tone: 's1' as const,
        points: [
          [0, 0],
          [1, 1],
        ] as const,
      },
    ]
    const nameAt = (width: number) =>
      lineChart({ series, width, height: 200, labels: 'inside' }).paths[0]?.name
    expect([nameAt(250), nameAt(700)]).toEqual(['ends at its turn', name])
  })
})
