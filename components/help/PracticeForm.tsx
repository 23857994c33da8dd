'use client'

import { useWatch } from 'react-hook-form'
import { ActionForm } from '@/components/forms/ActionForm'
import { NumberField } from '@/components/forms/NumberField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TextField } from '@/components/forms/TextField'
import { useActionForm } from '@/components/forms/useActionForm'
import { ReadBack } from '@/components/ui/ReadBack'
import { showToast } from '@/components/ui/showToast'
import { formatNumber } from '@/lib/format'
import { parseDeclination } from '@/lib/science/sky/coordinates'
import { practiceSchema } from './practiceSchema'

/** A form to try: the same fields, messages and summary as everywhere, and nothing is kept. */
export function PracticeForm() {
  const form = useActionForm({
    schema: practiceSchema,
    action: async () => ({ ok: true as const, data: null }),
    defaultValues: { declination: '-17 40 08.8', hours: '3.0' },
    onDone: () => showToast('Both were understood; nothing was kept'),
  })
  const declination = useWatch({ control: form.form.control, name: 'declination' })
  const read = parseDeclination(declination)
  return (
    <ActionForm form={form} label="Practice">
      <div className="grid gap-6 sm:grid-cols-2">
        <TextField
          name="declination"
          label="Declination"
          help="d m s, or degrees"
          width="medium"
          readBack={read.ok ? <ReadBack>{formatNumber(read.deg, 5)}°</ReadBack> : null}
        />
        <NumberField name="hours" label="Hours asked" help="With overheads, in tenths" unit="h" />
      </div>
      <div>
        <SubmitButton look="secondary" size="small" busyWord="Reading">
          Read it
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
