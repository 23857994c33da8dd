import { Countdown } from '@/components/ui/Countdown'
import { LinkButton } from '@/components/ui/LinkButton'
import type { Call, CallPhase, TelescopeOfferView } from '@/lib/domain/calls/types'
import { formatAtSite, formatUtcInstant } from '@/lib/format'
import { paths } from '@/lib/paths'
import { OfferRows } from './OfferRows'
import { phaseWords } from './phaseWords'
import { seasonWords } from './seasonWords'

interface OpenCallPanelProps {
  call: Call
  phase: CallPhase
  offer: readonly TelescopeOfferView[]
  now: Date
  utcOffsetHours: number
  /** On the page of the call itself the link to it is left out. */
  isOwnPage?: boolean
}

/** The call in force with its countdown, its telescopes, and the way in. */
export function OpenCallPanel({
  call,
  phase,
  offer,
  now,
  utcOffsetHours,
  isOwnPage = false,
}: OpenCallPanelProps) {
  const isOpen = phase === 'open'
  return (
    <section
      aria-label={`Call ${call.number}`}
      className="rounded-b border border-t-4 border-rule border-t-lamp bg-surface p-6 max-sm:p-4"
    >
      <div className="flex flex-wrap items-baseline justify-between gap-x-4">
        <h2 className="text-section">
          Call {call.number} is {phaseWords[phase]}
        </h2>
        <span className="text-caption text-muted">{seasonWords(call.seasonFrom, call.seasonTo)}</span>
      </div>
      {isOpen ? (
        <>
          <p className="mt-2 text-display text-lamp">
            <Countdown untilMs={call.closesAt.getTime()} serverNowMs={now.getTime()} parts={3} />
          </p>
          <p className="mb-4 text-table">
            to {formatUtcInstant(call.closesAt)}{' '}
            <span className="text-muted">({formatAtSite(call.closesAt, utcOffsetHours)})</span>
          </p>
        </>
      ) : (
        <p className="mt-2 mb-4 text-table text-muted">
          {phase === 'planned'
            ? `It opens at ${formatUtcInstant(call.opensAt)}.`
            : `It closed at ${formatUtcInstant(call.closesAt)}.`}
        </p>
      )}
      <OfferRows offer={offer} />
      <div className="mt-4 flex flex-wrap gap-3 border-t border-rule pt-4">
        {isOpen ? <LinkButton href={paths.newProposal(call.slug)}>Start a proposal</LinkButton> : null}
        {isOwnPage ? null : (
          <LinkButton look="secondary" href={paths.call(call.slug)}>
            Read the call
          </LinkButton>
        )}
      </div>
    </section>
  )
}
