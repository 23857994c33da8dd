'use client'

import type { SurveyFields as Read } from '@/lib/domain/tools/yardstick/surveyFields'
import type { YardstickState } from '@/lib/domain/tools/yardstick/state'
import { massChoices } from './massChoices'
import { PlainField } from './PlainField'
import { PlainSelect } from './PlainSelect'

export interface SurveyFieldsProps {
  state: YardstickState
  read: Read
  onChange: (next: Partial<YardstickState>) => void
}

/** How much sky is surveyed, how many objects there are, and how they cluster. */
export function SurveyFields({ state, read, onChange }: SurveyFieldsProps) {
  const { troubles } = read
  return (
    <div className="mt-7 flex flex-col gap-5">
      <PlainField
        label="Area"
        help="deg² or arcmin²"
        value={state.area}
        onChange={(area) => onChange({ area })}
        error={troubles.area}
      />
      <PlainField
        label="Number density"
        help="In a comoving volume; empty for the volume alone"
        value={state.density}
        onChange={(density) => onChange({ density })}
        error={troubles.density}
      />
      <PlainSelect
        label="Clustering of galaxies"
        help="By stellar mass in solar masses"
        options={massChoices}
        value={state.mass}
        onChange={(mass) => onChange({ mass })}
      />
    </div>
  )
}
