'use client'

import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { CheckboxField } from '@/components/forms/CheckboxField'
import { SubmitButton } from '@/components/forms/SubmitButton'
import { TakeInFile } from '@/components/forms/TakeInFile'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { useCallForm } from '@/components/office/useCallForm'
import { saveText } from '@/components/tables/saveText'
import { decodeText } from '@/components/targets/decodeText'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import { calendarCsv } from '@/lib/domain/calendar/calendarFileView'
import { importNightsSchema } from '@/lib/domain/calendar/schema'
import type { NightCalendar } from '@/lib/domain/calendar/types'
import { countInWords } from '@/lib/format'

interface CalendarFileProps {
  calendar: NightCalendar
  action: FormAction<z.input<typeof importNightsSchema>, { nights: number }>
}

/** The whole calendar as a file, and nights taken from one: chosen, or pasted. */
export function CalendarFile({ calendar: { call, telescopes }, action }: CalendarFileProps) {
  const handle = useCallForm({
    schema: importNightsSchema,
    action,
    defaultValues: { slug: call.slug, version: call.version, text: '', mayTakePromised: false },
    done: 'The nights of the file are set',
    cleared: { text: '', mayTakePromised: false },
    onDone: ({ nights }) => showToast(`${countInWords(nights, 'night is', 'nights are', true)} set`),
  })
  return (
    <ActionForm form={handle} label="The calendar as a file">
      <p className="m-0 max-w-prose text-table">
        <LinkLikeButton onClick={() => saveText(`nights-${call.slug}.csv`, calendarCsv(telescopes))}>
          The whole calendar as CSV
        </LinkLikeButton>{' '}
        has a line for each part of each night: telescope, evening, from, to, use, instrument, note. Change it
        and give it back. Nights it names become what it says; others stay.
      </p>
      <div>
        <TextAreaField name="text" label="Its lines" help="Paste them, or take them from a file." rows={6} />
        <TakeInFile
          words="Take in a CSV file"
          label="Take lines in from a file"
          note="Nothing is set before you have seen it above."
          endings={['.csv', '.txt']}
          largestBytes={2_000_000}
          onFile={async (file) => handle.form.setValue('text', decodeText(await file.arrayBuffer()))}
        />
      </div>
      <CheckboxField
        name="mayTakePromised"
        label="Promised time may be taken"
        help="Only where those it was promised to agree."
      />
      <div>
        <SubmitButton look="secondary" busyWord="Taking">
          Take these nights
        </SubmitButton>
      </div>
    </ActionForm>
  )
}
