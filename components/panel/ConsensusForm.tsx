'use client'

import { useQueryClient } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import { ActionForm } from '@/components/forms/ActionForm'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { useActionForm } from '@/components/forms/useActionForm'
import { showToast } from '@/components/ui/showToast'
import type { DiscussedProposal } from '@/lib/domain/rankings/readDiscussion'
import { consensusSchema } from '@/lib/domain/rankings/schema'
import type { SaveStatementAction } from './discussionActions'

export interface ConsensusFormProps {
  proposal: DiscussedProposal
  panelId: number
  action: SaveStatementAction
}

/** The panel's statement, kept as the draft of the decision's. */
export function ConsensusForm({ proposal, panelId, action }: ConsensusFormProps) {
  const router = useRouter()
  const client = useQueryClient()
  const form = useActionForm({
    schema: consensusSchema,
    action,
    defaultValues: {
      panelId,
      proposalId: proposal.proposalId,
      version: proposal.decisionVersion,
      statement: proposal.statement,
    },
    onDone: () => {
      showToast('The statement is kept')
      void client.invalidateQueries({ queryKey: ['panel'] })
      router.refresh()
    },
  })
  return (
    <ActionForm form={form} label={`Statement on ${proposal.reviewNumber}`}>
      <TextAreaField
        name="statement"
        label="Statement"
        help="The investigators read it with the decision. It can be edited until decisions are made known."
        rows={5}
        limit={8000}
      />
      <div>
        <SubmitButton busyWord="Keeping">Keep the statement</SubmitButton>
      </div>
    </ActionForm>
  )
}
