'use client'

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
import { countInWords } from '@/lib/format'
import { paths } from '@/lib/paths'
import { FacingTable } from './FacingTable'
import type { SaveAwardAction, TakePlanAction } from './nightsActions'
import { OfferedHours } from './OfferedHours'
import { SeasonCellsKey } from './SeasonCellsKey'

export interface NightsBoardProps {
  initial: NightsView
  save: SaveAwardAction
  takePlan: TakePlanAction
}

/** The ranking laid into the hours on offer: a suggestion, what is given, and the running total against the offer. */
export function NightsBoard({ initial, save, takePlan }: NightsBoardProps) {
  const { data: view = initial } = useTableQuery({
    key: ['panel', 'nights', initial.panelId],
    url: `${paths.api.table('panel-nights')}?call=${initial.callSlug}&panel=${initial.panelId}`,
    schema: nightsView,
    initialData: initial,
  })
  const { busy, deed } = useDeed()
  const panelPath = usePanelPath(view.callSlug)
  const [open, setOpen] = useState<number | null>(null)
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
          <section aria-labelledby="by-rank" className="mt-10">
            <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-4 border-t-4 border-accent pt-3">
              <div className="max-w-prose">
                <h2 id="by-rank" className="text-section">
                  By rank, then fill
                </h2>
                <p className="m-0 text-table text-muted">
                  In turn, each takes what it asked, or as much as its targets can use of what is left, if
                  that is not less than its least useful award: half of what it asked. Those above keep their
                  hours and make room where they can. Then those below the line fill what remains.
                </p>
              </div>
              {canGive ? (
                <Button
                  look="secondary"
                  busy={busy === 'plan'}
                  busyWord="Taking over"
                  onClick={() =>
                    deed(
                      'plan',
                      () => takePlan({ panelId: view.panelId }),
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
            </div>
          </section>
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
