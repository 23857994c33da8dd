'use client'

import { useTableQuery } from '@/components/tables/useTableQuery'
import { BarNote } from '@/components/ui/BarNote'
import { KeyFigure } from '@/components/ui/KeyFigure'
import { LinkButton } from '@/components/ui/LinkButton'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { TextLink } from '@/components/ui/TextLink'
import { showToast } from '@/components/ui/showToast'
import type { ActionResult } from '@/lib/actions/result'
import { assignmentsView, type AssignmentsView } from '@/lib/domain/assignments/assignmentsView'
import { countInWords, formatPercent, formatUtc } from '@/lib/format'
import { paths } from '@/lib/paths'
import { ProposalProgress } from './ProposalProgress'
import { RecusalsTable } from './RecusalsTable'
import { ReviewerProgress } from './ReviewerProgress'
import { useDeed } from './useDeed'
import { usePanelPath } from './usePanelPath'

export interface ProgressBoardProps {
  initial: AssignmentsView
  remind: (input: { panelId: number; personId: number }) => Promise<ActionResult<{ owed: number }>>
}

/** How far the reviews are, by reviewer and by proposal, and what is owed. */
export function ProgressBoard({ initial, remind }: ProgressBoardProps) {
  const { data = initial } = useTableQuery({
    key: ['panel', 'assignments', initial.panelId],
    url: `${paths.api.table('panel-assignments')}?call=${initial.callSlug}&panel=${initial.panelId}`,
    schema: assignmentsView,
    initialData: initial,
  })
  const { busy, deed } = useDeed()
  const panelPath = usePanelPath(data.callSlug)
  const all = data.reviewers.reduce((sum, reviewer) => sum + reviewer.proposals, 0)
  const finished = data.reviewers.reduce((sum, reviewer) => sum + reviewer.finished, 0)
  const waiting = data.rows.filter((row) => row.readers.some((reader) => reader.state !== 'finished')).length
  return (
    <>
      <PageTitle
        title="Progress"
        lead={`Reviews are due on ${formatUtc(new Date(data.reviewsDueAt))}. A late one counts until the panel meets.`}
        actions={
          data.phase === 'review' && finished > 0 ? (
            <LinkButton href={panelPath('ranking')}>Go on to the ranking</LinkButton>
          ) : null
        }
      />
      <div className="mt-6 flex flex-wrap gap-x-16 gap-y-4">
        <KeyFigure
          value={all > 0 ? formatPercent(finished / all) : '–'}
          label={
            all > 0 ? `${finished} of ${countInWords(all, 'review', 'reviews')} finished` : 'nothing assigned'
          }
        />
        <KeyFigure value={all - finished} label="owed" />
        <KeyFigure value={waiting} label="proposals wait for a review" />
      </div>
      {all === 0 ? (
        <div className="mt-6">
          <BarNote tone="lamp">
            Nothing is assigned yet.{' '}
            <TextLink href={panelPath('assignments')}>Begin with the assignments</TextLink>
          </BarNote>
        </div>
      ) : null}
      <section className="mt-10">
        <SectionHeading title="By reviewer" aside="A reminder is a letter; one a day at most." />
        <div className="mt-4">
          <ReviewerProgress
            view={data}
            busy={busy}
            onRemind={(reviewer) =>
              deed(
                `remind-${reviewer.personId}`,
                () => remind({ panelId: data.panelId, personId: reviewer.personId }),
                ({ owed }) =>
                  showToast(`${reviewer.name} is reminded of ${countInWords(owed, 'review', 'reviews')}`),
              )
            }
          />
        </div>
      </section>
      <section className="mt-10">
        <SectionHeading title="By proposal" />
        <div className="mt-4">
          <ProposalProgress view={data} />
        </div>
      </section>
      {data.recusals.length > 0 ? (
        <section className="mt-10">
          <SectionHeading title="Left with an interest" aside="What was scored there does not count." />
          <div className="mt-4">
            <RecusalsTable view={data} />
          </div>
        </section>
      ) : null}
    </>
  )
}
