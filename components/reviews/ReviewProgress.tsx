import { Countdown } from '@/components/ui/Countdown'
import { ProgressBar } from '@/components/ui/ProgressBar'
import { TextLink } from '@/components/ui/TextLink'
import type { ReviewsOfCall } from '@/lib/domain/reviews/readReviewLines'
import { formatDay, formatUtc } from '@/lib/format'
import { paths } from '@/lib/paths'

/** How far a reviewer is in a call, and how long there is. */
export function ReviewProgress({ group }: { group: ReviewsOfCall }) {
  const { call, lines, declaredAt, now } = group
  const finished = lines.filter(({ state }) => state === 'finished').length
  const words = `${finished} of ${lines.length} finished`
  return (
    <section aria-label={`Call ${call.number}`} className="pt-3 rule-open">
      <div className="flex flex-wrap items-baseline justify-between gap-x-8 gap-y-1">
        <h2 className="text-section">
          Call {call.number}: {words}
        </h2>
        <p className="m-0 text-table">
          {now < call.reviewsDueAt ? (
            <>
              <span className="text-muted">Reviews are due in </span>
              <strong className="font-semibold text-lamp">
                <Countdown untilMs={call.reviewsDueAt.getTime()} serverNowMs={now.getTime()} parts={2} />
              </strong>
              <span className="text-muted"> · {formatUtc(call.reviewsDueAt)}</span>
            </>
          ) : (
            <>
              <span className="text-muted">Reviews were due on {formatUtc(call.reviewsDueAt)}</span>
              {finished < lines.length && now < call.panelMeetsAt ? (
                <strong className="font-semibold text-lamp">; finish before the panel meets</strong>
              ) : null}
            </>
          )}
        </p>
      </div>
      <div className="mt-2">
        <ProgressBar share={lines.length ? finished / lines.length : 0} label={words} />
      </div>
      <p className="mt-2 text-table">
        <TextLink href={paths.meeting(call.slug)}>The meeting of the panel</TextLink>
      </p>
      {declaredAt && now < call.panelMeetsAt ? (
        <p className="mt-2 text-caption text-muted">
          You declared your interests on {formatDay(declaredAt)}, from the list of all names.{' '}
          <TextLink href={paths.interests(call.slug)}>Something has changed</TextLink>
        </p>
      ) : null}
    </section>
  )
}
