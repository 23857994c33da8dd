'use client'

import { useFormContext, useWatch } from 'react-hook-form'
import { smallSelect } from '@/components/rows/cellClasses'
import type { TargetRow } from '@/lib/domain/targets/schema'

export interface StandingSelectProps {
  name: string
  /** Names of the groups of the proposal. */
  groups: readonly string[]
  readOnly: boolean
  onChosen: () => void
}

const needs: readonly TargetRow['need'][] = ['required', 'optional', 'backup']
/** No name of a group begins so in the list of values, as a need has no colon. */
const ofGroup = (name: string) => `group:${name}`

/** How much a target is needed: by its own word, or by the rule of the group it is put into. */
export function StandingSelect({ name, groups, readOnly, onChosen }: StandingSelectProps) {
  const { control, setValue } = useFormContext<TargetRow>()
  const [need, group] = useWatch({ control, name: ['need', 'group'] })
  const listed = group && !groups.includes(group) ? [...groups, group] : groups

  const choose = (value: string) => {
    const own = needs.find((one) => one === value)
    if (own) setValue('need', own)
    setValue('group', own ? '' : value.slice(ofGroup('').length))
    onChosen()
  }
  return (
    <select
      value={group ? ofGroup(group) : need}
      onChange={(event) => choose(event.target.value)}
      aria-label={`How much ${name} is needed, or its group`}
      disabled={readOnly}
      className={smallSelect}
    >
      {needs.map((value) => (
        <option key={value} value={value}>
          {value}
        </option>
      ))}
      {listed.length > 0 ? (
        <optgroup label="by the rule of">
          {listed.map((one) => (
            <option key={one} value={ofGroup(one)}>
              {one}
            </option>
          ))}
        </optgroup>
      ) : null}
    </select>
  )
}
