import type { ReactNode } from 'react'
import { classNames } from '@/components/ui/classNames'

export interface FieldFrameProps {
  /** The control's id; omit for a group of radios, which is its own fieldset. */
  htmlFor?: string
  label: ReactNode
  help?: ReactNode
  helpId: string
  error?: ReactNode
  errorId: string
  optional?: boolean
  muted?: boolean
  /** The label stays for screen readers only, where a table head says it already. */
  hideLabel?: boolean
  as?: 'div' | 'fieldset'
  children: ReactNode
}

/** Label, help, message and control, in that order; a wrong field carries a bar over its whole height. */
export function FieldFrame({
  htmlFor,
  label,
  help,
  helpId,
  error,
  errorId,
  optional,
  muted,
  hideLabel,
  as: Frame = 'div',
  children,
}: FieldFrameProps) {
  const labelClass = classNames(
    'block text-body font-semibold',
    muted && 'text-muted',
    hideLabel && 'sr-only',
  )
  const words = (
    <>
      {label}
      {optional ? <span className="font-normal text-muted"> (optional)</span> : null}
    </>
  )
  return (
    <Frame
      className={classNames('m-0 min-w-0 border-0 p-0', error ? 'border-l-4 border-not-feasible pl-3' : null)}
    >
      {Frame === 'fieldset' ? (
        <legend className={classNames(labelClass, 'p-0')}>{words}</legend>
      ) : (
        <label htmlFor={htmlFor} className={labelClass}>
          {words}
        </label>
      )}
      {help ? (
        <p id={helpId} className="m-0 text-caption text-muted">
          {help}
        </p>
      ) : null}
      {error ? (
        <p id={errorId} className="m-0 text-table font-semibold text-not-feasible">
          {error}
        </p>
      ) : null}
      <div className="mt-1">{children}</div>
    </Frame>
  )
}
