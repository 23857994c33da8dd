'use client'

import { useQueryClient } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import { useMemo } from 'react'
import type { SaveStatementAction } from '@/components/panel/discussionActions'
import { sentenceOf, useDeed } from '@/components/panel/useDeed'
import { usePanelPath } from '@/components/panel/usePanelPath'
import { SeasonsNote } from '@/components/nights/SeasonsNote'
import { useSeasons } from '@/components/nights/useSeasons'
import { DataTable } from '@/components/tables/DataTable'
import { useTableQuery } from '@/components/tables/useTableQuery'
import { BarNote } from '@/components/ui/BarNote'
import { Button } from '@/components/ui/Button'
import { ConfirmTyped } from '@/components/ui/ConfirmTyped'
import { EmptyState } from '@/components/ui/EmptyState'
import { LinkButton } from '@/components/ui/LinkButton'
import { PageTitle } from '@/components/ui/PageTitle'
import { showToast } from '@/components/ui/showToast'
import type { ActionResult } from '@/lib/actions/result'
import { decisionsView, type DecisionsView } from '@/lib/domain/decisions/decisionsView'
import { countInWords, formatUtc } from '@/lib/format'
import { paths } from '@/lib/paths'
import type { ApproveAction } from './ApprovalNote'
import { ApproveOthers } from './ApproveOthers'
import type { WithholdAction } from './CommentRow'
import { DecisionDetail } from './DecisionDetail'
import { flagsOf } from './flagsOf'
import { decisionColumns } from './decisionColumns'
import { ReportLinks } from './ReportLinks'
import { nextToOpen } from './unopened'
import type { OpenAction } from './useOpening'
import { useShownDecision } from './useShownDecision'
import { StatementForm } from './StatementForm'

export interface DecisionsBoardProps {
  initial: DecisionsView
  prepare: (input: { panelId: number }) => Promise<ActionResult<{ prepared: number }>>
  save: SaveStatementAction
  approve: ApproveAction
  openDecision: OpenAction
  withhold: WithholdAction
  release: (input: { panelId: number; typed: string }) => Promise<ActionResult<{ released: number }>>
}

