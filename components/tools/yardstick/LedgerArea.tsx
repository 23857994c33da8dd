'use client'

import { useId, type ReactNode } from 'react'
import { FieldFrame } from '@/components/forms/FieldFrame'
import { controlClasses } from '@/components/forms/controlClasses'
import { classNames } from '@/components/ui/classNames'
import { earlyMark } from './useTypedEarly'

export interface LedgerAreaProps {
  label: string
  help: ReactNode
  value: string
  onChange: (value: string) => void
  /** Sentences for what cannot be read. */
  troubles: readonly string[]
  /** How many were read, in words. */
  read: string
}

/** A list typed or pasted, one value a line on its own rule; what cannot be read stays and is named above. */
export function LedgerArea({ label, help, value, onChange, troubles, read }: LedgerAreaProps) {
  const id = useId()
  const [helpId, errorId] = [`${id}-help`, `${id}-error`]
  const wrong = troubles.length > 0
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
          onChange={(event) => onChange(event.target.value)}
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
