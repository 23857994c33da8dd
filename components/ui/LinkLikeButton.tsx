'use client'

import type { ComponentProps } from 'react'
import { classNames } from './classNames'
import { linkClasses } from './linkClasses'

/** A button that reads as a link: small deeds beside a filled button, `Leave it`, `Stop`. */
export function LinkLikeButton({ type = 'button', ...rest }: Omit<ComponentProps<'button'>, 'className'>) {
  return <button {...rest} type={type} className={classNames(linkClasses, 'max-sm:min-h-11')} />
}
