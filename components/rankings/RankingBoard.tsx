'use client'

import { useState } from 'react'
import { useDeed } from '@/components/panel/useDeed'
import { useTableQuery } from '@/components/tables/useTableQuery'
import { BarNote } from '@/components/ui/BarNote'
import { PageTitle } from '@/components/ui/PageTitle'
import { rankingView, type RankingView } from '@/lib/domain/rankings/rankingView'
import { countInWords } from '@/lib/format'
import { paths } from '@/lib/paths'
import { Agreement } from './Agreement'
import { FormulaPanel } from './FormulaPanel'
import { LeniencyChart } from './LeniencyChart'
import { LinePanel } from './LinePanel'
import { MovePanel } from './MovePanel'
import type { RankingActions } from './rankingActions'
import { RankingChanges } from './RankingChanges'
import { RankingHeadActions } from './RankingHeadActions'
import { RankingKey } from './RankingKey'
import { RankingTable } from './RankingTable'

export interface RankingBoardProps {
  initial: RankingView
  actions: RankingActions
}

/** The ranked list with how sure it is, the line through it, and what stands beside it for the chair. */
export function RankingBoard({ initial, actions }: RankingBoardProps) {
  const { data: view = initial } = useTableQuery({
    key: ['panel', 'ranking', initial.panelId],
    url: `${paths.api.table('panel-ranking')}?call=${initial.callSlug}&panel=${initial.panelId}`,
    schema: rankingView,
    initialData: initial,
  })
  const { busy, deed } = useDeed()
  const [selected, setSelected] = useState<number | null>(null)
  const { list, panelId } = view
  const key = { panelId, rankingId: list?.id ?? 0, version: list?.version ?? 0 }
  const canChange = list !== null && view.phase !== 'decided' && view.phase !== 'archived'
  const chosen = view.rows.find((row) => row.proposalId === selected) ?? null
  return (
    <>
      <PageTitle
        title="Ranking"
        lead={
          view.scores === 0
            ? `${countInWords(view.rows.length, 'proposal', 'proposals', true)}, no score yet.`
            : `${countInWords(view.rows.length, 'proposal', 'proposals', true)}, ${countInWords(view.scores, 'score', 'scores')} from ${countInWords(view.reviewers, 'reviewer', 'reviewers')}, all given before discussion.`
        }
        actions={
          <RankingHeadActions
            view={view}
            busy={busy}
            canChange={canChange}
            onStart={() => deed('start', () => actions.start({ panelId }))}
            onFreeze={() => deed('freeze', () => actions.freeze(key))}
          />
        }
      />
      {list === null ? (
        <div className="mt-6">
          <BarNote tone="lamp">
            {view.owed > 0
              ? `Reviews are still coming in: ${countInWords(view.owed, 'is', 'are')} owed. The order is that of the raw means so far; places are moved and the line drawn once the ranking has begun.`
              : view.scores === 0
                ? 'No review is finished yet, so there is nothing to rank by: the order means nothing.'
                : 'The order is that of the raw means. Places are moved and the line drawn once the ranking has begun.'}
          </BarNote>
        </div>
      ) : null}
      <div className="mt-6 grid gap-x-9 gap-y-10 lg:grid-cols-[minmax(0,1fr)_15.625rem]">
        <div className="min-w-0">
          <RankingTable view={view} selected={selected} onSelect={setSelected} />
          <RankingKey draws={view.draws} seed={view.seed} />
        </div>
        <aside className="flex min-w-0 flex-col gap-8">
          <LinePanel
            view={view}
            busy={busy}
            onMove={canChange ? (direction) => deed('line', () => actions.line({ ...key, direction })) : null}
          />
          {canChange ? (
            <MovePanel
              key={`${selected ?? 0}-${key.rankingId}-${key.version}`}
              row={chosen}
              count={view.rows.length}
              listKey={key}
              action={actions.move}
            />
          ) : null}
          <FormulaPanel view={view} action={actions.formula} />
          <RankingChanges changes={view.changes} />
          <LeniencyChart view={view} />
          <Agreement view={view} />
        </aside>
      </div>
      <p className="mt-10 border-t border-rule pt-4 text-caption text-muted">
        {view.corrected
          ? 'Merit is fitted with every reviewer’s leniency taken out (REML).'
          : 'Merit is fitted without taking leniency out.'}
      </p>
    </>
  )
}
