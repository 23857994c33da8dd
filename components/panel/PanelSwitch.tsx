'use client'

import Link from 'next/link'
import { usePathname, useSearchParams } from 'next/navigation'
import { classNames } from '@/components/ui/classNames'
import { panelNumber } from '@/lib/domain/panels/schema'

export interface PanelSwitchProps {
  /** The panels of the call that the reader leads, the one shown without asking first. */
  panels: readonly { id: number; name: string }[]
  /** Where the call's panels share their time; null where it has one panel. */
  between?: string | null
}

/**
 * From one panel to another of the same call, staying on the page. What else the address holds (the order of a table,
 * the proposal that is open) belongs to the panel one leaves, and stays behind. At the right, what stands between the panels of the call.
 */
export function PanelSwitch({ panels, between = null }: PanelSwitchProps) {
  const pathname = usePathname()
  const asked = panelNumber.safeParse(useSearchParams().get('panel'))
  if (panels.length < 2 && between === null) return null
  const isBetween = between !== null && pathname === between
  const current = asked.success ? asked.data : panels[0]?.id
  return (
    <nav aria-label="Panels you lead" className="px-gutter">
      <div className="flex h-12 items-stretch gap-6 border-b border-rule text-table">
        <span aria-hidden="true" className="flex items-center text-caption text-muted">
          Panel
        </span>
        <ul className="plain-list flex min-w-0 items-stretch gap-6 overflow-x-auto overflow-y-hidden">
          {panels.map(({ id, name }) => (
            <li key={id} className="flex">
              <Link
                href={`${pathname}?panel=${id}`}
                aria-current={id === current && !isBetween ? 'page' : undefined}
                className={classNames(
                  'flex items-center whitespace-nowrap no-underline hover:text-ink focus-visible:-outline-offset-3',
                  id === current && !isBetween
                    ? 'border-b-2 border-ink pt-0.5 font-semibold text-ink'
                    : 'text-muted',
                )}
              >
                {name}
              </Link>
            </li>
          ))}
        </ul>
        {between ? (
          <Link
            href={asked.success ? `${between}?panel=${asked.data}` : between}
            aria-current={isBetween ? 'page' : undefined}
            className={classNames(
              'ml-auto flex items-center whitespace-nowrap no-underline hover:text-ink focus-visible:-outline-offset-3',
              isBetween ? 'border-b-2 border-ink pt-0.5 font-semibold text-ink' : 'text-muted',
            )}
          >
            Between panels
          </Link>
        ) : null}
      </div>
    </nav>
  )
}
