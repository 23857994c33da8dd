'use client'

import type { FormAction } from '@/components/forms/actionFormTypes'
import { useActionForm } from '@/components/forms/useActionForm'
import { emptyMode, type ModeTyped } from '@/lib/domain/facility/modeForm'
import { newModeSchema, type NewModeForm as Input } from '@/lib/domain/facility/modeSchema'
import { BeginFrom } from './BeginFrom'
import { carrierOptions, type CarrierChoice } from './carrierOptions'
import { ModeFields } from './ModeFields'
import { NewRecordForm } from './NewRecordForm'

export interface NewModeFormProps {
  instruments: readonly CarrierChoice[]
  /** Modes whose records a new one may begin from. */
  patterns: readonly (CarrierChoice & { typed: ModeTyped })[]
  today: string
  action: FormAction<Input, { slug: string }>
}

/** A new mode of an instrument with its first record. */
export function NewModeForm({ instruments, patterns, today, action }: NewModeFormProps) {
  const carriers = carrierOptions(instruments)
  const handle = useActionForm({
    schema: newModeSchema,
    action,
    defaultValues: { name: '', slug: '', of: carriers.chosen, validFrom: today, ...emptyMode },
  })
  const { form } = handle
  const fill = (typed: ModeTyped) => {
    form.reset({ ...form.getValues(), ...typed })
  }
  return (
    <NewRecordForm
      form={handle}
      what="mode"
      carriers={{ label: 'Instrument', help: 'The one that is used this way.', options: carriers.options }}
    >
      {patterns.length > 0 ? <BeginFrom patterns={patterns} onFill={fill} /> : null}
      <ModeFields before={[]} fileName="new-mode-efficiency" />
    </NewRecordForm>
  )
}
