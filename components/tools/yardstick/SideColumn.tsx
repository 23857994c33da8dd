'use client'

import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import { usualState, type YardstickState } from '@/lib/domain/tools/yardstick/state'
import { writeState } from '@/lib/domain/tools/yardstick/stateQuery'
import type { YardstickView } from '@/lib/domain/tools/yardstick/viewOf'
import { pieces } from '@/lib/domain/tools/yardstick/firstValues'
import { countInWords } from '@/lib/format'
import { CosmologyList } from './CosmologyList'
import { InverseFields } from './InverseFields'
import { LedgerArea } from './LedgerArea'
import { NearFields } from './NearFields'
import { PlainSelect } from './PlainSelect'
import { SurveyFields } from './SurveyFields'

export interface SideColumnProps {
  /** As typed, to the last keystroke. */
  state: YardstickState
  /** What follows from it, perhaps a keystroke behind. */
  view: YardstickView
  editing: number | null
  onEdit: (place: number | null) => void
  onChange: (next: Partial<YardstickState>) => void
}

/** What is asked: redshifts or values, the cosmologies to read them under, and what a mode needs besides. */
export function SideColumn({ state, view, editing, onEdit, onChange }: SideColumnProps) {
  const { cosmologies } = state
  const changed = writeState(state)?.toString() !== ''
  return (
    <div className="flex flex-col gap-8">
      <div>
        {state.mode === 'inverse' ? (
          <InverseFields state={state} count={view.count} troubles={view.troubles} onChange={onChange} />
        ) : (
          <LedgerArea
            label="Redshifts"
            help={
              state.mode === 'survey'
                ? 'The edges of the shells: one a line, or a range: 0.5..2 step 0.5'
                : 'One a line, a pasted column, or a range: 0.1..2 step 0.1'
            }
            value={state.z}
            onChange={(z) => onChange({ z })}
            troubles={view.troubles}
            piece={pieces.numbers}
            read={`${countInWords(view.count, 'redshift', 'redshifts', true)} read.`}
          />
        )}
        {state.mode === 'near' && view.near ? (
          <NearFields state={state} read={view.near} onChange={onChange} />
        ) : null}
        {state.mode === 'survey' && view.survey ? (
          <SurveyFields state={state} read={view.survey} onChange={onChange} />
        ) : null}
      </div>
      <CosmologyList
        chosen={cosmologies}
        universes={view.universes}
        editing={editing}
        onEdit={onEdit}
        onAdd={(one) => {
          onChange({ cosmologies: [...cosmologies, one] })
          if (one.own) onEdit(cosmologies.length)
        }}
        onTakeAway={(place) => {
          onEdit(null)
          onChange({
            cosmologies: cosmologies.filter((_, at) => at !== place),
            reference:
              state.reference > place || state.reference === place
                ? Math.max(0, state.reference - 1)
                : state.reference,
          })
        }}
      />
      {state.mode === 'compare' ? (
        <PlainSelect
          label="Compare with"
          options={view.ready.map(({ place, name }) => ({ value: String(place), label: name }))}
          value={String(view.reference?.place ?? 0)}
          onChange={(place) => onChange({ reference: Number(place) })}
        />
      ) : null}
      {changed ? (
        <p className="m-0 text-table">
          <LinkLikeButton
            onClick={() => {
              onEdit(null)
              onChange(usualState)
              showToast('Begun anew.', { undo: () => onChange(state) })
            }}
          >
            Begin anew
          </LinkLikeButton>
        </p>
      ) : null}
    </div>
  )
}
