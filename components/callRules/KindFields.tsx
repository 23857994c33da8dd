import { CheckboxField } from '@/components/forms/CheckboxField'
import { DateTimeField } from '@/components/forms/DateTimeField'
import { NumberField } from '@/components/forms/NumberField'
import { SelectField, type SelectOption } from '@/components/forms/SelectField'
import { TextField } from '@/components/forms/TextField'
import { mostTargets } from '@/lib/domain/targets/limits'
import { maxFigures } from '@/lib/domain/writings/limits'
import { countInWords } from '@/lib/format'
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
          label="Justification as a PDF, pages"
          whole
          help="Checked when it is uploaded."
        />
        <NumberField name="wordLimit" label="Justification written here, words" whole />
        <NumberField
          name="figureLimit"
          label="Figures with it"
          whole
          optional
          help={`Empty for ${countInWords(maxFigures, 'figure')}, the most there can be.`}
        />
        <NumberField name="abstractLimit" label="Abstract, characters" whole />
        <NumberField
          name="targetLimit"
          label="Targets"
          whole
          optional
          help={`Empty for ${countInWords(mostTargets, 'target')}, the most there can be.`}
        />
      </div>
      <CheckboxField
        name="needsStudent"
        label="Must name a student and a supervisor"
        help="Both have agreed before it can be sent."
      />
      <CheckboxField
        name="needsCadence"
        label="Must say how often"
        help="Each set of conditions that is used says how often its observations are repeated."
      />
      <CheckboxField
        name="needsLastNight"
        label="Must say by when"
        help="Each set of conditions that is used names a last evening, and nights after it are not counted."
      />
      <CheckboxField
        name="takesAwaited"
        label="May name what is awaited"
        help="A target without a position, with what triggers it."
      />
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
