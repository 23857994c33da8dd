import type { StandingHalf } from '@/db/queries/visits'

interface Block {
  telescopeId: number
  eveningDate: string
  from: number
  to: number
}

/** Parts of nights less what visits have of them, fractions of the dark time. */
export function blocksLessHalves<B extends Block>(
  blocks: readonly B[],
  halves: readonly Pick<StandingHalf, 'telescopeId' | 'date' | 'half'>[],
): B[] {
  return blocks.flatMap((block) => {
    const own = halves.filter(
      ({ telescopeId, date }) => telescopeId === block.telescopeId && date === block.eveningDate,
    )
    const has = (half: StandingHalf['half']) => own.some((one) => one.half === half)
    const from = has('first') ? Math.max(block.from, 0.5) : block.from
    const to = has('second') ? Math.min(block.to, 0.5) : block.to
    return from < to ? [{ ...block, from, to }] : []
  })
}
