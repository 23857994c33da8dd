import { TextLink } from '@/components/ui/TextLink'
import type { DiscussionView } from '@/lib/domain/rankings/readDiscussion'

export interface NextInOrderProps {
  proposals: DiscussionView['proposals']
  openId: number
  /** Where a proposal is discussed, by its review number. */
  addressOf: (reviewNumber: string) => string
}

/** From one discussed proposal to its neighbours, passing over those set aside. */
export function NextInOrder({ proposals, openId, addressOf }: NextInOrderProps) {
  const at = proposals.findIndex((one) => one.proposalId === openId)
  const before = proposals.slice(0, at).findLast((one) => !one.setAside)
  const after = proposals.slice(at + 1).find((one) => !one.setAside)
  if (!before && !after) return null
  return (
    <nav
      aria-label="Next in order"
      className="mt-10 flex flex-wrap justify-between gap-x-8 gap-y-3 border-t border-rule pt-4 text-table"
    >
      {before ? (
        <TextLink href={addressOf(before.reviewNumber)}>{`Before: ${before.rank}. ${before.title}`}</TextLink>
      ) : null}
      {after ? (
        <span className="ml-auto">
          <TextLink href={addressOf(after.reviewNumber)}>{`Next: ${after.rank}. ${after.title}`}</TextLink>
        </span>
      ) : null}
    </nav>
  )
}
