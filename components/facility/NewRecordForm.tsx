'use client'

import type { ReactNode } from 'react'
import type { FieldValues } from 'react-hook-form'
import { ActionForm } from '@/components/forms/ActionForm'
import type { ActionFormHandle } from '@/components/forms/actionFormTypes'
import { SelectField, type SelectFieldProps } from '@/components/forms/SelectField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'

export interface NewRecordFormProps<Input extends FieldValues, Output> {
  form: ActionFormHandle<Input, Output>
  /** `site`, `telescope`, `instrument`, `mode`. */
  what: string
  /** What may carry it; none for a site. */
  carriers?: Pick<SelectFieldProps, 'label' | 'help' | 'options'>
  /** An instrument has no record of its own, and so no first evening. */
  withoutEvening?: boolean
  children: ReactNode
}

/** What it is called and what carries it, the fields of its first record, the evening that begins on, the button. */
export function NewRecordForm<Input extends FieldValues, Output>(props: NewRecordFormProps<Input, Output>) {
  const { form, what, carriers, withoutEvening = false, children } = props
  return (
    <ActionForm form={form} label={`A new ${what}`}>
      <div className="grid gap-x-8 gap-y-6 sm:grid-cols-2 lg:grid-cols-3">
        <TextField name="name" label="Name" help="As calls and letters call it." />
        <TextField name="slug" label="Short name" help="Stands in addresses and never changes." />
        {carriers ? <SelectField name="of" placeholder="Choose one" {...carriers} /> : null}
      </div>
      {children}
      <div className="flex flex-col gap-6 pt-3 rule-open">
        {withoutEvening ? null : (
          <TextField
            name="validFrom"
            label="First evening"
            help="Year-month-day. From this evening on its first record holds."
            width="medium"
          />
        )}
        <div>
          <SubmitButton busyWord="Adding">{`Add this ${what}`}</SubmitButton>
        </div>
      </div>
    </ActionForm>
  )
}
