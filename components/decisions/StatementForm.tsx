'use client'

import { useQueryClient } from '@tanstack/react-query'
import { ActionForm } from '@/components/forms/ActionForm'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { useActionForm } from '@/components/forms/useActionForm'
import type { SaveStatementAction } from '@/components/panel/discussionActions'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import type { DecisionRow } from '@/lib/domain/decisions/decisionsView'
import { statementSchema } from '@/lib/domain/decisions/schema'

export interface StatementFormProps {
  row: DecisionRow
  panelId: number
  canEdit: boolean
  action: SaveStatementAction
  onLeave: () => void
}

/** What the panel says to the investigators, edited until it is made known. */
export function StatementForm({ row, panelId, canEdit, action, onLeave }: StatementFormProps) {
  const client = useQueryClient()
  const form = useActionForm({
    schema: statementSchema,
    action,
    defaultValues: {
      panelId,
      proposalId: row.proposalId,
      version: row.version,
      statement: row.statement,
    },
    onDone: () => {
      showToast(`The statement on ${row.reviewNumber} is kept`)
      void client.invalidateQueries({ queryKey: ['panel'] })
      onLeave()
    },
  })
  if (!canEdit)
    return (
      <p className="m-0 max-w-prose whitespace-pre-line">{row.statement || 'No statement was written.'}</p>
    )
  return (
    <div className="max-w-prose py-2">
      <ActionForm form={form} label={`Statement on ${row.reviewNumber}`}>
        <TextAreaField
          name="statement"
          label="Statement to the investigators"
          help="Say what decided, and what would help next time. No names, no scores."
          rows={8}
          limit={8000}
        />
        <div className="flex flex-wrap items-center gap-5 text-table">
          <SubmitButton look="secondary" busyWord="Keeping">
            Keep the statement
          </SubmitButton>
          <LinkLikeButton onClick={onLeave}>Leave it</LinkLikeButton>
        </div>
      </ActionForm>
    </div>
  )
}
