'use client'

import { useFormContext, useWatch } from 'react-hook-form'
import { DateTimeField } from '@/components/forms/DateTimeField'
import { RadioField } from '@/components/forms/RadioField'
import { SelectField, type SelectOption } from '@/components/forms/SelectField'

export interface RoleChoices {
  panels: SelectOption[]
  instruments: SelectOption[]
}

const roles = [
  { value: 'reviewer', label: 'Reviewer', help: 'reads and scores for a panel' },
  { value: 'chair', label: 'Chair', help: 'assigns, ranks and decides for a panel' },
  {
    value: 'instrument-scientist',
    label: 'Instrument scientist',
    help: 'assesses requests on an instrument',
  },
  { value: 'office', label: 'Office', help: 'runs the calls' },
]

interface RoleScopeFieldsProps extends RoleChoices {
  /** Also asks from when. */
  hasFrom?: boolean
}

/** A role, what it is for once it is known, and until when; fields of the form around it. */
export function RoleScopeFields({ panels, instruments, hasFrom = false }: RoleScopeFieldsProps) {
  const { control } = useFormContext<{ role: string }>()
  const role = useWatch({ control, name: 'role' })
  return (
    <>
      <RadioField name="role" label="Role" options={roles} />
      {role === 'reviewer' || role === 'chair' ? (
        <SelectField name="panelId" label="Panel" options={panels} placeholder="Choose a panel" />
      ) : null}
      {role === 'instrument-scientist' ? (
        <SelectField
          name="instrumentId"
          label="Instrument"
          options={instruments}
          placeholder="Choose an instrument"
        />
      ) : null}
      {hasFrom ? <DateTimeField name="fromAt" label="From" help="Empty for now" optional /> : null}
      <DateTimeField name="untilAt" label="Until" help="Empty for no end" optional />
    </>
  )
}
