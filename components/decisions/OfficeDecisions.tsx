'use client'

import { DataTable } from '@/components/tables/DataTable'
import { useTableQuery } from '@/components/tables/useTableQuery'
import { EmptyState } from '@/components/ui/EmptyState'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { officeDecisionsView, type OfficeDecisionsView } from '@/lib/domain/decisions/officeDecisionsView'
import { formatUtc } from '@/lib/format'
import { paths } from '@/lib/paths'
import type { ApproveAction } from './ApprovalNote'
import { ApproveOthers } from './ApproveOthers'
import { decisionColumns } from './decisionColumns'
import { DecisionDetail } from './DecisionDetail'
import { flagsOf } from './flagsOf'
import { ReportLinks } from './ReportLinks'
import { nextToOpen } from './unopened'
import type { OpenAction } from './useOpening'
import { useShownDecision } from './useShownDecision'

/** The office as second person: what each panel prepared, read before it is approved. */
export function OfficeDecisions({
  initial,
  approve,
  openDecision,
}: {
  initial: OfficeDecisionsView
  approve: ApproveAction
  openDecision: OpenAction
}) {
  const { data: view = initial } = useTableQuery({
    key: ['panel', 'office-decisions', initial.callSlug],
    url: `${paths.api.table('office-decisions')}?call=${encodeURIComponent(initial.callSlug)}`,
    schema: officeDecisionsView,
    initialData: initial,
  })
  const { open, setOpen, show } = useShownDecision()
  const rows = view.panels.flatMap((panel) => panel.rows)
  const approved = rows.filter((row) => row.approval === 'approved').length
  return (
    <>
      <PageTitle
        title="Decisions"
        lead={`${approved} of ${rows.length} approved by a second person. Letters are announced for ${formatUtc(new Date(view.lettersAt))}; the chair makes the decisions known.`}
      />
      {view.panels.map((panel) => (
        <section key={panel.panelId} className="mt-10">
          <SectionHeading
            title={panel.name}
            aside={
              <ApproveOthers rows={panel.rows} panelId={panel.panelId} approve={approve} onShow={show} />
            }
          />
          {panel.isFrozen ? (
            <div className="mt-3">
              <ReportLinks
                pdf={paths.officeReportFile(view.callSlug, 'report.pdf', panel.panelId)}
                csv={paths.officeReportFile(view.callSlug, 'report.csv', panel.panelId)}
              />
            </div>
          ) : null}
          <div className="mt-4">
            <DataTable
              caption={`Decisions of ${panel.name}`}
              columns={decisionColumns(open, setOpen)}
              rows={panel.rows}
              rowId={(row) => String(row.proposalId)}
              urlPrefix={`p${panel.panelId}-`}
              find="Number or title"
              chips={[
                { id: 'waits', label: 'Not approved', matches: (row) => row.approval !== 'approved' },
                { id: 'flags', label: 'To look at again', matches: (row) => flagsOf(row) > 0 },
              ]}
              csv={`decisions-call-${view.callNumber}-${panel.panelId}`}
              selectedId={open === null ? null : String(open)}
              detail={(row) =>
                row.proposalId === open ? (
                  <DecisionDetail
                    row={row}
                    panelId={panel.panelId}
                    approve={approve}
                    openDecision={openDecision}
                    onNext={nextToOpen(panel.rows, row.proposalId, show)}
                    withhold={null}
                  >
                    <p className="m-0 max-w-prose [overflow-wrap:anywhere] whitespace-pre-line">
                      {row.statement || 'No statement was written.'}
                    </p>
                  </DecisionDetail>
                ) : null
              }
              phone="cards"
              empty={
                <EmptyState title="Nothing is prepared yet">
                  The panel has not begun its ranking. Its decisions stand here once it has.
                </EmptyState>
              }
            />
          </div>
        </section>
      ))}
    </>
  )
}
