'use client'

import type { AutosaveState } from '@/components/forms/autosaveState'
import { StaleComparison } from '@/components/forms/StaleComparison'

export interface StaleChoiceProps<Input> {
  state: AutosaveState
  values: Input
  /** Names of the fields as they stand over them. */
  labels: Readonly<Record<keyof Input & string, string>>
  onChoose: (theirs: Input, version: number, whose: 'theirs' | 'mine') => void
}

const shown = (value: unknown) =>
  value === '' || value === null || value === undefined ? 'nothing' : String(value)

/** Theirs beside yours, for the fields that differ; nothing while nobody was first. */
export function StaleChoice<Input extends object>({
  state,
  values,
  labels,
  onChoose,
}: StaleChoiceProps<Input>) {
  if (state.name !== 'stale') return null
  const theirs = { ...values, ...state.stale.theirs } as Input
  const names = (Object.keys(labels) as (keyof Input & string)[]).filter(
    (name) => theirs[name] !== values[name],
  )
  const choose = (whose: 'theirs' | 'mine') => onChoose(theirs, state.stale.version, whose)
  return (
    <StaleComparison
      changedBy={state.stale.changedBy}
      changedAt={state.stale.changedAt}
      rows={names.map((name) => ({
        label: labels[name],
        theirs: shown(theirs[name]),
        yours: shown(values[name]),
      }))}
      onKeepTheirs={() => choose('theirs')}
      onKeepMine={() => choose('mine')}
    />
  )
}
