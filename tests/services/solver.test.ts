import { afterEach, describe, expect, it, vi } from 'vitest'
import { ProgrammeBuilder } from '@/lib/panel/solver/programmeBuilder'
import { solveInWorker } from '@/lib/services/solver/solveInWorker'

const limits = { seconds: 20, relativeGap: 0 }
afterEach(() => vi.restoreAllMocks())

/** The knapsack of the textbook: 0/1 items by value and weight, best value within the capacity. */
function knapsack(items: readonly (readonly [value: number, weight: number])[], capacity: number) {
  const builder = new ProgrammeBuilder()
  const columns = items.map(([objective]) =>
    builder.column({ objective, lower: 0, upper: 1, isInteger: true }),
  )
  builder.row(
    -Infinity,
    capacity,
    columns.map((column, i) => [column, items[i]?.[1] ?? 0] as const),
  )
  return builder.build()
}

/** A knapsack with equal ratios, which no bound can close quickly. */
const stubborn = () =>
  knapsack(
    Array.from({ length: 60 }, (_, i) => [100_000 + i * 977, 100_000 + i * 977 + (i % 2)] as const),
    2_500_001,
  )

describe('the solver', () => {
  it('finds the best of all subsets, and proves it', async () => {
    const items = [
      [10, 5],
      [40, 4],
      [30, 6],
      [50, 3],
      [35, 5],
    ] as const
    const all = Array.from({ length: 32 }, (_, set) => items.filter((_item, i) => set & (1 << i)))
    const best = Math.max(
      ...all
        .filter((set) => set.reduce((sum, [, weight]) => sum + weight, 0) <= 10)
        .map((set) => set.reduce((sum, [value]) => sum + value, 0)),
    )
    const answer = await solveInWorker(knapsack(items, 10), limits)
    expect(answer).toMatchObject({ status: 'optimal', objective: best, bound: best, gap: 0 })
  })

  it('solves a linear programme without whole numbers', async () => {
    // Maximise x + 2y with x + y <= 4, x + 3y <= 6: the corner (3, 1).
    const builder = new ProgrammeBuilder()
    const x = builder.column({ objective: 1, lower: 0, upper: Infinity, isInteger: false })
    const y = builder.column({ objective: 2, lower: 0, upper: Infinity, isInteger: false })
    builder.row(-Infinity, 4, [
      [x, 1],
      [y, 1],
    ])
    builder.row(-Infinity, 6, [
      [x, 1],
      [y, 3],
    ])
    const answer = await solveInWorker(builder.build(), limits)
    expect(answer).toMatchObject({ status: 'optimal', objective: 5, gap: 0 })
    expect([...(answer.values ?? [])]).toEqual([3, 1])
  })

  it('says that nothing meets every condition', async () => {
    const builder = new ProgrammeBuilder()
    const x = builder.column({ objective: 1, lower: 0, upper: 1, isInteger: true })
    builder.row(2, Infinity, [[x, 1]])
    expect(await solveInWorker(builder.build(), limits)).toEqual({
      status: 'infeasible',
      values: null,
      why: 'Nothing meets every condition.',
    })
  })

  it('gives the best so far, within its bound, when time runs out', async () => {
    const answer = await solveInWorker(stubborn(), { seconds: 0.3, relativeGap: 0 })
    expect(answer.status).toBe('unfinished')
    if (!answer.values) throw new Error(answer.why)
    expect(answer.bound).toBeGreaterThanOrEqual(answer.objective)
    expect(answer.gap).toBeGreaterThan(0)
  })

  it('is stopped at once, and solves the next programme', async () => {
    const desk = new AbortController()
    const stopped = solveInWorker(stubborn(), { seconds: 60, relativeGap: 0, signal: desk.signal })
    setTimeout(() => desk.abort(), 100)
    expect(await stopped).toMatchObject({ status: 'stopped', why: 'The solver was stopped.' })
    expect(await solveInWorker(knapsack([[3, 1]], 1), limits)).toMatchObject({ objective: 3 })
  })

  it('says so in a sentence when it cannot be loaded', async () => {
    // A stopped solve leaves no thread behind, so that the next one has to be started.
    const desk = new AbortController()
    const stopped = solveInWorker(stubborn(), { seconds: 60, relativeGap: 0, signal: desk.signal })
    setTimeout(() => desk.abort(), 10)
    await stopped
    vi.spyOn(process, 'cwd').mockReturnValue('/nowhere')
    expect(await solveInWorker(knapsack([[3, 1]], 1), limits)).toMatchObject({
      status: 'failed',
      why: expect.stringMatching(/^The solver could not be run: /),
    })
  })
})
