import { LinkButton } from '@/components/ui/LinkButton'
import { TextLink } from '@/components/ui/TextLink'
import type { SentProposal } from '@/lib/domain/submission/readSent'
import { beforeDeadline, sentHeading } from '@/lib/domain/submission/sentWords'
import { formatUtcInstant } from '@/lib/format'
import { paths } from '@/lib/paths'

/** The reference, large, and the second it was received. */
export function SentHead({ sent }: { sent: SentProposal }) {
  const { contents, version, deadline, fee } = sent
  const isOut = contents.state === 'withdrawn' || contents.state === 'lapsed'
  const owes = fee?.state === 'due'
  return (
    <div>
      <p
        role="status"
        className={`m-0 flex items-center gap-3 text-section font-semibold ${isOut ? 'text-not-feasible' : owes ? 'text-lamp' : 'text-feasible'}`}
      >
        {isOut ? null : (
          <svg width="22" height="16" viewBox="0 0 22 16" aria-hidden="true" className="shrink-0">
            <path d="M1.5 8.5 7.5 14.5 20.5 1.5" fill="none" stroke="currentColor" strokeWidth="2.5" />
          </svg>
        )}
        {sentHeading(sent)}
      </p>
      <h1 className="mt-4 mb-3 text-reference max-sm:text-hero">{contents.reference}</h1>
      <p className="m-0 max-w-[36rem] text-[1.1875rem] leading-[1.875rem]">
        {version.snapshot.contents.title} reached the observatory at{' '}
        <strong className="font-semibold">{formatUtcInstant(version.arrivedAt)}</strong>
        {version.arrivedAt < deadline ? `, ${beforeDeadline(version.arrivedAt, deadline)}` : ''}.
      </p>
      <div className="mt-5 flex flex-wrap items-center gap-x-5 gap-y-3">
        <LinkButton
          href={paths.proposalRecord(contents.reference)}
          download
          look={owes ? 'secondary' : 'primary'}
        >
          Keep the record
        </LinkButton>
        <LinkButton href={paths.proposalCalendar(contents.reference)} download look="secondary">
          Add the dates to a calendar
        </LinkButton>
        <TextLink href={paths.proposal(contents.reference)}>Go to the proposal</TextLink>
      </div>
    </div>
  )
}
