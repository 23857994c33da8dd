'use client'

import type { FormAction } from '@/components/forms/actionFormTypes'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { newInstrumentSchema, type NewInstrumentForm as Input } from '@/lib/domain/facility/instrumentSchema'
import { carrierOptions, type CarrierChoice } from './carrierOptions'
import { NewRecordForm } from './NewRecordForm'

export interface NewInstrumentFormProps {
  telescopes: readonly CarrierChoice[]
  action: FormAction<Input, { slug: string }>
}

/** A new instrument of a telescope: its modes carry the records. */
export function NewInstrumentForm({ telescopes, action }: NewInstrumentFormProps) {
  const carriers = carrierOptions(telescopes)
  const form = useActionForm({
    schema: newInstrumentSchema,
    action,
    defaultValues: { name: '', slug: '', of: carriers.chosen, summary: '' },
  })
  return (
    <NewRecordForm
      form={form}
      what="instrument"
      carriers={{ label: 'Telescope', help: 'The one that carries it.', options: carriers.options }}
      withoutEvening
    >
      <div className="max-w-prose">
        <TextField
          name="summary"
          label="What it is"
          help="In a few words, such as: optical long-slit spectrograph."
        />
      </div>
    </NewRecordForm>
  )
}
