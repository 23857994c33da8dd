import { affinityWords } from '@/lib/domain/expertise/affinityWords'
import { formatNumber } from '@/lib/format'

/** How well a reviewer knows a subject, in words and as a number; in words alone for who has not said. */
export function AffinityMark({ affinity }: { affinity: number | null }) {
  const words = affinityWords(affinity)
  return <>{affinity === null ? words : `${words}, ${formatNumber(affinity, 2)}`}</>
}
