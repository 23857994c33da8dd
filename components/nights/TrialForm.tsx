'use client'

import { ActionForm } from '@/components/forms/ActionForm'
import { NumberField } from '@/components/forms/NumberField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { useActionForm } from '@/components/forms/useActionForm'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import type { NightsView } from '@/lib/domain/decisions/nightsView'
import { trialFormSchema, trialFrom, trialTyped } from '@/lib/domain/decisions/trialForm'
import type { Trial } from '@/lib/domain/decisions/trialSchema'
import { formatNumber, formatPercent } from '@/lib/format'

export interface TrialFormProps {
  view: NightsView
  trial: Trial | undefined
  onTry: (trial: Trial | undefined) => void
  onLeave: () => void
}

/** Other weather, other nights, other hours held back: typed here, tried on the page, written nowhere. */
export function TrialForm({ view, trial, onTry, onLeave }: TrialFormProps) {
  const form = useActionForm({
    schema: trialFormSchema,
    // Nothing is sent: the address carries what is tried.
    action: (typed) =>
      Promise.resolve({ ok: true as const, data: trialFrom(trialFormSchema.parse(typed), trial?.choices) }),
    defaultValues: trialTyped(trial, view.telescopes),
    onDone: onTry,
  })
  const stands = view.weather.isRecorded ? formatPercent(view.weather.lostShare) : 'none on record'
  return (
    <ActionForm form={form} label="Try the division otherwise">
      <div className="grid gap-x-10 gap-y-6 sm:grid-cols-2 lg:grid-cols-3">
        <NumberField
          name="lost"
          label="Nights lost to weather"
          help={`All through the season. Empty: as recorded, ${stands} now.`}
          unit="%"
          optional
        />
        {view.telescopes.map(({ id, name, heldSeconds }, index) => (
          <div key={id} className="flex flex-col gap-6">
            <NumberField
              name={`telescopes.${index}.offered`}
              label={`Nights of ${name}`}
              help="Of what the call has."
              unit="%"
              optional
            />
            <NumberField
              name={`telescopes.${index}.held`}
              label={`Held back on ${name}`}
              help={`Empty: ${formatNumber(heldSeconds / 3600, 1)} h as it stands.`}
              unit="h"
              optional
            />
          </div>
        ))}
      </div>
      <div className="flex flex-wrap items-center gap-5 text-table">
        <SubmitButton look="secondary" busyWord="Trying">
          Try it
        </SubmitButton>
        <LinkLikeButton onClick={onLeave}>Leave it</LinkLikeButton>
      </div>
    </ActionForm>
  )
}
