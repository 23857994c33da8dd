import { LinkButton } from '@/components/ui/LinkButton'
import { Panel } from '@/components/ui/Panel'
import type { ReviewsOfCall } from '@/lib/domain/reviews/readReviewLines'
import { countInWords, formatUtc } from '@/lib/format'
import { paths } from '@/lib/paths'

/** Before anything of a call is seen: the list of names. */
export function DeclareFirst({ group: { call, assigned, declaredAt } }: { group: ReviewsOfCall }) {
  return (
    <Panel
      bar="lamp"
      title={`Call ${call.number}: names first`}
      aside={`Reviews are due ${formatUtc(call.reviewsDueAt)}`}
    >
      <p className="mb-4 max-w-prose">
        {declaredAt
          ? 'A proposal came in after you went through the names. Go through the list once more; what you ticked stays.'
          : `${countInWords(assigned, 'proposal waits', 'proposals wait', true)} for you. Before you open one, go through the names of all investigators of the call and tick those with whom you have an interest.`}
      </p>
      <LinkButton href={paths.interests(call.slug)}>Go through the names</LinkButton>
    </Panel>
  )
}
