'use client'

import type { AutosaveState } from '@/components/forms/autosaveState'
import { ChooseByField, type ChooseByFieldProps } from '@/components/forms/stale/ChooseByField'

export interface StaleChoiceProps<Input> extends Pick<ChooseByFieldProps<Input>, 'labels' | 'prose' | 'say'> {
  state: AutosaveState
  values: Input
  /** As both found it. */
  base: Input
  onChoose: (chosen: Input, theirs: Input, version: number) => void
}

/** Theirs beside yours, field by field; nothing while nobody was first. */
export function StaleChoice<Input extends object>(props: StaleChoiceProps<Input>) {
  const { state, values, base, onChoose, ...words } = props
  if (state.name !== 'stale') return null
  const { stale } = state
  const theirs = { ...base, ...stale.theirs } as Input
  return (
    <ChooseByField
      {...words}
      stale={stale}
      versions={{ base, theirs, mine: values }}
      onChoose={(chosen) => onChoose(chosen, theirs, stale.version)}
    />
  )
}
