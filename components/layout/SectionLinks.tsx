'use client'

import Link from 'next/link'
import { usePathname } from 'next/navigation'
import { classNames } from '@/components/ui/classNames'
import { TextLink } from '@/components/ui/TextLink'
import { currentLink } from './currentLink'
import type { HeaderLink } from './HeaderNav'

export interface SectionLinksProps {
  links: readonly HeaderLink[]
  /** At the right: back to all of them. */
  all?: { href: string; label: string }
  label?: string
}

/** The sections of one thing, a line under the strip; scrolls sideways where it does not fit. */
export function SectionLinks({ links, all, label = 'Sections' }: SectionLinksProps) {
  const current = currentLink(links, usePathname())
  return (
    <nav aria-label={label} className="px-gutter">
      <div className="flex h-12 items-stretch justify-between gap-6 border-b border-rule text-table">
        <ul className="plain-list flex items-stretch gap-6 overflow-x-auto overflow-y-hidden">
          {links.map((link) => (
            <li key={link.href} className="flex">
              <Link
                href={link.href}
                aria-current={link === current ? 'page' : undefined}
                className={classNames(
                  'flex items-center whitespace-nowrap no-underline hover:text-ink focus-visible:-outline-offset-3',
                  link === current ? 'border-b-2 border-ink pt-0.5 font-semibold text-ink' : 'text-muted',
                )}
              >
                {link.label}
              </Link>
            </li>
          ))}
        </ul>
        {all ? (
          <span className="flex items-center whitespace-nowrap max-sm:hidden">
            <TextLink href={all.href}>{all.label}</TextLink>
          </span>
        ) : null}
      </div>
    </nav>
  )
}
