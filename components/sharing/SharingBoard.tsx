'use client'

import { useState } from 'react'
import { RankingChanges } from '@/components/rankings/RankingChanges'
import { EmptyState } from '@/components/ui/EmptyState'
import { LinkButton } from '@/components/ui/LinkButton'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { nearFrom, nearTo } from '@/lib/panel/sharing/nearLines'
import type { SharingView } from '@/lib/domain/sharing/sharingView'
import { formatPercent } from '@/lib/format'
import { DemandChart } from './DemandChart'
import { MeetingPanel } from './MeetingPanel'
import { PanelStates } from './PanelStates'
import { RuleSection } from './RuleSection'
import { SharedTable } from './SharedTable'
import type { MeetingOfPanels, SaveShareRule } from './sharingActions'

export interface SharingBoardProps {
  view: SharingView
  saveRule: SaveShareRule
  /** Null for the office, which reads. */
  meeting: MeetingOfPanels | null
  /** Where a call of one panel leads on. */
  back: { href: string; words: string }
}

/** How the panels of a call share the time, and their lists as one order that the nights follow. */
export function SharingBoard({ view, saveRule, meeting, back }: SharingBoardProps) {
  const [selected, setSelected] = useState<number | null>(null)
  const chosen = view.rows.find((row) => row.proposalId === selected) ?? null
  const title = (
    <PageTitle
      title="Between panels"
      lead="Panels that share no reviewers are not compared by any model. Their time is shared by a rule that is fixed before ranks are."
    />
  )
  if (view.panels.length < 2)
    return (
      <>
        {title}
        <div className="mt-6">
          <EmptyState
            title="This call has one panel"
            actions={
              <LinkButton look="secondary" href={back.href}>
                {back.words}
              </LinkButton>
            }
          >
            All the time is its own, and its ranking is the order. Nothing is to be shared.
          </EmptyState>
        </div>
      </>
    )
  return (
    <>
      {title}
      <div className="mt-6">
        <RuleSection view={view} save={saveRule} />
      </div>
      <section className="mt-10">
        <SectionHeading title="Demand and shares" />
        <div className="mt-3">
          <DemandChart view={view} />
        </div>
        <p className="mt-3 mb-0 max-w-prose text-caption text-muted">
          Dark time of the night calendar, less what is held back. All proposals a panel judges are counted,
          so that the shares are the same for all who read them.
        </p>
      </section>
      <section className="mt-10">
        <SectionHeading title={view.list ? 'The order' : 'The order by the rule'} />
        <div className="mt-3 grid gap-x-9 gap-y-10 lg:grid-cols-[minmax(0,1fr)_17rem]">
          <div className="min-w-0">
            <SharedTable view={view} selected={selected} onSelect={setSelected} />
            <p className="mt-3 mb-0 max-w-prose text-caption text-muted">
              The lists follow one another by the part of its panel’s share that is used with each proposal,
              the most of any telescope. Where two are equal, the one of the higher rank in its panel stands
              first, then the panel that was made first. Near the lines: {formatPercent(nearFrom)} to{' '}
              {formatPercent(nearTo)} of a share, and right above and below a panel’s line.
            </p>
          </div>
          <aside className="flex min-w-0 flex-col gap-8">
            <MeetingPanel view={view} actions={meeting} chosen={chosen} />
            <RankingChanges changes={view.changes} what="place" />
            <PanelStates view={view} />
          </aside>
        </div>
      </section>
    </>
  )
}
