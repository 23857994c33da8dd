'use client'

import Link from 'next/link'
import { usePathname } from 'next/navigation'
import { classNames } from '@/components/ui/classNames'
import { currentLink } from './currentLink'
import { useCarriedLinks } from './useCarriedLinks'

export interface HeaderLink {
  href: string
  label: string
  /** Addresses that count as being here too, when they do not begin with `href`. */
  also?: readonly string[]
  /** Names in the address that go along, such as which panel is looked at. */
  carries?: readonly string[]
}

export interface HeaderNavProps {
  links: readonly HeaderLink[]
  label?: string
  /** Smaller, and without the underline of the place one is in. */
  quiet?: boolean
  className?: string
}

/** The links of the head; the current one is bold, with an ink line flush with the rule below. */
export function HeaderNav({ links, label = 'Main', quiet = false, className }: HeaderNavProps) {
  const pathname = usePathname()
  const carried = useCarriedLinks(links)
  if (links.length === 0) return null
  const current = currentLink(carried, pathname)
  return (
    <nav aria-label={label} className={className}>
      <ul className="plain-list flex h-full items-stretch gap-7">
        {carried.map((link) => (
          <li key={link.href} className="flex">
            <Link
              href={link.to}
              aria-current={link === current ? 'page' : undefined}
              className={classNames(
                'flex items-center whitespace-nowrap no-underline hover:text-ink',
                quiet ? 'text-table' : '-mb-px text-strip',
                link === current ? 'font-semibold text-ink' : 'text-muted',
                link === current && !quiet && 'border-b-2 border-ink pt-0.5',
              )}
            >
              {link.label}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  )
}
