'use client'

import { useEffect } from 'react'
import { ScoreRuler } from '@/components/forms/ScoreRuler'
import { useAutosave } from '@/components/forms/useAutosave'
import type { SheetCriterion } from '@/lib/domain/reviews/types'
import type { SheetActions } from './sheetTypes'
import type { SheetSaving } from './useSheetSaving'

export interface CriterionScoreProps {
  assignmentId: number
  criterion: SheetCriterion
  parts: number
  onChange: (halfPoints: number | null) => void
  error?: string
  off: boolean
  saving: Pick<SheetSaving, 'report' | 'during'>
  save: SheetActions['saveScore']
}

/** One criterion with its ruler; a moment after it is moved it is stored. */
export function CriterionScore(props: CriterionScoreProps) {
  const { assignmentId, criterion, parts, onChange, error, off, saving, save } = props
  const { state, saveNow } = useAutosave({
    values: criterion.halfPoints,
    delayMs: 400,
    save: (halfPoints) => saving.during(save({ assignmentId, criterionId: criterion.id, halfPoints })),
  })
  const { report } = saving
  useEffect(() => report(`score-${criterion.id}`, state, saveNow), [report, criterion.id, state, saveNow])
  return (
    <div className="border-t border-rule py-3.5">
      <ScoreRuler
        id={`score-${criterion.id}`}
        label={criterion.title}
        counts={`counts ${criterion.weight} of ${parts}`}
        help={criterion.prompt}
        value={criterion.halfPoints === null ? null : criterion.halfPoints / 2}
        onChange={(score) => onChange(score === null ? null : Math.round(score * 2))}
        error={error}
        off={off}
      />
    </div>
  )
}
