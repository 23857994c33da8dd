'use client'

import { useState } from 'react'
import { SaveWords } from '@/components/forms/SaveWords'
import { CriterionScore } from './CriterionScore'
import { FinishRow } from './FinishRow'
import { GivesAwayHint } from './GivesAwayHint'
import { SheetTextField } from './SheetTextField'
import type { SheetProps } from './sheetTypes'
import { useSheetSaving } from './useSheetSaving'
import { WeightedMean } from './WeightedMean'

const words = {
  investigators: {
    label: 'To the investigators',
    help: 'They read this after the decision, unsigned.',
    rows: 5,
  },
  panel: { label: 'To the panel only', help: 'The investigators never see it.', rows: 3 },
  private: { label: 'For yourself', help: 'Nobody else reads it.', rows: 2 },
} as const

/** The score sheet: a ruler for each criterion, their mean, three texts; everything is stored as it is typed. */
export function ScoreSheet(props: SheetProps) {
  const { assignmentId, texts, savedAtMs, shut, actions } = props
  const [criteria, setCriteria] = useState(props.criteria)
  const [errors, setErrors] = useState<Record<string, string>>({})
  const saving = useSheetSaving()
  const parts = criteria.reduce((sum, { weight }) => sum + weight, 0)
  const clear = (field: string) =>
    setErrors((all) => Object.fromEntries(Object.entries(all).filter(([name]) => name !== field)))
  const score = (id: number, halfPoints: number | null) => {
    setCriteria((all) => all.map((one) => (one.id === id ? { ...one, halfPoints } : one)))
    clear(`score-${id}`)
  }
  return (
    <section aria-labelledby="score-sheet" className="flex flex-col gap-5">
      <div>
        <div className="flex flex-wrap items-baseline justify-between gap-4">
          <h2 id="score-sheet" className="text-h2">
            Score sheet
          </h2>
          <SaveWords
            state={saving.state}
            savedBefore={savedAtMs === null ? undefined : new Date(savedAtMs)}
          />
        </div>
        <p className="mt-0.5 mb-3 text-table text-muted">0 to 10 in halves, 10 best. Arrow keys or digits.</p>
        {criteria.map((criterion) => (
          <CriterionScore
            key={criterion.id}
            assignmentId={assignmentId}
            criterion={criterion}
            parts={parts}
            onChange={(halfPoints) => score(criterion.id, halfPoints)}
            error={errors[`score-${criterion.id}`]}
            off={shut !== null}
            saving={saving}
            save={actions.saveScore}
          />
        ))}
        <WeightedMean criteria={criteria} />
      </div>
      {texts.map((text) => (
        <SheetTextField
          key={text.audience}
          assignmentId={assignmentId}
          text={text}
          {...words[text.audience]}
          error={errors[text.audience]}
          off={shut !== null}
          hint={text.audience === 'investigators' ? (body) => <GivesAwayHint body={body} /> : undefined}
          onChange={() => clear(text.audience)}
          saving={saving}
          save={actions.saveText}
        />
      ))}
      <FinishRow
        {...props}
        saveAll={saving.saveAll}
        hasGaps={Object.keys(errors).length > 0}
        onGaps={setErrors}
      />
    </section>
  )
}
