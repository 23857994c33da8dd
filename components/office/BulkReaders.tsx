import { SectionHeading } from '@/components/ui/SectionHeading'
import { TextLink } from '@/components/ui/TextLink'
import { countInWords } from '@/lib/format'
import type { LetterRow } from '@/lib/domain/outbox/schema'
import { paths } from '@/lib/paths'

import { letterStands } from './letterStands'

interface BulkReadersProps {
  letterId: number
  readers: readonly {
    personId: number
    name: string
    email: string
    addressFails: boolean
    state: LetterRow['state'] | null
  }[]
  shownId: number
}

/** Who a letter to many is for; each name shows the letter as they get it. */
export function BulkReaders({ letterId, readers, shownId }: BulkReadersProps) {
  const failing = readers.filter((one) => one.addressFails).length
  return (
    <section>
      <SectionHeading title={countInWords(readers.length - failing, 'person', 'people', true)} dense />
      {failing > 0 ? (
        <p className="mt-2 mb-0 text-table text-marginal">
          {countInWords(failing, 'person', 'people', true)} left out: letters do not reach their address.
        </p>
      ) : null}
      <ul className="plain-list mt-2 max-h-[40rem] overflow-y-auto text-table" tabIndex={-1}>
        {readers.map((one) => (
          <li key={one.personId} className="border-b border-rule py-2">
            {one.personId === shownId ? (
              <span className="font-semibold">{one.name}</span>
            ) : (
              <TextLink href={paths.bulkLetter(letterId, one.personId)} prefetch={false}>
                {one.name}
              </TextLink>
            )}
            <span className="block text-muted">
              {one.email}
              {one.addressFails ? ', left out' : one.state ? `, ${letterStands[one.state]}` : ''}
            </span>
          </li>
        ))}
      </ul>
    </section>
  )
}
