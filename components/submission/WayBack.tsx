'use client'

import { useState } from 'react'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { useActionForm } from '@/components/forms/useActionForm'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { reopenSchema, withdrawSchema, type WithdrawInput } from '@/lib/domain/submission/schema'

interface WayBackProps {
  reference: string
  fee: string | null
  isEarly: boolean
  may: { reopen: boolean; withdraw: boolean }
  reopen: FormAction<{ reference: string }, unknown>
  withdraw: FormAction<WithdrawInput, unknown>
}

function feeSentence(fee: string | null, isEarly: boolean): string {
  if (fee === null) return ''
  if (!isEarly) return ' The deadline has passed, so the fee stands as it is.'
  if (fee === 'paid') return ' What was paid goes back in full.'
  return fee === 'due' || fee === 'invoiced' ? ' Nothing is owed then.' : ''
}

/** Two ways back: writing it again, and withdrawing it for good. */
export function WayBack({ reference, fee, isEarly, may, reopen, withdraw }: WayBackProps) {
  const [withdraws, setWithdraws] = useState(false)
  const reopening = useActionForm({ schema: reopenSchema, action: reopen, defaultValues: { reference } })
  const withdrawal = useActionForm({
    schema: withdrawSchema,
    action: withdraw,
    defaultValues: { reference, reason: '' },
    onDone: () => setWithdraws(false),
  })
  if (!may.reopen && !may.withdraw) return null
  return (
    <section className="border-t border-rule pt-3 text-table">
      <h2 className="mb-1 text-body font-semibold">If you change your mind</h2>
      {may.reopen ? (
        <ActionForm form={reopening} label="Reopen the proposal">
          <p className="m-0">
            Until the deadline you may write it again. The version that was sent stands until you send the
            next.
          </p>
          <div>
            <SubmitButton look="secondary" size="small" busyWord="Reopening">
              Reopen it
            </SubmitButton>
          </div>
        </ActionForm>
      ) : null}
      {may.withdraw ? (
        <div className="mt-4 flex flex-col gap-4">
          <p className="m-0">
            <LinkLikeButton onClick={() => setWithdraws(!withdraws)} aria-expanded={withdraws}>
              {withdraws ? 'Leave it in' : 'Withdraw it'}
            </LinkLikeButton>
          </p>
          {withdraws ? (
            <ActionForm form={withdrawal} label="Withdraw the proposal">
              <p className="m-0">
                It leaves the call for good, and everyone named gets a letter.{feeSentence(fee, isEarly)}
              </p>
              <TextAreaField name="reason" label="Why it is withdrawn" rows={3} limit={500} />
              <SubmitButton look="secondary" busyWord="Withdrawing">
                Withdraw {reference}
              </SubmitButton>
            </ActionForm>
          ) : null}
        </div>
      ) : null}
    </section>
  )
}
