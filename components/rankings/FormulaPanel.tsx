import { SectionHeading } from '@/components/ui/SectionHeading'
import type { RankingView } from '@/lib/domain/rankings/rankingView'
import { formatList, formatUtcWithYear } from '@/lib/format'
import { FormulaForm } from './FormulaForm'
import type { RankingActions } from './rankingActions'

/** The panel's own measure beside the raw mean: written before the review opens, fixed from then on. */
export function FormulaPanel({ view, action }: { view: RankingView; action: RankingActions['formula'] }) {
  const { text, by, at, fixed, quantities, without } = view.formula
  return (
    <section className="text-table">
      <SectionHeading dense title="Own measure" />
      {fixed === null ? (
        <>
          <p className="mt-2">
            A measure of the panel’s own, shown beside the raw mean. It is fixed when the review opens, before
            any score is seen.
          </p>
          <div className="mt-3">
            <FormulaForm key={text ?? ''} view={view} action={action} />
          </div>
          <details className="mt-4">
            <summary className="cursor-pointer max-sm:min-h-11">What may stand in it</summary>
            <dl className="m-0 mt-2 grid gap-y-2 text-caption">
              {quantities.map(({ name, words }) => (
                <div key={name}>
                  <dt className="font-semibold">{name}</dt>
                  <dd className="m-0 text-muted">{words}</dd>
                </div>
              ))}
            </dl>
            <p className="mt-2 text-caption text-muted">
              Numbers, + − * / ^, brackets, and min, max, abs, sqrt, exp, log.
            </p>
          </details>
        </>
      ) : text === null ? (
        <p className="mt-2 text-muted">
          None was written before the review opened; the order is the raw mean’s.
        </p>
      ) : (
        <>
          <p className="mt-2 font-semibold [overflow-wrap:anywhere]">{text}</p>
          <p className="mt-1 text-caption text-muted">
            {by && at ? `Written by ${by}, ${formatUtcWithYear(new Date(at))}. ` : ''}
            {fixed}
          </p>
          {without.length > 0 ? (
            <p className="mt-2 text-caption text-lamp">
              It has no value for {formatList(without)}: a quantity is missing there, or it divides by zero.
            </p>
          ) : null}
        </>
      )}
    </section>
  )
}
