import type { FormAction } from '@/components/forms/actionFormTypes'
import { TextLink } from '@/components/ui/TextLink'
import type { ReviewDesk } from '@/lib/domain/reviews/readReviewDesk'
import { formatDay } from '@/lib/format'
import { paths } from '@/lib/paths'
import { StepAside } from './StepAside'
import { ScoreSheet } from './ScoreSheet'
import type { SheetActions } from './sheetTypes'

export interface ScorePaneProps {
  desk: ReviewDesk
  nextHref: string | null
  actions: SheetActions
  leave: FormAction<{ assignmentId: number; kind: string; reason: string }, unknown>
}

/** The right of the desk: the sheet stays in sight while the packet scrolls. */
export function ScorePane({ desk, nextHref, actions, leave }: ScorePaneProps) {
  const { assignmentId, version, finishedAt, declaredAt, call, sheet, shut, mayReopen } = desk
  return (
    <div className="h-full border-rule lg:border-l">
      <div className="px-9 py-6 max-lg:px-gutter lg:sticky lg:top-0 lg:max-h-screen lg:overflow-y-auto">
        <ScoreSheet
          key={assignmentId}
          assignmentId={assignmentId}
          version={version}
          isFinished={finishedAt !== null}
          criteria={sheet.criteria}
          texts={sheet.texts}
          savedAtMs={sheet.savedAt?.getTime() ?? null}
          shut={shut}
          mayReopen={mayReopen}
          nextHref={nextHref}
          actions={actions}
        />
        <p className="mt-5 text-table">
          <StepAside
            reviewNumber={desk.proposal.reviewNumber ?? ''}
            then="You are barred from it at once, and your review no longer counts."
            leave={(values) => leave({ assignmentId, ...values })}
          />
        </p>
        {declaredAt ? (
          <p className="mt-5 text-caption text-muted">
            You declared your interests on {formatDay(declaredAt)}, from the list of all names.
            <br />
            <TextLink href={paths.interests(call.slug)}>Something has changed</TextLink>
          </p>
        ) : null}
      </div>
    </div>
  )
}
