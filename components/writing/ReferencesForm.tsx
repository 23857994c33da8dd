'use client'

import { ActionForm } from '@/components/forms/ActionForm'
import { KeptCopyNotice } from '@/components/forms/KeptCopyNotice'
import { TakeInFile } from '@/components/forms/TakeInFile'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { StaleChoice } from '@/components/proposals/StaleChoice'
import { useAutosavedForm } from '@/components/proposals/useAutosavedForm'
import type { Writing } from '@/lib/domain/proposals/writingTypes'
import { writingSchema } from '@/lib/domain/writings/schema'
import type { SaveWriting } from './TextForm'

export interface ReferencesFormProps {
  reference: string
  kept: Writing
  save: SaveWriting
}

/** References as BibTeX, pasted or taken in from a file; saved as they are typed. */
export function ReferencesForm({ reference, kept, save }: ReferencesFormProps) {
  const keepAs = `references-${reference}`
  const { handle, values, state, base, choose } = useAutosavedForm({
    schema: writingSchema,
    kept: { text: kept.text },
    version: kept.version,
    keepAs,
    save: (typed, version) => save({ ...typed, reference, part: 'references', version }),
  })
  const bringBack = (copy: unknown) => {
    const read = writingSchema.safeParse(copy)
    if (read.success) handle.form.reset(read.data)
  }
  const takeIn = (more: string) => {
    const before = values.text.trimEnd()
    handle.form.setValue('text', before ? `${before}\n\n${more}` : more, { shouldDirty: true })
  }
  return (
    <ActionForm form={handle} label="References">
      <KeptCopyNotice keepAs={keepAs} onBringBack={bringBack} />
      <StaleChoice
        state={state}
        values={values}
        base={base}
        prose={['text']}
        labels={{ text: 'References' }}
        onChoose={choose}
      />
      <div>
        <TextAreaField
          name="text"
          label="Entries in BibTeX"
          help="Paste them as archives and journals give them. In the text, [@key] cites an entry; those nobody cites are left out of the packet."
          rows={8}
          spellCheck={false}
        />
        <TakeInFile
          words="Take in a .bib file"
          label="Take entries in from a file"
          note="It is put below what stands there."
          endings={['.bib', '.txt']}
          largestBytes={90_000}
          onFile={async (file) => takeIn((await file.text()).replace(/^\ufeff/, ''))}
        />
      </div>
    </ActionForm>
  )
}
