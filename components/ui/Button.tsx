'use client'

import { useId, type ComponentProps, type ReactNode } from 'react'
import { buttonClasses, type ButtonLook, type ButtonSize } from './buttonClasses'
import { classNames } from './classNames'

export interface ButtonProps extends Omit<ComponentProps<'button'>, 'className' | 'disabled'> {
  look?: ButtonLook
  size?: ButtonSize
  /** The width of what holds it; on phones buttons are always full unless small. */
  full?: boolean
  /** True while the work runs: the width stays, a ring turns, the verb is shown in -ing. */
  busy?: boolean
  /** The verb while busy, `Sending`. */
  busyWord?: string
  /** True until the page is alive: not to be pressed yet, though it looks as it will. */
  asleep?: boolean
  /** Why it cannot be pressed, in words that stand beside it. Turns the button off. */
  offReason?: string | null
  children: ReactNode
}

/** A button. One filled one a view; turned off it stays focusable and says why. */
export function Button({
  look = 'primary',
  size = 'regular',
  full = false,
  busy = false,
  busyWord,
  asleep = false,
  offReason,
  children,
  onClick,
  type = 'button',
  ...rest
}: ButtonProps) {
  const reasonId = useId()
  const off = Boolean(offReason)
  const idle = off || busy
  const button = (
    <button
      {...rest}
      type={idle && type === 'submit' ? 'button' : type}
      disabled={asleep}
      aria-disabled={idle || undefined}
      aria-busy={busy || undefined}
      aria-describedby={off ? reasonId : rest['aria-describedby']}
      className={classNames(buttonClasses(look, size, off, full), size === 'regular' && 'max-sm:w-full')}
      onClick={idle ? undefined : onClick}
    >
      <span className={busy ? 'invisible' : undefined} aria-hidden={busy || undefined}>
        {children}
      </span>
      {busy ? (
        <span className="absolute inset-0 flex items-center justify-center gap-2 whitespace-nowrap">
          <span className="busy-ring" aria-hidden="true" />
          {busyWord ?? 'Working'}
        </span>
      ) : null}
    </button>
  )
  if (!off) return button
  return (
    <span className="inline-flex flex-wrap items-center gap-3">
      {button}
      <span id={reasonId} className="text-table text-muted">
        {offReason}
      </span>
    </span>
  )
}
