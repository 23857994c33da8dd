'use client'

import { useId, useState, type ClipboardEvent, type ReactNode } from 'react'
import { FieldFrame } from '@/components/forms/FieldFrame'
import { controlClasses } from '@/components/forms/controlClasses'
import { classNames } from '@/components/ui/classNames'
import { firstValues, LONGEST_PASTE } from '@/lib/domain/tools/yardstick/firstValues'
import { MOST_ROWS } from '@/lib/domain/tools/yardstick/parseRedshifts'
import { formatNumber } from '@/lib/format'
import { earlyMark } from './useListTypedEarly'

export interface LedgerAreaProps {
  label: string
  help: ReactNode
  value: string
  onChange: (value: string) => void
  /** Sentences for what cannot be read. */
  troubles: readonly string[]
  /** How many were read, in words. */
  read: string
  /** What one value looks like, for pastes too long to be taken whole. */
  piece: RegExp
}

/** A list typed or pasted, one value a line on its own rule; what cannot be read stays and is named above. */
export function LedgerArea(props: LedgerAreaProps) {
  const { label, help, value, onChange, read, piece } = props
  const [pasted, setPasted] = useState<string | null>(null)
  const id = useId()
  const [helpId, errorId] = [`${id}-help`, `${id}-error`]
  const troubles = pasted ? [pasted, ...props.troubles] : props.troubles
  const wrong = troubles.length > 0
  const takeSome = (event: ClipboardEvent<HTMLTextAreaElement>) => {
    const text = event.clipboardData.getData('text')
    if (text.length <= LONGEST_PASTE) return
    event.preventDefault()
    const { kept, count } = firstValues(text, piece)
    const { selectionStart, selectionEnd } = event.currentTarget
    onChange(value.slice(0, selectionStart) + kept + value.slice(selectionEnd))
    setPasted(
      `${formatNumber(count)} values were pasted and the first ${formatNumber(MOST_ROWS)} taken. The public interface takes 100,000 in one call.`,
    )
  }
  return (
    <div>
      <FieldFrame
        htmlFor={id}
        label={label}
        help={help}
        helpId={helpId}
        errorId={errorId}
        error={
          wrong ? (
            <>
              {troubles.map((sentence) => (
                <span key={sentence} className="block [overflow-wrap:anywhere]">
                  {sentence}
                </span>
              ))}
            </>
          ) : undefined
        }
      >
        <textarea
          {...earlyMark}
          id={id}
          rows={7}
          value={value}
          onChange={(event) => {
            setPasted(null)
            onChange(event.target.value)
          }}
          onPaste={takeSome}
          spellCheck={false}
          autoComplete="off"
          aria-invalid={wrong || undefined}
          aria-describedby={wrong ? `${errorId} ${helpId}` : helpId}
          className={classNames(
            controlClasses(wrong, false),
            'ruled-lines block resize-y py-2 leading-[28px]',
          )}
        />
      </FieldFrame>
      <p role="status" className="mt-1 text-caption text-muted">
        {read}
      </p>
    </div>
  )
}
