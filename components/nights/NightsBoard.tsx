'use client'

import { parseAsStringLiteral, useQueryState } from 'nuqs'
import { useState } from 'react'
import { usePanelPath } from '@/components/panel/usePanelPath'
import { useTableQuery } from '@/components/tables/useTableQuery'
import { BarNote } from '@/components/ui/BarNote'
import { EmptyState } from '@/components/ui/EmptyState'
import { LinkButton } from '@/components/ui/LinkButton'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { PageTitle } from '@/components/ui/PageTitle'
import { conflictInWords } from '@/lib/domain/decisions/mustWords'
import { nightsView, type NightsView } from '@/lib/domain/decisions/nightsView'
import { nightsPolicy } from '@/lib/domain/decisions/policyWords'
import { paths } from '@/lib/paths'
import { FacingTable } from './FacingTable'
import type { NightsActions } from './nightsActions'
import { OfferedHours } from './OfferedHours'
import { PlanFiles } from './PlanFiles'
import { PolicyChoice } from './PolicyChoice'
import { SeasonCellsKey } from './SeasonCellsKey'
import { SeasonsNote } from './SeasonsNote'
import { TrialForm } from './TrialForm'
import { TrialNote } from './TrialNote'
import { useSeasons } from './useSeasons'
import { useTrial } from './useTrial'

export interface NightsBoardProps {
  initial: NightsView
  /** What the page was rendered with, as it stands in the address. */
  initialTrial?: string
  actions: NightsActions
}

/** The ranking laid into the hours on offer: a suggestion, what is given, and the running total against the offer. */
export function NightsBoard({ initial, initialTrial = '', actions }: NightsBoardProps) {
  const [policy, setPolicy] = useQueryState(
    'policy',
    parseAsStringLiteral(nightsPolicy.options).withDefault('rank'),
  )
  const { text, trial, onTry } = useTrial()
  const query = new URLSearchParams({
    ...{ call: initial.callSlug, panel: String(initial.panelId), policy },
    ...(text ? { trial: text } : {}),
  })
  const { data, isFetching } = useTableQuery({
    key: ['panel', 'nights', initial.panelId, policy, text],
    url: `${paths.api.table('panel-nights')}?${query}`,
    schema: nightsView,
    initialData: policy === initial.policy && text === initialTrial ? initial : undefined,
  })
  const view = data ?? initial
  const panelPath = usePanelPath(view.callSlug)
  const [open, setOpen] = useState<number | null>(null)
  const [isTrying, setTrying] = useState(false)
  const isGiven = view.rows.some(({ lines }) => lines.some(({ givenSeconds }) => givenSeconds > 0))
  const [chosenOf, setOf] = useState<'suggested' | 'given' | null>(null)
  const of = isGiven ? (chosenOf ?? (trial ? 'suggested' : 'given')) : 'suggested'
  const seasons = useSeasons({
    ...{ callSlug: view.callSlug, panelId: view.panelId, of, policy, trial: text },
    isOn: view.hasRanking && view.rows.length > 0 && view.telescopes.length > 0,
  })
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
      {view.telescopes.length === 0 ? (
        <div className="mt-6">
          <BarNote tone="lamp">
            The call has no nights for science yet, so there is nothing to give. The office enters them in the
            night calendar of the call.
          </BarNote>
        </div>
      ) : (
        <>
          <div className="mt-6 grid gap-x-16 gap-y-8 md:grid-cols-2">
            {view.telescopes.map((telescope) => (
              <OfferedHours
                key={telescope.id}
                telescope={telescope}
                view={view}
                hold={canGive && !trial ? actions.hold : null}
              />
            ))}
          </div>
          <SeasonCellsKey />
        </>
      )}
      {view.hasRanking ? (
        <>
          <section aria-label="Try it otherwise" className="mt-8" aria-busy={isFetching || undefined}>
            {view.conflict.length > 0 ? (
              <div className="mb-6">
                <BarNote tone="not-feasible">{conflictInWords(view.conflict)}</BarNote>
              </div>
            ) : null}
            {view.isTrial && trial ? (
              <TrialNote
                key={`${text} ${view.policy}`}
                {...{ view, trial }}
                canTake={canGive}
                takePlan={actions.takePlan}
                onLeave={() => onTry(undefined)}
              />
            ) : null}
            {isTrying ? (
              <div className="mt-6">
                <TrialForm key={text} {...{ view, trial, onTry }} onLeave={() => setTrying(false)} />
              </div>
            ) : (
              <p className="mt-4 mb-0 text-table">
                <LinkLikeButton onClick={() => setTrying(true)}>
                  Try other weather, other nights or other hours held back
                </LinkLikeButton>
              </p>
            )}
          </section>
          <PolicyChoice
            view={view}
            takePlan={canGive && !view.isTrial ? actions.takePlan : null}
            onShow={(next) => void setPolicy(next)}
          />
          <SeasonsNote seasons={seasons} of={of} onOf={isGiven ? setOf : null} />
          <FacingTable
            view={view}
            openId={open}
            onOpen={canGive ? setOpen : null}
            actions={actions}
            outlookOf={seasons.outlookOf}
            onSaved={() => setOpen(null)}
            onTry={(proposalId, choice) => {
              setOpen(null)
              onTry({ ...trial, choices: { ...trial?.choices, [proposalId]: choice } })
            }}
          />
          {isGiven ? (
            <div className="mt-6">
              <PlanFiles hrefOf={(file) => paths.panelPlan(view.callSlug, file, view.panelId)} />
            </div>
          ) : null}
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
