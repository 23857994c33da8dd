'use client'

import { useWatch } from 'react-hook-form'
import { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { NumberField } from '@/components/forms/NumberField'
import { RadioField } from '@/components/forms/RadioField'
import { ChooseByField } from '@/components/forms/stale/ChooseByField'
import { useOpenedOver } from '@/components/forms/stale/useOpenedOver'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import { constraintRow, defaultConstraints } from '@/lib/domain/observations/rules'
import { constraintSchema } from '@/lib/domain/observations/constraintSchema'
import type { CallKind } from '@/lib/domain/calls/types'
import type { SiteRecord } from '@/lib/domain/facility/types'
import type { ConstraintSet } from '@/lib/domain/proposals/types'
import { formatNumber } from '@/lib/format'
import type { ObservationActions } from './observationActions'
import { conditionLabels } from './conditionLabels'

export interface ConstraintFormProps {
  reference: string
  site: SiteRecord
  /** What the kind of proposal asks of conditions. */
  kind: Pick<CallKind, 'title' | 'needsCadence' | 'needsLastNight'>
  seasonFrom: string
  seasonTo: string
  /** Null makes a new set. */
  set: ConstraintSet | null
  save: ObservationActions['saveConstraints']
  onDone: () => void
}

const moons = [
  { value: 'dark', label: 'dark', help: 'Moon down, or a quarter lit at most' },
  { value: 'grey', label: 'grey', help: 'Moon down, or two thirds lit at most' },
  { value: 'any', label: 'any', help: 'computed for a full Moon' },
]
const skies = [
  { value: 'photometric', label: 'photometric', help: 'no cloud at all' },
  { value: 'clear', label: 'clear', help: 'nine tenths of the light comes through' },
  { value: 'thin-cloud', label: 'thin cloud', help: 'seven tenths come through' },
]

const formSchema = z.object({ set: constraintSchema })

/** The poorest conditions one accepts, in plain fields: what is computed is planned for just these. */
export function ConstraintForm(props: ConstraintFormProps) {
  const { reference, site, kind, seasonFrom, seasonTo, set, save, onDone } = props
  const opened = useOpenedOver({
    version: set?.version ?? 0,
    values: constraintRow(set ?? { ...defaultConstraints, name: 'Other conditions' }),
  })
  const form = useActionForm({
    schema: formSchema,
    action: (values) => save({ reference, id: set?.id ?? null, version: opened.version, set: values.set }),
    defaultValues: { set: constraintRow(set ?? { ...defaultConstraints, name: 'Other conditions' }) },
    onStale: opened.onStale,
    onDone: () => {
      showToast('Conditions saved')
      onDone()
    },
  })
  const name = useWatch({ control: form.form.control, name: 'set.name' })
  const { best10, median, worst90 } = site.seeingArcsec
  const seeing = (value: number) => `${formatNumber(value, 1)}″`
  return (
    <ActionForm form={form} label={`Conditions: ${name}`}>
      {opened.stale ? (
        <ChooseByField
          stale={opened.stale}
          versions={opened.versions(form.form.getValues('set'))}
          labels={conditionLabels}
          onChoose={(chosen) => {
            opened.settle()
            form.form.reset({ set: chosen })
          }}
        />
      ) : null}
      <div className="grid gap-x-8 gap-y-6 md:grid-cols-2 lg:grid-cols-3">
        <TextField name="set.name" label="Name" maxLength={120} />
        <NumberField
          name="set.maxAirmass"
          label="Highest airmass"
          help={`1 is the zenith; the telescopes reach ${formatNumber(site.lowestAltitudeDeg)}° of altitude${site.horizon.length > 0 ? ', or the horizon of the site' : ''}.`}
        />
        <NumberField
          name="set.imageQuality"
          label="Poorest image"
          unit="″"
          help={`At the zenith and 500 nm: ${seeing(best10)} on the best tenth of nights, ${seeing(median)} on half of them, ${seeing(worst90)} on nine tenths.`}
        />
        <RadioField name="set.moon" label="Brightest Moon" options={moons} />
        <RadioField name="set.transparency" label="Poorest sky" options={skies} />
        <div className="flex flex-col gap-6">
          <NumberField name="set.minMoonSeparation" label="Nearest Moon" unit="°" />
          <TextField
            name="set.dateFrom"
            label="Not before the evening of"
            optional
            width="medium"
            help={`The season runs from ${seasonFrom} to ${seasonTo}.`}
          />
          <TextField
            name="set.dateTo"
            label="Not after the evening of"
            optional={!kind.needsLastNight}
            help={kind.needsLastNight ? `${kind.title}: say by when it is needed.` : undefined}
            width="medium"
          />
          <TextField
            name="set.cadence"
            label="How often"
            optional={!kind.needsCadence}
            help={`${kind.needsCadence ? `${kind.title}: say how it is repeated` : 'Empty for once'}, as every 4 to 6 nights, ten times.`}
            maxLength={120}
          />
        </div>
      </div>
      <div className="flex flex-wrap items-center gap-5">
        <SubmitButton busyWord="Saving">Save these conditions</SubmitButton>
        <LinkLikeButton onClick={onDone}>Leave them as they were</LinkLikeButton>
      </div>
    </ActionForm>
  )
}
