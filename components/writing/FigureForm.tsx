'use client'

import { ActionForm } from '@/components/forms/ActionForm'
import { KeptCopyNotice } from '@/components/forms/KeptCopyNotice'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { TextField } from '@/components/forms/TextField'
import { StaleChoice } from '@/components/proposals/StaleChoice'
import { useAutosavedForm } from '@/components/proposals/useAutosavedForm'
import type { Figure } from '@/lib/domain/proposals/writingTypes'
import { figureWordsSchema } from '@/lib/domain/writings/schema'
import type { FigureActions } from './figureActions'

export interface FigureFormProps {
  reference: string
  figure: Pick<Figure, 'id' | 'version' | 'label' | 'caption'>
  number: number
  save: FigureActions['save']
}

/** What stands under a figure, and what the text calls it; saved as it is typed. */
export function FigureForm({ reference, figure, number, save }: FigureFormProps) {
  const { id, version, label, caption } = figure
  const keepAs = `figure-${id}`
  const { handle, values, state, base, choose } = useAutosavedForm({
    schema: figureWordsSchema,
    kept: { label, caption },
    version,
    keepAs,
    save: (typed, at) => save({ ...typed, reference, id, version: at }),
  })
  const bringBack = (copy: unknown) => {
    const read = figureWordsSchema.safeParse(copy)
    if (read.success) handle.form.reset(read.data)
  }
  return (
    <ActionForm form={handle} label={`Figure ${number}`}>
      <KeptCopyNotice keepAs={keepAs} onBringBack={bringBack} />
      <StaleChoice
        state={state}
        values={values}
        base={base}
        prose={['caption']}
        labels={{ label: 'Label', caption: 'Caption' }}
        onChoose={choose}
      />
      <TextAreaField
        name="caption"
        label="Caption"
        rows={3}
        help="Formulas between $ and $, as in the text."
      />
      <TextField
        name="label"
        label="Label"
        help={`In the text, [@fig:${values.label || label}] reads as Figure ${number}.`}
      />
    </ActionForm>
  )
}
