'use client'

import { memo } from 'react'
import type { YardstickState } from '@/lib/domain/tools/yardstick/state'
import type { YardstickView } from '@/lib/domain/tools/yardstick/viewOf'
import { CompareNotes } from './CompareNotes'
import { ModePlots } from './ModePlots'
import { NearNotes } from './NearNotes'
import { NearPlots } from './NearPlots'
import { SurveyNotes } from './SurveyNotes'
import { UniverseLedger } from './UniverseLedger'

export interface RightColumnProps {
  view: YardstickView
  /** The redshift under the pointer, for which a comparison is said. */
  pointed: number | null
  onChange: (next: Partial<YardstickState>) => void
  onPoint: (z: number | null) => void
}

/** What kind of universes they are, then what a mode has to say, then the plots. Memoised: typing must not wait for it. */
export const RightColumn = memo(function RightColumn(props: RightColumnProps) {
  const { view, pointed, onChange, onPoint } = props
  const { state, ready, reference, redshifts, near, around, sheet, survey } = view
  const { mode } = state
  const furthest = redshifts.reduce((most, z) => Math.max(most, z), 0)
  return (
    <>
      <UniverseLedger universes={view.universes} redshifts={redshifts} />
      {mode === 'compare' && reference && redshifts.length > 0 ? (
        <CompareNotes
          universes={ready}
          reference={reference}
          z={pointed !== null && redshifts.includes(pointed) ? pointed : furthest}
        />
      ) : null}
      {mode === 'near' && sheet && near?.motionKmS ? (
        <NearNotes sheet={sheet} motionKmS={near.motionKmS} />
      ) : null}
      {mode === 'near' && around && reference ? (
        <NearPlots
          universes={ready}
          reference={reference}
          around={around}
          redshifts={redshifts}
          onPoint={onPoint}
        />
      ) : null}
      {mode === 'survey' && survey?.survey ? (
        <SurveyNotes survey={survey.survey} redshifts={redshifts} />
      ) : null}
      {mode !== 'near' && reference ? (
        <ModePlots view={view} reference={reference} onChange={onChange} onPoint={onPoint} />
      ) : null}
    </>
  )
})
