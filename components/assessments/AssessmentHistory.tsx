import { BarNote } from '@/components/ui/BarNote'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { VerdictMark } from '@/components/ui/VerdictMark'
import type { Assessment } from '@/lib/domain/assessments/types'
import type { ProposalComputation } from '@/lib/domain/observations/types'
import { formatHoursFromSeconds, formatUtc } from '@/lib/format'
import { assessmentWords } from './assessmentWords'

export interface AssessmentHistoryProps {
  history: readonly Assessment[]
  passedAt: Date | null
  computed: Pick<ProposalComputation, 'verdict' | 'checksClear' | 'checksTotal'>
}

/** The standing assessment as the panel reads it, and those it took the place of. */
export function AssessmentHistory({ history, passedAt, computed }: AssessmentHistoryProps) {
  const [standing, ...earlier] = history
  if (!standing) return null
  return (
    <section>
      <SectionHeading
        title="As the panel will see it"
        dense
        aside={passedAt ? `passed ${formatUtc(passedAt)}` : 'not passed yet'}
      />
      <div className="mt-3">
        <BarNote tone={standing.verdict}>
          <p className="m-0">
            <VerdictMark verdict={standing.verdict} strong words={assessmentWords(standing)} />
          </p>
          <p className="mt-1">“{standing.reason}”</p>
          {computed.verdict ? (
            <p className="mt-1 text-muted">
              Computed: {computed.verdict.replace('-', ' ')}, {computed.checksClear} of {computed.checksTotal}
              .
            </p>
          ) : null}
        </BarNote>
      </div>
      {earlier.length > 0 ? (
        <details className="mt-4 text-table">
          <summary className="text-accent">Earlier assessments, {earlier.length}</summary>
          <ul className="plain-list mt-1">
            {earlier.map((assessment) => (
              <li key={assessment.id} className="border-t border-rule py-2">
                {assessment.verdict.replace('-', ' ')}, {formatHoursFromSeconds(assessment.trueSeconds)}: “
                {assessment.reason}”
                <span className="block text-caption text-muted">{formatUtc(assessment.assessedAt)}</span>
              </li>
            ))}
          </ul>
        </details>
      ) : null}
    </section>
  )
}
