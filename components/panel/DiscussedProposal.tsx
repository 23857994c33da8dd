import { DiscussButton } from '@/components/discussions/DiscussButton'
import type { DiscussAction } from '@/components/discussions/meetingActions'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { TextLink } from '@/components/ui/TextLink'
import { VerdictMark } from '@/components/ui/VerdictMark'
import type { DiscussedProposal as Proposal, DiscussionView } from '@/lib/domain/rankings/readDiscussion'
import { formatHoursFromSeconds, formatNumber } from '@/lib/format'
import { paths } from '@/lib/paths'
import { ConsensusForm } from './ConsensusForm'
import type { SaveStatementAction, SetAsideAction } from './discussionActions'
import { ScoreSpread } from './ScoreSpread'
import { SetAsideButton } from './SetAsideButton'
import { SpokenWords } from './SpokenWords'

export interface DiscussedProposalProps {
  proposal: Proposal
  view: DiscussionView
  save: SaveStatementAction
  setAside: SetAsideAction
  discuss: DiscussAction
  /** It is what the panel discusses now. */
  isOnTable: boolean
}

const seatWords = { first: 'first reader', second: 'second voice', reader: 'reader' } as const

/** One proposal in discussion: who speaks, how scores spread, what was written, what the panel agrees on. */
export function DiscussedProposal({
  proposal,
  view,
  save,
  setAside,
  discuss,
  isOnTable,
}: DiscussedProposalProps) {
  const { ranking } = view
  const canWrite = ranking.list !== null && ranking.phase !== 'decided' && ranking.phase !== 'archived'
  const speakers = proposal.readers.filter((reader) => reader.seat !== 'reader')
  return (
    <article aria-labelledby="discussed" className="min-w-0">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-2 pt-3 rule-open">
        <h2 id="discussed" className="text-h2">
          {proposal.rank}. {proposal.title}
        </h2>
        <span className="flex flex-wrap gap-x-4">
          <TextLink href={paths.panelPacket(ranking.callSlug, proposal.reviewNumber)} plain strong>
            {`Packet ${proposal.reviewNumber}`}
          </TextLink>
          <TextLink href={paths.panelReport(ranking.callSlug, proposal.reviewNumber)}>Report</TextLink>
          {ranking.teamsOpen ? (
            <TextLink href={paths.panelTeam(ranking.callSlug, proposal.reviewNumber)}>Who asks</TextLink>
          ) : null}
        </span>
      </div>
      <p className="mt-1 text-table text-muted">
        {proposal.lines
          .map((line) => `${line.instrument} ${formatHoursFromSeconds(line.seconds)}`)
          .join(', ')}
        {speakers.length > 0
          ? `; ${speakers.map((reader) => `reviewer ${reader.number} is ${seatWords[reader.seat]}`).join(', ')}`
          : ''}
        .
      </p>
      <div className="mt-4 flex flex-wrap items-end gap-x-10 gap-y-4">
        <ScoreSpread proposal={proposal} />
        <p className="m-0 text-table">
          Raw mean <strong>{formatNumber(proposal.raw, 2)}</strong>, spread {formatNumber(proposal.spread, 2)}
          ; merit {formatNumber(proposal.merit, 2)}.
        </p>
        {canWrite ? (
          <span className="flex flex-wrap items-baseline gap-x-5 gap-y-2 text-table">
            {proposal.setAside || isOnTable ? null : (
              <DiscussButton panelId={ranking.panelId} proposalId={proposal.proposalId} discuss={discuss} />
            )}
            <SetAsideButton proposal={proposal} ranking={ranking} action={setAside} />
          </span>
        ) : null}
      </div>
      {proposal.notes.map((note) => (
        <div key={note.instrument} className="mt-4 text-table">
          <VerdictMark verdict={note.verdict} strong />{' '}
          <span className="text-muted">on {note.instrument}:</span> {note.reason}
          {note.note ? <p className="mt-1 mb-0 max-w-prose">Note to the panel: {note.note}</p> : null}
        </div>
      ))}
      <div className="mt-8 grid gap-8">
        <SpokenWords title="To the panel" words={proposal.toPanel} />
        <SpokenWords title="To the investigators" words={proposal.toInvestigators} />
      </div>
      <section className="mt-8">
        <SectionHeading dense title="What the panel agrees on" />
        {canWrite ? (
          <div className="mt-3">
            <ConsensusForm proposal={proposal} panelId={ranking.panelId} action={save} />
          </div>
        ) : (
          <p className="mt-2 max-w-prose text-table">
            {proposal.statement ||
              'Nothing is written yet. Statements are written once the ranking has begun.'}
          </p>
        )}
      </section>
    </article>
  )
}
