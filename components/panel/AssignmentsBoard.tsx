'use client'

import { useState } from 'react'
import { useTableQuery } from '@/components/tables/useTableQuery'
import { BarNote } from '@/components/ui/BarNote'
import { Button } from '@/components/ui/Button'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { showToast } from '@/components/ui/showToast'
import type { Seat } from '@/lib/domain/assignments/schema'
import type { SuggestedPairs } from '@/lib/domain/assignments/suggestionWords'
import {
  assignmentsView,
  type AssignmentRow,
  type AssignmentsView,
} from '@/lib/domain/assignments/assignmentsView'
import { countInWords } from '@/lib/format'
import { paths } from '@/lib/paths'
import { AssignmentsTable } from './AssignmentsTable'
import type { AssignmentActions } from './assignmentActions'
import { DragReaders } from './DragReaders'
import type { DraggedReader } from './dragTypes'
import { nextSeat } from './nextSeat'
import { ReviewerLoads } from './ReviewerLoads'
import { ReviewerStrip } from './ReviewerStrip'
import { SuggestBar } from './SuggestBar'
import { useDeed } from './useDeed'

export interface AssignmentsBoardProps {
  initial: AssignmentsView
  actions: AssignmentActions
}

/** Who reads what: proposals with their readers, loads of the reviewers, a suggestion to start from. */
export function AssignmentsBoard({ initial, actions }: AssignmentsBoardProps) {
  const { data = initial } = useTableQuery({
    key: ['panel', 'assignments', initial.panelId],
    url: `${paths.api.table('panel-assignments')}?call=${initial.callSlug}&panel=${initial.panelId}`,
    schema: assignmentsView,
    initialData: initial,
  })
  const { busy, deed } = useDeed()
  const [suggestion, setSuggestion] = useState<SuggestedPairs | null>(null)
  const { panelId } = data
  const canAssign = data.phase === 'closed' || data.phase === 'review'
  const readers = data.rows.reduce((sum, row) => sum + row.readers.length, 0)

  const undoAssign = (assignmentIds: number[]) => () =>
    deed('undo', () => actions.takeOff({ panelId, assignmentIds }))
  const assign = (name: string, pairs: SuggestedPairs['pairs'], words: string) =>
    deed(
      name,
      () => actions.assign({ panelId, pairs }),
      ({ assignmentIds }) => {
        setSuggestion(null)
        showToast(words, { undo: undoAssign(assignmentIds) })
      },
    )

  const drop = ({ personId, name, from }: DraggedReader, row: AssignmentRow) => {
    const pair = { proposalId: row.proposalId, personId, seat: nextSeat(row) }
    const words = `${name} reads ${row.reviewNumber}`
    if (!from) return assign(`add-${row.proposalId}-${personId}`, [pair], words)
    const left = data.rows.find(({ proposalId }) => proposalId === from.proposalId)
    const seat =
      left?.readers.find(({ assignmentId }) => assignmentId === from.assignmentId)?.seat ?? 'reader'
    const move = (assignmentId: number, proposalId: number, to: Seat) => () =>
      actions.move({ panelId, assignmentId, proposalId, seat: to })
    deed(
      `move-${from.assignmentId}`,
      move(from.assignmentId, row.proposalId, pair.seat),
      ({ assignmentId }) =>
        showToast(`${words}, no longer ${from.reviewNumber}`, {
          undo: () => deed('undo', move(assignmentId, from.proposalId, seat)),
        }),
    )
  }

  return (
    <>
      <PageTitle
        title="Assignments"
        lead={`${data.panelName}, call ${data.callNumber}: ${countInWords(data.rows.length, 'proposal', 'proposals')}, ${countInWords(readers, 'assignment', 'assignments')}.`}
        actions={
          data.phase === 'closed' ? (
            <Button
              busy={busy === 'start'}
              busyWord="Starting"
              onClick={() =>
                deed(
                  'start',
                  () => actions.startReview({ callId: data.callId }),
                  () => showToast('The review has started'),
                )
              }
            >
              Start the review
            </Button>
          ) : null
        }
      />
      {data.phase === 'planned' || data.phase === 'open' ? (
        <div className="mt-6">
          <BarNote tone="lamp">The call is open. Reviewers are assigned once it has closed.</BarNote>
        </div>
      ) : null}
      {data.groups > 1 ? (
        <div className="mt-6">
          <BarNote tone="marginal">
            The reviewers fall into {countInWords(data.groups, 'group', 'groups')} that share no proposal.
            Link them by one reader more: otherwise harsh and lenient reviewers cannot be told apart.
          </BarNote>
        </div>
      ) : null}
      {canAssign ? (
        <SuggestBar
          quorum={data.quorum}
          suggestion={suggestion}
          busy={busy}
          onSuggest={(each) => deed('suggest', () => actions.suggest({ panelId, each }), setSuggestion)}
          onAssign={(pairs) =>
            assign('assign', pairs, `${countInWords(pairs.length, 'assignment', 'assignments', true)} made`)
          }
          onLeave={() => setSuggestion(null)}
        />
      ) : null}
      <DragReaders view={data} onDrop={drop}>
        {canAssign ? <ReviewerStrip view={data} /> : null}
        <div className="mt-6">
          <AssignmentsTable
            view={data}
            canAssign={canAssign}
            suggested={suggestion?.pairs ?? []}
            onAdd={(pair, words) => assign(`add-${pair.proposalId}-${pair.personId}`, [pair], words)}
            onTakeOff={(pair, assignmentId, words) =>
              deed(
                `take-off-${assignmentId}`,
                () => actions.takeOff({ panelId, assignmentIds: [assignmentId] }),
                () =>
                  showToast(words, {
                    undo: () =>
                      deed(`undo-${assignmentId}`, () => actions.assign({ panelId, pairs: [pair] })),
                  }),
              )
            }
            onSeat={(assignmentId, seat) =>
              deed(`seat-${assignmentId}-${seat}`, () => actions.changeSeat({ panelId, assignmentId, seat }))
            }
            replace={actions.replace}
          />
        </div>
      </DragReaders>
      <section className="mt-10">
        <SectionHeading title="Loads" aside="Pages are those of the justifications." />
        <div className="mt-4">
          <ReviewerLoads reviewers={data.reviewers} />
        </div>
      </section>
    </>
  )
}
