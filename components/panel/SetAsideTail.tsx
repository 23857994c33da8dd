'use client'

import { Button } from '@/components/ui/Button'
import { BarNote } from '@/components/ui/BarNote'
import { showToast } from '@/components/ui/showToast'
import type { DiscussionView } from '@/lib/domain/rankings/readDiscussion'
import { countInWords } from '@/lib/format'
import type { SetAsideAction } from './discussionActions'
import { useDeed } from './useDeed'

/** Offers to set a clear tail aside: proposals that could not belong above the line whatever is said. */
export function SetAsideTail({ view, action }: { view: DiscussionView; action: SetAsideAction }) {
  const { busy, deed } = useDeed()
  const { list, panelId, phase } = view.ranking
  if (!list || view.tail.length === 0 || phase === 'decided' || phase === 'archived') return null
  const count = countInWords(view.tail.length, 'proposal', 'proposals', true)
  return (
    <div className="mt-6">
      <BarNote tone="accent">
        <p className="m-0 max-w-prose">
          {count} at the end {view.tail.length === 1 ? 'has' : 'have'} less than 5 chances in 100 of belonging
          above the line. Set aside, {view.tail.length === 1 ? 'it is' : 'they are'} not discussed unless
          someone asks.
        </p>
        <div className="mt-2">
          <Button
            look="secondary"
            size="small"
            busy={busy === 'aside'}
            busyWord="Setting aside"
            onClick={() =>
              deed(
                'aside',
                () =>
                  action({
                    panelId,
                    rankingId: list.id,
                    version: list.version,
                    proposalIds: view.tail,
                    aside: true,
                  }),
                () => showToast(`${count} set aside`),
              )
            }
          >
            Set the tail aside
          </Button>
        </div>
      </BarNote>
    </div>
  )
}
