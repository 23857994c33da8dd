'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'
import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { CheckboxField } from '@/components/forms/CheckboxField'
import { StaleComparison } from '@/components/forms/StaleComparison'
import { SubmitButton } from '@/components/forms/SubmitButton'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { useActionForm } from '@/components/forms/useActionForm'
import { showToast } from '@/components/ui/showToast'
import { saveOfferSchema } from '@/lib/domain/calls/offerSchema'
import type { StaleDetails } from '@/lib/errors'
import { countInWords } from '@/lib/format'

type Input = z.input<typeof saveOfferSchema>

export interface OfferFormProps {
  slug: string
  modes: readonly {
    id: number
    name: string
    instrument: string
    isOffered: boolean
    proposals: number
  }[]
  action: FormAction<Input, { modeIds: number[] }>
}

const onOffer = (isOffered: boolean) => (isOffered ? 'on offer' : 'not on offer')

/** The modes a call offers, instrument by instrument. */
export function OfferForm({ slug, modes, action }: OfferFormProps) {
  const router = useRouter()
  const [stale, setStale] = useState<StaleDetails | null>(null)
  const [settled, setSettled] = useState(0)
  const offered = modes.filter(({ isOffered }) => isOffered).map(({ id }) => id)
  const handle = useActionForm({
    schema: saveOfferSchema,
    action,
    defaultValues: { slug, before: offered, modeIds: offered.map(String) },
    onDone: ({ modeIds }) => {
      handle.form.setValue('before', modeIds)
      setStale(null)
      showToast('What is on offer is saved')
      router.refresh()
    },
    onStale: setStale,
  })
  const theirs = (stale?.theirs.modeIds ?? []) as string[]
  const mine = stale ? handle.form.getValues('modeIds') : []
  const settle = (modeIds: string[]) => {
    handle.form.setValue('before', theirs.map(Number))
    handle.form.setValue('modeIds', modeIds)
    setStale(null)
    setSettled(handle.attempt)
  }
  // Once one of the two was chosen, the refusal before it is no news any more.
  const shown = settled === handle.attempt ? { ...handle, failure: null } : handle
  return (
    <ActionForm form={shown} label="Modes on offer">
      {stale ? (
        <StaleComparison
          changedBy={stale.changedBy}
          changedAt={stale.changedAt}
          rows={modes
            .filter(({ id }) => theirs.includes(String(id)) !== mine.includes(String(id)))
            .map(({ id, name }) => ({
              label: name,
              theirs: onOffer(theirs.includes(String(id))),
              yours: onOffer(mine.includes(String(id))),
            }))}
          onKeepTheirs={() => settle(theirs)}
          onKeepMine={() => {
            settle(mine)
            handle.submit()
          }}
          busy={handle.busy}
        />
      ) : null}
      <div className="grid gap-x-8 gap-y-6 sm:grid-cols-2">
        {[...new Set(modes.map(({ instrument }) => instrument))].map((instrument) => (
          <fieldset key={instrument} className="m-0 border-0 p-0">
            <legend className="p-0 text-body font-semibold">{instrument}</legend>
            <div className="mt-2 flex flex-col gap-2">
              {modes
                .filter((mode) => mode.instrument === instrument)
                .map(({ id, name, proposals }) => (
                  <CheckboxField
                    key={id}
                    name="modeIds"
                    value={String(id)}
                    label={name}
                    help={proposals > 0 ? `in ${countInWords(proposals, 'proposal')}` : undefined}
                  />
                ))}
            </div>
          </fieldset>
        ))}
      </div>
      <div>
        <SubmitButton look="secondary" busyWord="Saving">
          Save what is on offer
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
