import { controlClasses } from '@/components/forms/controlClasses'
import { Button } from '@/components/ui/Button'
import { paths } from '@/lib/paths'
import { stateWords } from './stateWords'

interface SampleFormProps {
  sample: {
    templates: readonly { template: string; title: string }[]
    cases: readonly { reference: string; title: string; state: string; call: number }[]
    template: string
    reference: string
  }
}

const control = controlClasses(false, false)

/** Which letter, and with whose facts. A plain form: the choice stands in the address. */
export function SampleForm({ sample }: SampleFormProps) {
  return (
    <form method="get" action={paths.letterSamples()} aria-label="Choose a letter and a proposal">
      <div className="grid items-end gap-x-6 gap-y-4 sm:grid-cols-[minmax(0,2fr)_minmax(0,3fr)_auto]">
        <div className="min-w-0">
          <label htmlFor="sample-template" className="block text-body font-semibold">
            Letter
          </label>
          <select
            id="sample-template"
            name="template"
            defaultValue={sample.template}
            className={`${control} mt-1`}
          >
            {sample.templates.map(({ template, title }) => (
              <option key={template} value={template}>
                {title}
              </option>
            ))}
          </select>
        </div>
        <div className="min-w-0">
          <label htmlFor="sample-reference" className="block text-body font-semibold">
            With the facts of
          </label>
          <select
            id="sample-reference"
            name="reference"
            defaultValue={sample.reference}
            className={`${control} mt-1`}
          >
            {sample.cases.map(({ reference, title, state, call }) => (
              <option key={reference} value={reference}>
                {`${reference}, call ${call}, ${stateWords(state)}: ${title || 'no title yet'}`}
              </option>
            ))}
          </select>
        </div>
        <Button type="submit" look="secondary">
          Show it
        </Button>
      </div>
    </form>
  )
}
