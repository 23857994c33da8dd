'use client'

import { useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import { ActionForm } from '@/components/forms/ActionForm'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import type { ActionResult } from '@/lib/actions/result'
import type { DecisionRow } from '@/lib/domain/decisions/decisionsView'
import { withholdSchema, type WithholdInput } from '@/lib/domain/decisions/schema'
import { FlagList } from './FlagList'

export type WithholdAction = (input: WithholdInput) => Promise<ActionResult<void>>

export interface CommentRowProps {
  comment: DecisionRow['comments'][number]
  row: DecisionRow
  panelId: number
  /** How a comment is kept from the investigators; null where the reader only looks. */
  withhold: WithholdAction | null
}

function WithholdForm({ comment, row, panelId, withhold }: CommentRowProps & { withhold: WithholdAction }) {
  const client = useQueryClient()
  const isWithheld = comment.withheldReason !== null
  const [isOpen, setOpen] = useState(false)
  const form = useActionForm({
    schema: withholdSchema,
    action: withhold,
    defaultValues: {
      panelId,
      proposalId: row.proposalId,
      assignmentId: comment.assignmentId,
      withhold: !isWithheld,
      reason: '',
    },
    onDone: () => {
      showToast(isWithheld ? 'The investigators may read it' : 'The comment is withheld')
      void client.invalidateQueries({ queryKey: ['panel'] })
    },
  })
  if (!isWithheld && !isOpen)
    return <LinkLikeButton onClick={() => setOpen(true)}>Withhold it …</LinkLikeButton>
  return (
    <ActionForm form={form} label={`Comment of reviewer ${comment.reviewer} on ${row.reviewNumber}`}>
      {isWithheld ? null : (
        <TextField
          name="reason"
          label="Why it is withheld"
          help="Kept in the logbook. It stays on the review as it was written."
        />
      )}
      <div className="flex flex-wrap items-center gap-5">
        <SubmitButton look="secondary" size="small" busyWord={isWithheld ? 'Showing' : 'Withholding'}>
          {isWithheld ? 'Show it to the investigators' : 'Withhold it'}
        </SubmitButton>
        {isWithheld ? null : <LinkLikeButton onClick={() => setOpen(false)}>Leave it</LinkLikeButton>}
      </div>
    </ActionForm>
  )
}

/** A reviewer's comment as the investigators would read it, with what deserves a second look. */
export function CommentRow(props: CommentRowProps) {
  const { comment, withhold } = props
  const isWithheld = comment.withheldReason !== null
  return (
    <li className="border-t border-rule py-3">
      <p className="m-0 text-caption text-muted">
        Reviewer {comment.reviewer}
        {isWithheld ? `; withheld: ${comment.withheldReason}` : ''}
      </p>
      <p
        className={`mt-1 mb-0 max-w-prose [overflow-wrap:anywhere] whitespace-pre-line ${isWithheld ? 'text-muted line-through' : ''}`}
      >
        {comment.body}
      </p>
      <FlagList text={comment.body} flags={comment.flags} />
      {withhold ? (
        <div className="mt-2">
          <WithholdForm key={String(isWithheld)} {...props} withhold={withhold} />
        </div>
      ) : null}
    </li>
  )
}
