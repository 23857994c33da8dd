import type { Target } from '@/lib/domain/proposals/types'
import { emptyTargetRow, liveTarget, targetRow } from '@/lib/domain/targets/rules'
import type { TargetRow } from '@/lib/domain/targets/schema'

type Seat = Pick<Target, 'id' | 'position' | 'version'>

const lived = new WeakMap<TargetRow, { kept: Target | null; seat: string; target: Target | null }>()

export const sameRow = (a: TargetRow, b: TargetRow) => JSON.stringify(a) === JSON.stringify(b)

/**
 * The target a row stands for while it is typed: the kept one itself while nothing differs from it. The same row gives
 * the same object again, so that in a long table only the row one types in is drawn anew.
 */
export function livedTarget(seat: Seat, kept: Target | null, row: TargetRow | undefined): Target | null {
  if (!row) return kept ?? liveTarget(seat, emptyTargetRow)
  const under = `${seat.id} ${seat.position} ${seat.version}`
  const known = lived.get(row)
  if (known && known.kept === kept && known.seat === under) return known.target
  const target = kept && sameRow(row, targetRow(kept)) ? kept : (liveTarget(seat, row) ?? kept)
  lived.set(row, { kept, seat: under, target })
  return target
}
