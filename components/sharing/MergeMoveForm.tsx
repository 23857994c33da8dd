'use client'

import { useRouter } from 'next/navigation'
import { ActionForm } from '@/components/forms/ActionForm'
import { NumberField } from '@/components/forms/NumberField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { useActionForm } from '@/components/forms/useActionForm'
import { showToast } from '@/components/ui/showToast'
import { mergeMoveSchema } from '@/lib/domain/sharing/schema'
import type { SharedRow } from '@/lib/domain/sharing/sharingView'
import type { MeetingOfPanels } from './sharingActions'

export interface MergeMoveFormProps {
  row: SharedRow
  listKey: { callId: number; listId: number; version: number }
  action: MeetingOfPanels['move']
}

/** Giving the chosen proposal another place near the lines, with the reason. */
export function MergeMoveForm({ row, listKey, action }: MergeMoveFormProps) {
  const router = useRouter()
  const form = useActionForm({
    schema: mergeMoveSchema,
    action,
    defaultValues: { ...listKey, proposalId: row.proposalId, place: '', reason: '' },
    onDone: () => {
      showToast(`${row.reviewNumber} is moved`)
      router.refresh()
    },
  })
  return (
    <ActionForm form={form} label={`Move ${row.reviewNumber}`}>
      <NumberField name="place" label="To place" whole />
      <TextAreaField
        name="reason"
        label="Reason"
        help="A sentence; chairs, deputies and office read it."
        rows={3}
        limit={300}
      />
      <div>
        <SubmitButton size="small" look="secondary" busyWord="Moving">
          Move it
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
