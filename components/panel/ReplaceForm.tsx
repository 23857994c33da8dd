'use client'

import { useQueryClient } from '@tanstack/react-query'
import { ActionForm } from '@/components/forms/ActionForm'
import { SelectField } from '@/components/forms/SelectField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { showToast } from '@/components/ui/showToast'
import { replaceSchema } from '@/lib/domain/assignments/schema'
import type { AssignmentRow, AssignmentsView } from '@/lib/domain/assignments/assignmentsView'
import type { AssignmentActions } from './assignmentActions'
import { freeReviewers } from './freeReviewers'

export interface ReplaceFormProps {
  view: AssignmentsView
  row: AssignmentRow
  assignmentId: number
  name: string
  action: AssignmentActions['replace']
}

/** Someone cannot go on: choose who takes the seat at once. */
export function ReplaceForm({ view, row, assignmentId, name, action }: ReplaceFormProps) {
  const client = useQueryClient()
  const form = useActionForm({
    schema: replaceSchema,
    action,
    defaultValues: { panelId: view.panelId, assignmentId, personId: '', reason: '' },
    onDone: () => {
      showToast(`${name} is replaced, and the new reader is written to`)
      void client.invalidateQueries({ queryKey: ['panel'] })
    },
  })
  const free = freeReviewers(view, row)
  if (free.length === 0) return null
  return (
    <div className="mt-4 border-t border-rule pt-3">
      <p className="mt-0 mb-3 font-semibold">Cannot go on?</p>
      <ActionForm form={form} label={`Replace ${name}`}>
        <SelectField
          name="personId"
          label="Who takes over"
          placeholder="Choose a reviewer"
          options={free.map((reviewer) => ({
            value: String(reviewer.personId),
            label: `${reviewer.name}, ${reviewer.pages} pages now`,
          }))}
        />
        <TextField name="reason" label="Reason" help="Kept in the logbook." />
        <SubmitButton look="secondary" size="small" busyWord="Replacing">
          Replace at once
        </SubmitButton>
      </ActionForm>
    </div>
  )
}
