'use client'

import { useRouter } from 'next/navigation'
import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { CheckListField } from '@/components/forms/CheckListField'
import { SelectField, type SelectOption } from '@/components/forms/SelectField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { saveBulkLetterSchema, statesChosen } from '@/lib/domain/bulkLetters/schema'
import { paths } from '@/lib/paths'
import { stateWords } from './stateWords'

type Input = z.input<typeof saveBulkLetterSchema>

interface BulkLetterFormProps {
  letter: Input
  calls: SelectOption[]
  action: FormAction<Input, { id: number }>
}

const parts = [
  { value: 'lead', label: 'Principal investigators' },
  { value: 'named', label: 'Everyone named on a proposal who agreed' },
  { value: 'reviewer', label: 'Reviewers' },
  { value: 'chair', label: 'Chairs and deputies' },
  { value: 'instrument-scientist', label: 'Instrument scientists' },
  { value: 'office', label: 'The office' },
]

const states = statesChosen.map((value) => ({
  value,
  label: value === 'submitted' ? 'sent' : stateWords(value),
}))

const help =
  'Markdown. Fields are filled for each: {name}, {institute}, {call}, {deadline}, {proposals}. Greeting and signature are set by themselves.'

/** To whom, about which call, and what it says; kept as a draft. */
export function BulkLetterForm({ letter, calls, action }: BulkLetterFormProps) {
  const router = useRouter()
  const form = useActionForm({
    schema: saveBulkLetterSchema,
    action,
    defaultValues: letter,
    onDone: ({ id }) => {
      router.push(paths.bulkLetter(id))
      router.refresh()
    },
  })
  return (
    <ActionForm form={form} label="Letter to many">
      <CheckListField name="parts" label="To" options={parts} />
      <SelectField name="callId" label="Call" options={calls} placeholder="Any call" width="medium" />
      <CheckListField
        name="states"
        label="Proposals that are"
        help="For investigators; none chosen means any"
        options={states}
      />
      <TextField name="subject" label="Subject" spellCheck />
      <TextAreaField name="text" label="Text" help={help} rows={12} limit={20_000} />
      <div>
        <SubmitButton look={letter.id === 0 ? 'primary' : 'secondary'} busyWord="Saving">
          Save and look at it
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
