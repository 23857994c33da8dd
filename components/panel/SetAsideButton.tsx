'use client'

import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import type { DiscussedProposal } from '@/lib/domain/rankings/readDiscussion'
import type { RankingView } from '@/lib/domain/rankings/rankingView'
import type { SetAsideAction } from './discussionActions'
import { useDeed } from './useDeed'

export interface SetAsideButtonProps {
  proposal: DiscussedProposal
  ranking: RankingView
  action: SetAsideAction
}

/** Sets one proposal aside, or brings it back. */
export function SetAsideButton({ proposal, ranking, action }: SetAsideButtonProps) {
  const { deed } = useDeed()
  const { list, panelId } = ranking
  if (!list) return null
  const aside = !proposal.setAside
  return (
    <LinkLikeButton
      onClick={() =>
        deed(
          'aside',
          () =>
            action({
              panelId,
              rankingId: list.id,
              version: list.version,
              proposalIds: [proposal.proposalId],
              aside,
            }),
          () => showToast(`${proposal.reviewNumber} is ${aside ? 'set aside' : 'brought back'}`),
        )
      }
    >
      {aside ? 'Set it aside' : 'Bring it back'}
    </LinkLikeButton>
  )
}
