import { partsScored, weightedMean } from '@/lib/domain/reviews/rules'
import type { SheetCriterion } from '@/lib/domain/reviews/types'
import { formatNumber } from '@/lib/format'

/** The weighted mean of what is scored so far, double ruled. */
export function WeightedMean({ criteria }: { criteria: readonly SheetCriterion[] }) {
  const { scored, all } = partsScored(criteria)
  const isPart = scored > 0 && scored < all
  const words = isPart ? `Weighted, of the ${scored} parts scored` : 'Weighted'
  return (
    <p role="status" className="m-0 flex items-baseline justify-between gap-4 py-2 font-semibold rule-total">
      {words}
      <strong className="text-h2">{formatNumber(weightedMean(criteria), 1)}</strong>
    </p>
  )
}
