import { SectionHeading } from '@/components/ui/SectionHeading'
import { VerdictMark } from '@/components/ui/VerdictMark'
import { observationsOn } from '@/lib/domain/assessments/rules'
import type { RequestView } from '@/lib/domain/assessments/readRequest'

/** The computed verdict on this instrument, and each check that is not clear, with why. */
export function FoundByEngine({ view }: { view: RequestView }) {
  const { observations, modes, targets, computation } = view.proposal
  const own = new Set(observationsOn(observations, modes, view.instrumentId).map(({ id }) => id))
  const names = new Map(targets.map(({ id, name }) => [id, name]))
  const rows = computation.observations.filter(({ observationId }) => own.has(observationId))
  const checks = rows.flatMap(({ observationId, targetId, checks: all }) =>
    all.map((check) => ({
      ...check,
      key: `${observationId}-${check.id}`,
      target: names.get(targetId) ?? '',
    })),
  )
  const open = checks.filter(({ verdict }) => verdict !== 'feasible')
  return (
    <section>
      <SectionHeading title="What the engine found" dense />
      <p className="mt-3 text-table">
        {checks.length - open.length} of {checks.length} checks clear on {view.instrument}.
      </p>
      <ul className="plain-list text-table">
        {open.map((check) => (
          <li key={check.key} className="border-t border-rule py-2.5 last:border-b">
            <VerdictMark verdict={check.verdict} words={`${check.target}: ${check.name}`} />
            <p className="mt-1">{check.why}</p>
            <p className="m-0 text-muted">
              Measured {check.measured}; feasible to {check.feasibleTo}, fails at {check.failsAt}.
            </p>
          </li>
        ))}
      </ul>
    </section>
  )
}
