'use client'

import Link from 'next/link'
import { usePathname } from 'next/navigation'
import { useEffect, useId, useRef, useState, type ReactNode } from 'react'
import { classNames } from '@/components/ui/classNames'
import { currentLink } from './currentLink'
import type { HeaderLink } from './HeaderNav'
import { useCarriedLinks } from './useCarriedLinks'

export interface PhoneMenuProps {
  links: readonly HeaderLink[]
  /** The theme switch and signing out. */
  children: ReactNode
}

/** The links of the head on narrow screens, opened by `Menu`; Escape closes it and gives the focus back. */
export function PhoneMenu({ links, children }: PhoneMenuProps) {
  const pathname = usePathname()
  const [openAt, setOpenAt] = useState<string | null>(null)
  const id = useId()
  const button = useRef<HTMLButtonElement>(null)
  // Moving to another page closes the menu without an effect: it is open only for the page it was opened on.
  const open = openAt === pathname
  const carried = useCarriedLinks(links)
  const current = currentLink(carried, pathname)

  useEffect(() => {
    if (!open) return
    const close = (event: KeyboardEvent) => {
      if (event.key !== 'Escape') return
      setOpenAt(null)
      button.current?.focus()
    }
    document.addEventListener('keydown', close)
    return () => document.removeEventListener('keydown', close)
  }, [open])

  return (
    <div className="lg:hidden">
      <button
        ref={button}
        type="button"
        aria-expanded={open}
        aria-controls={id}
        onClick={() => setOpenAt(open ? null : pathname)}
        className="flex min-h-11 items-center gap-2 text-body font-semibold"
      >
        Menu
        <svg width="16" height="12" viewBox="0 0 16 12" aria-hidden="true" focusable="false">
          <path d="M0 1H16M0 6H16M0 11H11" stroke="currentColor" strokeWidth="2" />
        </svg>
      </button>
      <div
        id={id}
        hidden={!open}
        className="absolute inset-x-0 z-40 mt-2 float-in border-b border-rule bg-surface px-gutter py-2 shadow-float"
      >
        <nav aria-label="Menu">
          <ul className="plain-list divide-y divide-rule">
            {carried.map((link) => (
              <li key={link.href}>
                <Link
                  href={link.to}
                  aria-current={link === current ? 'page' : undefined}
                  className={classNames(
                    'flex min-h-11 items-center no-underline',
                    link === current && 'font-semibold',
                  )}
                >
                  {link.label}
                </Link>
              </li>
            ))}
          </ul>
        </nav>
        <div className="flex flex-wrap items-center gap-5 border-t border-rule py-2">{children}</div>
      </div>
    </div>
  )
}
