import type { StandingHalf } from '@/db/queries/visits'
import type { NightBlock } from '../calls/nightBlock'

/** A half of a night that a visit has and that would no longer be whole for science with its instrument; null if none. */
export function visitInTheWay(
  halves: readonly StandingHalf[],
  blocks: readonly NightBlock[],
): StandingHalf | null {
  return (
    halves.find(({ date, half, instrumentId }) => {
      const [from, to] = half === 'first' ? [0, 0.5] : [0.5, 1]
      const open = blocks
        .filter(
          (block) =>
            block.eveningDate === date &&
            block.useFor === 'science' &&
            (block.instrumentId === null || block.instrumentId === instrumentId),
        )
        .reduce((sum, block) => sum + Math.max(0, Math.min(to, block.to) - Math.max(from, block.from)), 0)
      return open < to - from - 1e-6
    }) ?? null
  )
}
