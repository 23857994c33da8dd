'use client'

import { useQueryClient } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import { ActionForm } from '@/components/forms/ActionForm'
import { NumberField } from '@/components/forms/NumberField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { useActionForm } from '@/components/forms/useActionForm'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import { moveSchema } from '@/lib/domain/rankings/schema'
import type { RankingRow } from '@/lib/domain/rankings/rankingView'
import type { MovePanelProps } from './MovePanel'

export interface MoveFormProps extends Pick<MovePanelProps, 'listKey' | 'action'> {
  row: RankingRow
  place: number | 'ask'
  onLeave: () => void
}

/** The reason for a move, and the rank where it was not said yet. */
export function MoveForm({ row, place, listKey, action, onLeave }: MoveFormProps) {
  const client = useQueryClient()
  const router = useRouter()
  const form = useActionForm({
    schema: moveSchema,
    action,
    defaultValues: {
      ...listKey,
      proposalId: row.proposalId,
      place: place === 'ask' ? '' : String(place),
      reason: '',
    },
    onDone: () => {
      showToast(`${row.reviewNumber} is moved`)
      void client.invalidateQueries({ queryKey: ['panel'] })
      router.refresh()
    },
  })
  return (
    <ActionForm form={form} label={`Move ${row.reviewNumber}`}>
      {place === 'ask' ? <NumberField name="place" label="To rank" whole /> : null}
      <TextAreaField
        name="reason"
        label={place === 'ask' ? 'Reason' : `Reason for rank ${place}`}
        help="A sentence; the panel reads it."
        rows={3}
        limit={300}
      />
      <div className="flex flex-wrap items-center gap-4 text-table">
        <SubmitButton size="small" busyWord="Moving">
          Move it
        </SubmitButton>
        <LinkLikeButton onClick={onLeave}>Leave it</LinkLikeButton>
      </div>
    </ActionForm>
  )
}
