'use client'

import { useWatch } from 'react-hook-form'
import { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { CheckboxField } from '@/components/forms/CheckboxField'
import { NumberField } from '@/components/forms/NumberField'
import { RadioField } from '@/components/forms/RadioField'
import { ChooseByField } from '@/components/forms/stale/ChooseByField'
import { useOpenedOver } from '@/components/forms/stale/useOpenedOver'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { useActionForm } from '@/components/forms/useActionForm'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import type { ServiceWish } from '@/lib/domain/proposals/types'
import { wishSchema } from '@/lib/domain/wishes/schema'
import { wishRow } from '@/lib/domain/wishes/wishForm'
import { formatHoursFromSeconds } from '@/lib/format'
import type { ObservationActions } from './observationActions'
import { wishLabels } from './wishLabels'
import { partOptions, serviceOptions } from './wishOptions'

export interface WishFormProps {
  reference: string
  instrument: { id: number; name: string }
  askedSeconds: number
  wish: ServiceWish | null
  save: ObservationActions['saveWish']
  onDone: () => void
}

const formSchema = z.object({ wish: wishSchema })

/** How time on one instrument is wished for, in plain fields. */
export function WishForm({ reference, instrument, askedSeconds, wish, save, onDone }: WishFormProps) {
  const opened = useOpenedOver({ version: wish?.version ?? 0, values: wishRow(wish) })
  const form = useActionForm({
    schema: formSchema,
    action: (values) =>
      save({ reference, instrumentId: instrument.id, version: opened.version, wish: values.wish }),
    defaultValues: { wish: wishRow(wish) },
    onStale: opened.onStale,
    onDone: () => {
      showToast(`Saved for ${instrument.name}`)
      onDone()
    },
  })
  const service = useWatch({ control: form.form.control, name: 'wish.service' })
  return (
    <ActionForm form={form} label={`How ${instrument.name} is wished for`}>
      {opened.stale ? (
        <ChooseByField
          stale={opened.stale}
          versions={opened.versions(form.form.getValues('wish'))}
          labels={wishLabels}
          onChoose={(chosen) => {
            opened.settle()
            form.form.reset({ wish: chosen })
          }}
        />
      ) : null}
      <p className="m-0 font-semibold">{instrument.name}</p>
      <div className="grid gap-x-8 gap-y-6 md:grid-cols-2 lg:grid-cols-3">
        <NumberField
          name="wish.least"
          label="Least of use"
          unit="h"
          optional
          help={`Less than this is not worth observing. Empty: half of the ${formatHoursFromSeconds(askedSeconds)} asked.`}
        />
        <RadioField name="wish.service" label="Who observes" options={serviceOptions} />
        {service === 'visitor' ? (
          <div className="flex flex-col gap-6">
            <NumberField whole name="wish.nights" label="Nights of the visit" />
            <RadioField name="wish.part" label="Of each night" options={partOptions} />
            <CheckboxField
              name="wish.together"
              label="In a row"
              help="Evenings that follow one another, without a gap."
            />
          </div>
        ) : null}
      </div>
      <div className="flex flex-wrap items-center gap-5">
        <SubmitButton busyWord="Saving">Save this</SubmitButton>
        <LinkLikeButton onClick={onDone}>Leave it as it was</LinkLikeButton>
      </div>
    </ActionForm>
  )
}
