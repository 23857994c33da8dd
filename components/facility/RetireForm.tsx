'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { StaleComparison } from '@/components/forms/StaleComparison'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { showToast } from '@/components/ui/showToast'
import { retireSchema, type RetireForm as Input } from '@/lib/domain/facility/retireSchema'
import type { StaleDetails } from '@/lib/errors'
import { retirementWords } from './retirementWords'

export interface RetireFormProps {
  kind: Input['kind']
  slug: string
  name: string
  /** The retirement as it is, null for none. */
  retiredFrom: string | null
  today: string
  action: FormAction<Input, { retiredFrom: string }>
}

/** The first evening on which it is no longer there. */
export function RetireForm({ kind, slug, name, retiredFrom, today, action }: RetireFormProps) {
  const router = useRouter()
  const [stale, setStale] = useState<StaleDetails | null>(null)
  const [settled, setSettled] = useState(0)
  const handle = useActionForm({
    schema: retireSchema,
    action,
    defaultValues: { kind, slug, before: retiredFrom, retiredFrom: retiredFrom ?? today },
    onDone: (saved) => {
      handle.form.setValue('before', saved.retiredFrom)
      setStale(null)
      showToast(retirementWords(name, saved.retiredFrom, today))
      router.refresh()
    },
    onStale: setStale,
  })
  const theirs = (stale?.theirs.retiredFrom ?? null) as string | null
  const settle = (mine: boolean) => {
    handle.form.setValue('before', theirs)
    if (!mine) handle.form.setValue('retiredFrom', theirs ?? today)
    setStale(null)
    setSettled(handle.attempt)
    if (mine) handle.submit()
    else router.refresh()
  }
  // Once one of the two was chosen, the refusal before it is no news any more.
  const shown = settled === handle.attempt ? { ...handle, failure: null } : handle
  return (
    <ActionForm form={shown} label={`Retire ${name}`}>
      {stale ? (
        <StaleComparison
          changedBy={stale.changedBy}
          changedAt={stale.changedAt}
          rows={[
            {
              label: 'First evening without it',
              theirs: theirs ?? 'none, it stays',
              yours: handle.form.getValues('retiredFrom'),
            },
          ]}
          onKeepTheirs={() => settle(false)}
          onKeepMine={() => settle(true)}
          busy={handle.busy}
        />
      ) : null}
      <TextField
        name="retiredFrom"
        label="First evening without it"
        help="Year-month-day, today or later. Calls whose season reaches it no longer offer it."
        width="medium"
      />
      <div>
        <SubmitButton busyWord="Retiring">
          {retiredFrom ? 'Move it to this evening' : `Retire ${name}`}
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
