import { assessmentWords } from '@/components/assessments/assessmentWords'
import { VerdictMark } from '@/components/ui/VerdictMark'
import type { InstrumentAssessment } from '@/lib/domain/assessments/types'

export type AssessmentAbove = Pick<InstrumentAssessment, 'verdict' | 'instrument' | 'trueSeconds' | 'reason'>

const bars: Readonly<Record<AssessmentAbove['verdict'], string>> = {
  accepted: 'border-t-feasible',
  change: 'border-t-marginal',
  'not-possible': 'border-t-not-feasible',
}

/** What the instrument scientist said: it stands above whatever was computed, in both directions. */
export function StandsAbove({ assessment }: { assessment: AssessmentAbove }) {
  const { verdict, instrument, trueSeconds, reason } = assessment
  return (
    <section
      aria-label="Assessment of the instrument scientist"
      className={`mb-3 rounded border border-t-4 border-rule bg-surface p-4 text-table ${bars[verdict]}`}
    >
      <p className="m-0 text-body">
        <VerdictMark
          verdict={verdict}
          strong
          words={`${assessmentWords({ verdict, trueSeconds })} on ${instrument}`}
        />
      </p>
      <p className="mt-2 mb-0">“{reason}”</p>
    </section>
  )
}
