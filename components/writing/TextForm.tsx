'use client'

import { useDeferredValue, useMemo } from 'react'
import type { z } from 'zod'
import { ActionForm } from '@/components/forms/ActionForm'
import { KeptCopyNotice } from '@/components/forms/KeptCopyNotice'
import { TextAreaField } from '@/components/forms/TextAreaField'
import { StaleChoice } from '@/components/proposals/StaleChoice'
import { useAutosavedForm } from '@/components/proposals/useAutosavedForm'
import type { ActionResult } from '@/lib/actions/result'
import type { Writing, WritingPart } from '@/lib/domain/proposals/writingTypes'
import type { Saved } from '@/lib/domain/proposals/writeProposal'
import { writingSchema } from '@/lib/domain/writings/schema'
import { countWords } from '@/lib/writing/countWords'
import { parseText } from '@/lib/writing/parseText'
import type { Reference } from '@/lib/writing/references'
import type { ShownFigure } from './FigurePicture'
import { WordCount } from './WordCount'
import { Written } from './Written'

type Values = z.input<typeof writingSchema>

export type SaveWriting = (
  input: Values & { reference: string; part: WritingPart; version: number },
) => Promise<ActionResult<Saved>>

export interface TextFormProps {
  reference: string
  part: 'justification' | 'team'
  kept: Writing
  wordLimit: number
  label: string
  help: string
  references?: readonly Reference[]
  figures?: readonly ShownFigure[]
  save: SaveWriting
}

/** A text and, beside it, how it will be read; saved as it is typed. */
export function TextForm(props: TextFormProps) {
  const { reference, part, kept, wordLimit, label, help, references, figures, save } = props
  const keepAs = `${part}-${reference}`
  const { handle, values, state, base, choose } = useAutosavedForm({
    schema: writingSchema,
    kept: { text: kept.text },
    version: kept.version,
    keepAs,
    save: (typed, version) => save({ ...typed, reference, part, version }),
  })
  // Typing goes first; the preview follows when there is time for it.
  const text = useDeferredValue(values.text)
  const words = useMemo(() => countWords(parseText(text)), [text])
  const bringBack = (copy: unknown) => {
    const read = writingSchema.safeParse(copy)
    if (read.success) handle.form.reset(read.data)
  }
  return (
    <ActionForm form={handle} label={label}>
      <KeptCopyNotice keepAs={keepAs} onBringBack={bringBack} />
      <StaleChoice
        state={state}
        values={values}
        base={base}
        prose={['text']}
        labels={{ text: label }}
        onChoose={choose}
      />
      <div className="grid gap-x-10 gap-y-6 lg:grid-cols-2">
        <div className="min-w-0">
          <TextAreaField name="text" label={label} help={help} rows={16} grows />
          <WordCount words={words} limit={wordLimit} />
        </div>
        <section
          aria-label={`${label}, as it will be read`}
          className="min-w-0 pt-4 rule-part lg:border-t-0 lg:pt-0"
        >
          <p className="m-0 mb-3 text-caption text-muted">As it will be read</p>
          {text.trim() === '' ? (
            <p className="m-0 text-muted">It appears here as you write.</p>
          ) : (
            <Written text={text} references={references} figures={figures} />
          )}
        </section>
      </div>
    </ActionForm>
  )
}
