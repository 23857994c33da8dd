import Link from 'next/link'
import type { ReactNode } from 'react'
import { buttonClasses, type ButtonLook, type ButtonSize } from './buttonClasses'
import { classNames } from './classNames'

export interface LinkButtonProps {
  href: string
  look?: ButtonLook
  size?: ButtonSize
  full?: boolean
  /** Set for files: the browser saves instead of moving. */
  download?: boolean | string
  prefetch?: boolean
  children: ReactNode
}

/** A link that looks like a button, for the one step a page leads to. */
export function LinkButton({
  href,
  look = 'primary',
  size = 'regular',
  full = false,
  children,
  ...rest
}: LinkButtonProps) {
  const className = classNames(buttonClasses(look, size, false, full), size === 'regular' && 'max-sm:w-full')
  if (rest.download !== undefined) {
    return (
      <a href={href} download={rest.download} className={className}>
        {children}
      </a>
    )
  }
  return (
    <Link href={href} prefetch={rest.prefetch ?? null} className={className}>
      {children}
    </Link>
  )
}
