import Link from 'next/link'
import type { ReactNode } from 'react'
import { classNames } from './classNames'
import { linkClasses } from './linkClasses'

export interface TextLinkProps {
  href: string
  /** True for files and anything outside the app: a plain anchor. */
  plain?: boolean
  download?: boolean | string
  strong?: boolean
  prefetch?: boolean
  'aria-label'?: string
  children: ReactNode
}

/** A link in running text or a row. */
export function TextLink({ href, plain, download, strong, prefetch, children, ...rest }: TextLinkProps) {
  const className = classNames(linkClasses, strong && 'font-semibold')
  if (plain || download !== undefined || !href.startsWith('/')) {
    return (
      <a href={href} download={download} className={className} aria-label={rest['aria-label']}>
        {children}
      </a>
    )
  }
  return (
    <Link href={href} prefetch={prefetch ?? null} className={className} aria-label={rest['aria-label']}>
      {children}
    </Link>
  )
}
