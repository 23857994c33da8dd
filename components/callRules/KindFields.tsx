import { DateTimeField } from '@/components/forms/DateTimeField'
import { NumberField } from '@/components/forms/NumberField'
import { SelectField, type SelectOption } from '@/components/forms/SelectField'
import { TextField } from '@/components/forms/TextField'
import { kindOptions } from './kindNames'

/** What a kind of proposal is, how much it may ask and say, who judges it, and until when. */
export function KindFields({ panels, utcOffsetHours }: { panels: SelectOption[]; utcOffsetHours: number }) {
  return (
    <>
      <div className="grid gap-x-8 gap-y-6 sm:grid-cols-2">
        <TextField name="title" label="Title" />
        <SelectField name="kind" label="What it is" options={kindOptions} width="medium" />
        <SelectField name="panelId" label="Judged by" options={panels} width="medium" />
        <NumberField
          name="maxHours"
          label="Most hours it may ask"
          unit="h"
          optional
          help="Empty for no limit."
        />
        <NumberField
          name="pageLimit"
          label="Justification, pages"
          whole
          help="Checked when the PDF is uploaded."
        />
        <NumberField
          name="wordLimit"
          label="Justification, words"
          whole
          optional
          help="Counted in the PDF, captions and references with them. Empty for no limit."
        />
        <NumberField
          name="figureLimit"
          label="Justification, figures"
          whole
          optional
          help="Told to investigators, and for the panel to look after. Empty for no limit."
        />
        <NumberField name="abstractLimit" label="Abstract, characters" whole />
      </div>
      <DateTimeField
        name="closesAt"
        label="A deadline of its own"
        help="Empty: that of the call."
        optional
        utcOffsetHours={utcOffsetHours}
      />
    </>
  )
}
