'use client'

import { useRouter } from 'next/navigation'
import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { DateTimeField } from '@/components/forms/DateTimeField'
import { SelectField } from '@/components/forms/SelectField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { useActionForm } from '@/components/forms/useActionForm'
import { showToast } from '@/components/ui/showToast'
import { openRepairSchema } from '@/lib/domain/papers/repairSchema'
import type { Paper } from '@/lib/domain/proposals/writingTypes'

interface RepairFormProps {
  reference: string
  papers: readonly Pick<Paper, 'kind' | 'fileName'>[]
  utcOffsetHours: number
  action: FormAction<z.input<typeof openRepairSchema>, unknown>
}

const names = { justification: 'Justification', 'team-expertise': 'The team’s expertise' } as const

/** Opens one paper for one replacement by its investigators. */
export function RepairForm({ reference, papers, utcOffsetHours, action }: RepairFormProps) {
  const router = useRouter()
  const form = useActionForm({
    schema: openRepairSchema,
    action,
    defaultValues: { reference, kind: papers[0]?.kind ?? 'justification', openUntil: '', reason: '' },
    onDone: () => {
      form.form.reset()
      showToast('The paper is open for one replacement')
      router.refresh()
    },
  })
  return (
    <ActionForm form={form} label="A wrong file">
      <SelectField
        name="kind"
        label="Which paper"
        width="medium"
        options={papers.map(({ kind, fileName }) => ({ value: kind, label: `${names[kind]}: ${fileName}` }))}
      />
      <DateTimeField name="openUntil" label="Open until" utcOffsetHours={utcOffsetHours} />
      <TextAreaField
        name="reason"
        label="What is wrong with it"
        help="Stands in the logbook and in the letter to those who lead the proposal."
        rows={2}
        limit={500}
      />
      <div>
        <SubmitButton look="secondary" busyWord="Opening">
          Open it for one replacement
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
