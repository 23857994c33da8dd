'use client'

import { useMemo } from 'react'
import { TableTools } from '@/components/tables/TableTools'
import { useRows } from '@/components/tables/useRows'
import { useTableState } from '@/components/tables/useTableState'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import type { ChoiceOrRank } from '@/lib/domain/decisions/choiceWords'
import type { NightsView } from '@/lib/domain/decisions/nightsView'
import { AwardForm } from './AwardForm'
import { ChoiceForm } from './ChoiceForm'
import { FacingHead } from './FacingHead'
import { FacingKey } from './FacingKey'
import { FacingRow } from './FacingRow'
import { LeastForms } from './LeastForms'
import { NightsCsv } from './NightsCsv'
import type { NightsActions } from './nightsActions'
import { nightsChips, nightsColumns } from './nightsColumns'
import type { Seasons } from './useSeasons'

export interface FacingTableProps {
  view: NightsView
  openId: number | null
  /** Null where nothing can be given any more. */
  onOpen: ((proposalId: number | null) => void) | null
  actions: Pick<NightsActions, 'save' | 'choose' | 'setLeast'>
  outlookOf: Seasons['outlookOf']
  onSaved: () => void
  onTry: (proposalId: number, choice: ChoiceOrRank) => void
}

/** Hours suggested and hours given, facing each other; in the order of the ranking, the line among them. */
export function FacingTable(props: FacingTableProps) {
  const { view, openId, onOpen, actions, outlookOf, onSaved, onTry } = props
  const [state, setState] = useTableState('')
  const rows = useMemo(
    () =>
      view.rows.map((row) => ({
        ...row,
        outlooks: row.lines.map((line) => outlookOf(row.proposalId, line.instrumentId)),
      })),
    [view.rows, outlookOf],
  )
  const shown = useRows(rows, nightsColumns, nightsChips, state)
  const change = (next: Partial<typeof state>) => void setState(next)
  const most = Math.max(
    1,
    ...view.rows.flatMap((row) => row.lines.map((line) => Math.max(line.askedSeconds, line.wholeSeconds))),
  )
  const lastAbove =
    state.sort === '' || state.sort === 'rank' ? shown.findLast((row) => row.isAbove) : undefined
  return (
    <section aria-label="Hours suggested and hours given" className="mt-4">
      <TableTools
        find="Number, title or instrument"
        chips={nightsChips}
        columns={nightsColumns}
        rows={rows}
        shown={shown}
        state={state}
        onChange={change}
        phoneSort
        actions={<NightsCsv callNumber={view.callNumber} rows={shown} />}
      />
      <div role="table" aria-label={`Hours of call ${view.callNumber}`}>
        <FacingHead sort={state.sort} onSort={(sort) => change({ sort })} />
        <div role="rowgroup" className="max-sm:rule-open">
          {shown.map((row) => (
            <div
              key={row.proposalId}
              className={row === lastAbove ? 'border-b-2 border-dashed border-lamp' : 'border-b border-rule'}
            >
              <FacingRow
                row={row}
                mostHours={most / 3600}
                firstTelescope={view.telescopes[0]?.id}
                isOpen={openId === row.proposalId}
                onOpen={onOpen ? () => onOpen(openId === row.proposalId ? null : row.proposalId) : null}
              />
              {openId === row.proposalId ? (
                <div role="row">
                  <div role="cell" aria-colspan={4}>
                    <AwardForm
                      key={row.decisionVersion}
                      row={row}
                      view={view}
                      save={actions.save}
                      onSaved={onSaved}
                      onLeave={() => onOpen?.(null)}
                    >
                      <LeastForms row={row} panelId={view.panelId} setLeast={actions.setLeast} />
                      <ChoiceForm
                        row={row}
                        panelId={view.panelId}
                        choose={actions.choose}
                        onTry={(choice) => onTry(row.proposalId, choice)}
                      />
                    </AwardForm>
                  </div>
                </div>
              ) : null}
            </div>
          ))}
        </div>
      </div>
      {shown.length === 0 ? (
        <p className="my-3 text-table text-muted">
          Nothing matches.{' '}
          <LinkLikeButton onClick={() => change({ find: '', show: '' })}>Show all</LinkLikeButton>
        </p>
      ) : null}
      <FacingKey telescopes={view.telescopes} />
    </section>
  )
}
