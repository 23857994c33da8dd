'use client'

import { useEffect, useRef, useState, type ReactNode } from 'react'
import { controlClasses } from '@/components/forms/controlClasses'
import { FieldFrame } from '@/components/forms/FieldFrame'
import { KeptCopyNotice } from '@/components/forms/KeptCopyNotice'
import { StaleComparison } from '@/components/forms/StaleComparison'
import { useAutosave } from '@/components/forms/useAutosave'
import { classNames } from '@/components/ui/classNames'
import { longestText } from '@/lib/domain/reviews/rules'
import type { SheetText } from '@/lib/domain/reviews/types'
import { formatNumber } from '@/lib/format'
import type { SheetActions } from './sheetTypes'
import type { SheetSaving } from './useSheetSaving'

export interface SheetTextFieldProps {
  assignmentId: number
  text: SheetText
  label: string
  help: string
  rows: number
  error?: string
  off: boolean
  hint?: (body: string) => ReactNode
  onChange: () => void
  saving: Pick<SheetSaving, 'report' | 'during'>
  save: SheetActions['saveText']
}

/** A text of the sheet, stored as it is typed; another window's version is met with a comparison. */
export function SheetTextField(props: SheetTextFieldProps) {
  const { assignmentId, text, label, help, rows, error, off, hint, onChange, saving, save } = props
  const { audience } = text
  const [body, setBody] = useState(text.body)
  const version = useRef(text.version)
  const id = `text-${audience}`
  const keepAs = `review-${assignmentId}-${audience}`
  const { state, saveNow, settle } = useAutosave({
    values: body,
    keepAs,
    save: (values) => saving.during(save({ assignmentId, audience, body: values, version: version.current })),
    onSaved: (data) => {
      version.current = data.version
    },
  })
  const { report } = saving
  useEffect(() => report(id, state, saveNow), [report, id, state, saveNow])

  const stale = state.name === 'stale' ? state.stale : null
  const theirs = typeof stale?.theirs.body === 'string' ? stale.theirs.body : ''
  const choose = (kept: string) => {
    version.current = stale?.version ?? version.current
    settle(theirs)
    setBody(kept)
    // What differs from the stored text is saved over it; the choice was made with both in sight.
    if (kept !== theirs) setTimeout(() => void saveNow(), 0)
  }
  const length = [...body].length
  return (
    <div>
      {off ? null : (
        <KeptCopyNotice
          keepAs={keepAs}
          onBringBack={(kept) => {
            if (typeof kept !== 'string') return
            setBody(kept)
            onChange()
          }}
        />
      )}
      <FieldFrame
        htmlFor={id}
        label={label}
        help={help}
        helpId={`${id}-help`}
        error={
          error ?? (length > longestText ? `At most ${formatNumber(longestText)} characters.` : undefined)
        }
        errorId={`${id}-error`}
      >
        <textarea
          id={id}
          rows={rows}
          value={body}
          readOnly={off}
          aria-invalid={error ? true : undefined}
          aria-describedby={error ? `${id}-error ${id}-help` : `${id}-help`}
          onChange={(event) => {
            setBody(event.target.value)
            onChange()
          }}
          className={classNames(controlClasses(Boolean(error), off), 'block py-2 text-table sm:leading-6')}
        />
      </FieldFrame>
      {hint?.(body)}
      {stale ? (
        <div className="mt-3">
          <StaleComparison
            changedBy="Another window of yours"
            changedAt={stale.changedAt}
            rows={[{ label, theirs, yours: body }]}
            onKeepTheirs={() => choose(theirs)}
            onKeepMine={() => choose(body)}
          />
        </div>
      ) : null}
    </div>
  )
}
