import { Facts } from '@/components/ui/Facts'
import type { RankingView } from '@/lib/domain/rankings/rankingView'
import { ABSENT, formatNumber } from '@/lib/format'

/** How far reviewers agree, and what is left over in one score. */
export function Agreement({ view }: { view: RankingView }) {
  const { agreement } = view
  if (!agreement) return null
  return (
    <Facts
      title="Agreement"
      facts={[
        { term: 'One reviewer, ICC', value: formatNumber(agreement.single, 2) },
        {
          term: `Mean of ${formatNumber(agreement.meanReviews, Number.isInteger(agreement.meanReviews) ? 0 : 1)}, ICC`,
          value: formatNumber(agreement.mean, 2),
        },
        {
          term: 'Krippendorff’s alpha',
          value: agreement.alpha === null ? ABSENT : formatNumber(agreement.alpha, 2),
        },
        { term: 'Left over, a score', value: `± ${formatNumber(agreement.leftOver, 2)}` },
      ]}
    />
  )
}
