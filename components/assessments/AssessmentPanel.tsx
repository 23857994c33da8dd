import { Panel } from '@/components/ui/Panel'
import { countedSeconds } from '@/lib/domain/assessments/rules'
import type { RequestView } from '@/lib/domain/assessments/readRequest'
import { formatDay } from '@/lib/format'
import { AssessmentForm, type AssessmentFormProps } from './AssessmentForm'

export interface AssessmentPanelProps {
  view: RequestView
  action: AssessmentFormProps['action']
}

/** The one panel that wants action: the assessment, or why it is settled. */
export function AssessmentPanel({ view, action }: AssessmentPanelProps) {
  const standing = view.history[0] ?? null
  return (
    <Panel
      bar="accent"
      title="Your assessment"
      aside={standing ? `Saved ${formatDay(standing.assessedAt)}` : `Due ${formatDay(view.assessmentsDueAt)}`}
    >
      {view.shut ? (
        <p className="m-0">{view.shut}</p>
      ) : (
        <AssessmentForm
          key={standing?.id ?? 0}
          requestId={view.requestId}
          standing={standing}
          askedSeconds={countedSeconds(view.targets, 'askedSeconds')}
          computedSeconds={countedSeconds(view.targets, 'neededSeconds')}
          action={action}
        />
      )}
    </Panel>
  )
}
