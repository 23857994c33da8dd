'use client'

import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { useActionForm } from '@/components/forms/useActionForm'
import { Panel } from '@/components/ui/Panel'
import { TextLink } from '@/components/ui/TextLink'
import { reopenSchema } from '@/lib/domain/submission/schema'
import { paths } from '@/lib/paths'

interface AlreadySentProps {
  reference: string
  mayReopen: boolean
  action: FormAction<{ reference: string }, unknown>
}

/** In place of the button once it was pressed: where the confirmation is, and the way back. */
export function AlreadySent({ reference, mayReopen, action }: AlreadySentProps) {
  const form = useActionForm({ schema: reopenSchema, action, defaultValues: { reference } })
  return (
    <Panel bar="feasible" title="It is in">
      <p className="mt-0 mb-4">
        <TextLink href={paths.proposalSent(reference)}>See the confirmation</TextLink>
      </p>
      {mayReopen ? (
        <ActionForm form={form}>
          <p className="m-0 text-table text-muted">
            Until the deadline it may be written again. The version that was sent stands meanwhile.
          </p>
          <SubmitButton look="secondary" full busyWord="Reopening">
            Reopen it
          </SubmitButton>
        </ActionForm>
      ) : null}
    </Panel>
  )
}
