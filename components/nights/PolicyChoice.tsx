'use client'

import { useDeed } from '@/components/panel/useDeed'
import { Button } from '@/components/ui/Button'
import { showToast } from '@/components/ui/showToast'
import type { NightsView } from '@/lib/domain/decisions/nightsView'
import type { NightsPolicy } from '@/lib/domain/decisions/policyWords'
import { countInWords } from '@/lib/format'
import type { TakePlanAction } from './nightsActions'
import { PolicyCard } from './PolicyCard'

export interface PolicyChoiceProps {
  view: NightsView
  /** Null where the one shown cannot be taken over here. */
  takePlan: TakePlanAction | null
  onShow: (policy: NightsPolicy) => void
}

/** The ways to divide the nights side by side; the one shown can be taken over. */
export function PolicyChoice({ view, takePlan, onShow }: PolicyChoiceProps) {
  const { busy, deed } = useDeed()
  const offered = view.telescopes.reduce((sum, { offeredSeconds }) => sum + offeredSeconds, 0)
  return (
    <div className="mt-10 grid gap-x-16 gap-y-8 md:grid-cols-2">
      {view.policies.map((summary) => (
        <PolicyCard
          key={summary.policy}
          summary={summary}
          offeredSeconds={offered}
          isShown={summary.policy === view.policy}
          onShow={() => onShow(summary.policy)}
        >
          {takePlan && summary.policy === view.policy ? (
            <Button
              look="secondary"
              busy={busy === 'plan'}
              busyWord="Taking over"
              onClick={() =>
                deed(
                  'plan',
                  () => takePlan({ panelId: view.panelId, policy: view.policy }),
                  ({ awarded }) =>
                    showToast(
                      `${countInWords(awarded, 'proposal is', 'proposals are', true)} given the hours suggested`,
                    ),
                )
              }
            >
              Take the suggestion over
            </Button>
          ) : null}
        </PolicyCard>
      ))}
    </div>
  )
}
