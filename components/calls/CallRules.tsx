import { SectionHeading } from '@/components/ui/SectionHeading'
import { priceWords } from '@/components/fees/priceWords'
import type { CallCriterion, CallKind, FeeRate } from '@/lib/domain/calls/types'
import { formatHoursFromSeconds, formatUtc } from '@/lib/format'
import { askWords } from './askWords'
import { CriteriaList } from './CriteriaList'
import { limitWords } from './limitWords'

interface CallRulesProps {
  kinds: readonly CallKind[]
  criteria: readonly CallCriterion[]
  rates: readonly FeeRate[]
  /** Null when the call has no fee: then nothing here speaks of one. */
  currency: string | null
  graceUntil: Date
}

/** Kinds of proposal with their limits, and what proposals are judged by. */
export function CallRules({ kinds, criteria, rates, currency, graceUntil }: CallRulesProps) {
  return (
    <>
      <SectionHeading title="Kinds of proposal" />
      <ul className="plain-list mt-3">
        {kinds.map((kind) => (
          <li key={kind.id} className="border-t border-rule py-3">
            <span className="font-semibold">{kind.title}</span>
            <span className="block text-table text-muted">
              {limitWords(kind)}
              {kind.maxSeconds ? `, at most ${formatHoursFromSeconds(kind.maxSeconds)}` : ''}
              {askWords(kind)}
              {currency ? `, ${priceWords(kind, rates, currency)}` : ''}
              {kind.closesAt ? `, closes ${formatUtc(kind.closesAt)}` : ''}
            </span>
          </li>
        ))}
      </ul>
      {currency ? (
        <p className="mt-3 text-table text-muted">
          A proposal is in as soon as it is sent; its fee is settled by {formatUtc(graceUntil)}, by card, by
          an invoice to an institute, or by a waiver.
        </p>
      ) : null}
      <div className="mt-10">
        <SectionHeading title="What proposals are judged by" />
      </div>
      <div className="mt-3">
        <CriteriaList criteria={criteria} />
      </div>
      <p className="mt-3 text-table text-muted">
        Scores run from 0 to 10 in halves, 10 best. Reviewers see no names, and nobody reviews where they have
        an interest.
      </p>
    </>
  )
}