/** Three steps: prepare each decision, have a second person approve it, then make all of them known at once. */
export function DecisionsBoard(props: DecisionsBoardProps) {
  const { initial, prepare, save, approve, openDecision, withhold, release } = props
  const { data: view = initial } = useTableQuery({
    key: ['panel', 'decisions', initial.panelId],
    url: `${paths.api.table('panel-decisions')}?call=${initial.callSlug}&panel=${initial.panelId}`,
    schema: decisionsView,
    initialData: initial,
  })
  const client = useQueryClient()
  const { busy, deed } = useDeed()
  const panelPath = usePanelPath(view.callSlug)
  const router = useRouter()
  const { open, setOpen, show } = useShownDecision()
  const { panelId, rows } = view
  const seasons = useSeasons({
    ...{ callSlug: view.callSlug, panelId, of: 'given' },
    isOn: view.hasRanking && rows.some(({ lines }) => lines.length > 0),
  })
  const { outlookOf } = seasons
  const columns = useMemo(() => decisionColumns(open, setOpen, outlookOf), [open, setOpen, outlookOf])
  const count = (outcome: string) => rows.filter((row) => row.outcome === outcome).length
  const prepared = rows.filter((row) => row.isPrepared).length
  const canPrepare =
    view.hasRanking && !view.isReleased && view.phase !== 'decided' && view.phase !== 'archived'

  const makeKnown = async (): Promise<string | null> => {
    const result = await release({ panelId, typed: String(view.callNumber) })
    if (!result.ok) return sentenceOf(result)
    showToast(
      `${countInWords(result.data.released, 'decision is', 'decisions are', true)} known; letters are on their way`,
    )
    await client.invalidateQueries({ queryKey: ['panel'] })
    router.refresh()
    return null
  }

  return (
    <>
      <PageTitle
        title="Decisions"
        lead={`${count('awarded')} awarded, ${count('reserve')} in reserve, ${count('declined')} declined. ${prepared} of ${rows.length} prepared, ${rows.filter((row) => row.approval === 'approved').length} approved.`}
        actions={
          canPrepare ? (
            <>
              <Button
                look="secondary"
                busy={busy === 'prepare'}
                busyWord="Preparing"
                onClick={() =>
                  deed(
                    'prepare',
                    () => prepare({ panelId }),
                    (data) =>
                      showToast(
                        `${countInWords(data.prepared, 'decision is', 'decisions are', true)} prepared`,
                      ),
                  )
                }
              >
                {prepared > 0 ? 'Prepare them again' : 'Prepare decisions'}
              </Button>
              <ApproveOthers rows={rows} panelId={panelId} approve={approve} onShow={show} />
              <ConfirmTyped
                trigger="Make them known …"
                triggerProps={{ look: 'primary', size: 'regular', offReason: view.whyNot }}
                title={`Make the decisions of call ${view.callNumber} known?`}
                expected={String(view.callNumber)}
                expectedName="the number of the call"
                confirm="Make them known"
                busyWord="Making known"
                onConfirm={makeKnown}
              >
                Every investigator gets one letter, and reads the outcome at once. The hours are booked. This
                cannot be done twice, and cannot be taken back.
              </ConfirmTyped>
            </>
          ) : null
        }
      />
      <div className="mt-6">
        {view.isReleased ? (
          <BarNote tone="accent">These decisions are made known, and the letters are written.</BarNote>
        ) : (
          <BarNote tone="lamp">
            Letters are announced for {formatUtc(new Date(view.lettersAt))}. Outcomes follow from the hours
            given under Nights; statements begin with the comments to the investigators, unsigned. Whoever did
            not prepare a decision approves it: chair, deputy or office.
          </BarNote>
        )}
      </div>
      {view.isFrozen ? (
        <div className="mt-4">
          <ReportLinks
            pdf={paths.panelReportFile(view.callSlug, 'report.pdf', panelId)}
            csv={paths.panelReportFile(view.callSlug, 'report.csv', panelId)}
          />
        </div>
      ) : null}
      <SeasonsNote seasons={seasons} of="given" onOf={null} />
      <div className="mt-6">
        <DataTable
          caption={`Decisions of call ${view.callNumber}`}
          columns={columns}
          rows={rows}
          rowId={(row) => String(row.proposalId)}
          find="Number or title"
          chips={[
            { id: 'awarded', label: 'Awarded', matches: (row) => row.outcome === 'awarded' },
            { id: 'reserve', label: 'Reserve', matches: (row) => row.outcome === 'reserve' },
            { id: 'declined', label: 'Declined', matches: (row) => row.outcome === 'declined' },
            { id: 'open', label: 'Not prepared', matches: (row) => !row.isPrepared },
            { id: 'waits', label: 'Not approved', matches: (row) => row.approval !== 'approved' },
            { id: 'flags', label: 'To look at again', matches: (row) => flagsOf(row) > 0 },
          ]}
          csv={`decisions-call-${view.callNumber}`}
          selectedId={open === null ? null : String(open)}
          detail={(row) =>
            row.proposalId === open ? (
              <DecisionDetail
                row={row}
                panelId={panelId}
                approve={approve}
                openDecision={openDecision}
                onNext={nextToOpen(rows, row.proposalId, show)}
                withhold={canPrepare ? withhold : null}
              >
                <StatementForm
                  key={row.version}
                  row={row}
                  panelId={panelId}
                  canEdit={canPrepare}
                  action={save}
                  onLeave={() => setOpen(null)}
                />
              </DecisionDetail>
            ) : null
          }
          phone="cards"
          empty={
            <EmptyState
              title="Nothing to decide yet"
              actions={
                <LinkButton look="secondary" href={panelPath('ranking')}>
                  Go to the ranking
                </LinkButton>
              }
            >
              Decisions rest on the ranking and the hours given. Begin the ranking first.
            </EmptyState>
          }
        />
      </div>
    </>
  )
}
