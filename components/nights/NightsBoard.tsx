'use client'

import { parseAsStringLiteral, useQueryState } from 'nuqs'
import { useState } from 'react'
import { useDeed } from '@/components/panel/useDeed'
import { usePanelPath } from '@/components/panel/usePanelPath'
import { useTableQuery } from '@/components/tables/useTableQuery'
import { Button } from '@/components/ui/Button'
import { EmptyState } from '@/components/ui/EmptyState'
import { LinkButton } from '@/components/ui/LinkButton'
import { PageTitle } from '@/components/ui/PageTitle'
import { showToast } from '@/components/ui/showToast'
import { nightsView, type NightsView } from '@/lib/domain/decisions/nightsView'
import { nightsPolicy } from '@/lib/domain/decisions/nightsPolicySchema'
import { countInWords } from '@/lib/format'
import { paths } from '@/lib/paths'
import { FacingTable } from './FacingTable'
import type { SaveAwardAction, TakePlanAction } from './nightsActions'
import { OfferedHours } from './OfferedHours'
import { PolicyCard } from './PolicyCard'
import { SeasonCellsKey } from './SeasonCellsKey'

export interface NightsBoardProps {
  initial: NightsView
  save: SaveAwardAction
  takePlan: TakePlanAction
}

/** The ranking laid into the hours on offer: a suggestion, what is given, and the running total against the offer. */
export function NightsBoard({ initial, save, takePlan }: NightsBoardProps) {
  const [policy, setPolicy] = useQueryState(
    'policy',
    parseAsStringLiteral(nightsPolicy.options).withDefault('rank'),
  )
  const { data } = useTableQuery({
    key: ['panel', 'nights', initial.panelId, policy],
    url: `${paths.api.table('panel-nights')}?call=${initial.callSlug}&panel=${initial.panelId}&policy=${policy}`,
    schema: nightsView,
    initialData: policy === initial.policy ? initial : undefined,
  })
  const view = data ?? initial
  const { busy, deed } = useDeed()
  const panelPath = usePanelPath(view.callSlug)
  const [open, setOpen] = useState<number | null>(null)
  const offered = view.telescopes.reduce((sum, { offeredSeconds }) => sum + offeredSeconds, 0)
  const canGive = view.hasRanking && view.phase !== 'decided' && view.phase !== 'archived'
  return (
    <>
      <PageTitle
        title="Nights"
        lead="The ranking laid into the hours on offer, by half-month, sidereal time and Moon."
        actions={
          view.hasRanking ? <LinkButton href={panelPath('decisions')}>Go on to decisions</LinkButton> : null
        }
      />
      <div className="mt-6 grid gap-x-16 gap-y-8 md:grid-cols-2">
        {view.telescopes.map((telescope) => (
          <OfferedHours key={telescope.id} telescope={telescope} seasonFrom={view.seasonFrom} />
        ))}
      </div>
      <SeasonCellsKey />
      {view.hasRanking ? (
        <>
          <div className="mt-10 grid gap-x-16 gap-y-8 md:grid-cols-2">
            {view.policies.map((summary) => (
              <PolicyCard
                key={summary.policy}
                summary={summary}
                offeredSeconds={offered}
                isShown={summary.policy === view.policy}
                onShow={() => void setPolicy(summary.policy)}
              >
                {canGive && summary.policy === view.policy ? (
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
          <FacingTable
            view={view}
            openId={open}
            onOpen={canGive ? setOpen : null}
            save={save}
            onSaved={() => setOpen(null)}
          />
        </>
      ) : (
        <div className="mt-10">
          <EmptyState
            title="No ranking yet"
            actions={
              <LinkButton look="secondary" href={panelPath('ranking')}>
                Go to the ranking
              </LinkButton>
            }
          >
            Hours are given in the order of the ranking. Begin it first; what is on offer stands above.
          </EmptyState>
        </div>
      )}
    </>
  )
}
