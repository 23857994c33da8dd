'use client'

import { useMemo } from 'react'
import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { KeptCopyNotice } from '@/components/forms/KeptCopyNotice'
import { SelectField } from '@/components/forms/SelectField'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { TextField } from '@/components/forms/TextField'
import type { ActionResult } from '@/lib/actions/result'
import { categories } from '@/lib/domain/proposals/categories'
import { questionSchema } from '@/lib/domain/proposals/schema'
import type { Saved } from '@/lib/domain/proposals/writeProposal'
import { StaleChoice } from './StaleChoice'
import { useAutosavedForm } from './useAutosavedForm'

export type QuestionValues = z.input<ReturnType<typeof questionSchema>>

export interface QuestionFormProps {
  reference: string
  version: number
  abstractLimit: number
  kept: QuestionValues
  save: (input: QuestionValues & { reference: string; version: number }) => Promise<ActionResult<Saved>>
}

const labels = { title: 'Title', abstract: 'Abstract', category: 'Category' }
const options = categories.map((category) => ({ value: category, label: category }))

/** Title, abstract and category; saved as they are typed. */
export function QuestionForm({ reference, version, abstractLimit, kept, save }: QuestionFormProps) {
  const schema = useMemo(() => questionSchema(abstractLimit), [abstractLimit])
  const keepAs = `question-${reference}`
  const { handle, values, state, base, choose } = useAutosavedForm({
    schema,
    kept,
    version,
    keepAs,
    save: (typed, at) => save({ ...typed, reference, version: at }),
  })
  const bringBack = (copy: unknown) => {
    const read = schema.safeParse(copy)
    handle.form.reset(read.success ? read.data : { ...kept, ...(copy as Partial<QuestionValues>) })
  }
  return (
    <ActionForm form={handle} label="The question">
      <KeptCopyNotice keepAs={keepAs} onBringBack={bringBack} />
      <StaleChoice
        state={state}
        values={values}
        base={base}
        prose={['abstract']}
        labels={labels}
        onChoose={choose}
      />
      <TextField name="title" label="Title" help="What a reviewer remembers of it." spellCheck />
      <TextAreaField
        name="abstract"
        label="Abstract"
        help="What is asked, why now, and what the data will decide. Leave out who you are: it is read without names."
        rows={12}
        limit={abstractLimit}
      />
      <SelectField
        name="category"
        label="Category"
        help="Readers are found by it."
        options={options}
        placeholder="Choose one"
        width="long"
      />
    </ActionForm>
  )
}
