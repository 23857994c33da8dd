import { assessmentWords } from '@/components/assessments/assessmentWords'
import { BarNote } from '@/components/ui/BarNote'
import { VerdictMark } from '@/components/ui/VerdictMark'
import type { InstrumentAssessment } from '@/lib/domain/assessments/types'

export interface AssessmentNoteProps {
  assessment: Pick<InstrumentAssessment, 'verdict' | 'instrument' | 'trueSeconds' | 'reason'> & {
    panelNote?: string
  }
}

/** An instrument's assessment as the panel and the investigators read it; the note only where it is given. */
export function AssessmentNote({ assessment }: AssessmentNoteProps) {
  const { verdict, instrument, trueSeconds, reason, panelNote } = assessment
  return (
    <div className="mt-5 max-w-prose">
      <BarNote tone={verdict}>
        <p className="m-0">
          <VerdictMark
            verdict={verdict}
            strong
            words={`${assessmentWords({ verdict, trueSeconds })} on ${instrument}`}
          />
        </p>
        <p className="mt-1">“{reason}”</p>
        {panelNote ? <p className="mt-1 text-muted">For the panel: {panelNote}</p> : null}
      </BarNote>
    </div>
  )
}
