import Link from 'next/link'
import { classNames } from '@/components/ui/classNames'
import { VerdictMark } from '@/components/ui/VerdictMark'
import type { Verdict } from '@/lib/domain/observations/types'

export interface ObservationTab {
  id: number
  name: string
  verdict: Verdict
  href: string
}

/** Which observation the report is about: each with its verdict, the chosen one filled. */
export function ObservationTabs({ tabs, chosen }: { tabs: readonly ObservationTab[]; chosen: number }) {
  return (
    <nav aria-label="Observations" className="relative -mx-2 overflow-x-auto">
      <ul className="plain-list flex gap-2 pb-1">
        {tabs.map(({ id, name, verdict, href }) => {
          const isChosen = id === chosen
          return (
            <li key={id} id={`observation-${id}`} className="shrink-0">
              <Link
                href={href}
                scroll={false}
                aria-current={isChosen ? 'page' : undefined}
                className={classNames(
                  'flex min-h-9 items-center rounded px-3 text-table no-underline max-sm:min-h-11',
                  isChosen ? 'bg-ink font-semibold text-ground [&_span]:text-ground' : 'hover:bg-wash',
                )}
              >
                <VerdictMark
                  verdict={verdict}
                  size="chip"
                  words={<span className={isChosen ? undefined : 'text-ink'}>{name}</span>}
                />
                <span className="sr-only">, {verdict.replace('-', ' ')}</span>
              </Link>
            </li>
          )
        })}
      </ul>
    </nav>
  )
}
