'use client'

import { useState } from 'react'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { SelectField } from '@/components/forms/SelectField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { Dialog } from '@/components/ui/Dialog'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { leaveReviewSchema } from '@/lib/domain/recusals/schema'
import { interestKinds } from './interestKinds'

const schema = leaveReviewSchema.omit({ assignmentId: true })

export interface StepAsideProps {
  reviewNumber: string
  /** What becomes of it, in a sentence. */
  then: string
  leave: FormAction<{ kind: string; reason: string }, unknown>
  onDone?: () => void
}

/** An interest found late: said in a dialog, and the proposal is gone from one's screen. */
export function StepAside(props: StepAsideProps) {
  const [isOpen, setOpen] = useState(false)
  return (
    <>
      <LinkLikeButton onClick={() => setOpen(true)}>I have an interest in this one</LinkLikeButton>
      <Dialog open={isOpen} onClose={() => setOpen(false)} title={`Leave ${props.reviewNumber}?`}>
        <StepAsideForm {...props} onLeave={() => setOpen(false)} />
      </Dialog>
    </>
  )
}

function StepAsideForm({ then, leave, onDone, onLeave }: StepAsideProps & { onLeave: () => void }) {
  const form = useActionForm({
    schema,
    action: leave,
    defaultValues: { kind: '', reason: '' },
    onDone: () => {
      onLeave()
      onDone?.()
    },
  })
  return (
    <>
      <p className="mt-2">{then} This is not taken back by you.</p>
      <ActionForm form={form} label="Your interest">
        <SelectField name="kind" label="What kind" placeholder="Choose a kind" options={interestKinds} />
        <TextField name="reason" label="Why" help="The chair reads it: name nobody." />
        <div className="flex flex-wrap items-center gap-5">
          <SubmitButton busyWord="Leaving">Leave it</SubmitButton>
          <LinkLikeButton onClick={onLeave}>Stay</LinkLikeButton>
        </div>
      </ActionForm>
    </>
  )
}
