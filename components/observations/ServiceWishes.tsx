'use client'

import { useState } from 'react'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { observationsOn } from '@/lib/domain/assessments/rules'
import type { ProposalContents, ServiceWish } from '@/lib/domain/proposals/types'
import { visitInWords } from '@/lib/domain/wishes/visitWords'
import { formatHoursFromSeconds } from '@/lib/format'
import type { ObservationActions } from './observationActions'
import { WishForm } from './WishForm'

export interface ServiceWishesProps {
  contents: ProposalContents
  readOnly: boolean
  save: ObservationActions['saveWish']
}

function words(wish: ServiceWish | undefined, askedSeconds: number): string {
  const least = wish?.leastSeconds ?? null
  const served = wish?.visit ? `a visit of ${visitInWords(wish.visit)}` : 'in the queue'
  return least === null
    ? `${served}; less than half of the ${formatHoursFromSeconds(askedSeconds)} asked is of no use.`
    : `${served}; less than ${formatHoursFromSeconds(least)} of the ${formatHoursFromSeconds(askedSeconds)} asked is of no use.`
}

/** How time on each instrument is wished for: a sentence that opens to its fields. */
export function ServiceWishes({ contents, readOnly, save }: ServiceWishesProps) {
  const [open, setOpen] = useState<number | null>(null)
  const instruments = new Map(contents.modes.map(({ instrument }) => [instrument.id, instrument]))
  const used = [...instruments.values()].flatMap((instrument) => {
    const own = observationsOn(contents.observations, contents.modes, instrument.id)
    const asked = own.reduce((sum, { askedSeconds }) => sum + askedSeconds, 0)
    return own.length > 0 ? [{ instrument, asked }] : []
  })
  return (
    <section>
      <SectionHeading title="Queue or visit, and the least of use" />
      <ul className="plain-list mt-3 rule-open">
        {used.map(({ instrument: { id, name }, asked }) => {
          const wish = contents.wishes.find(({ instrumentId }) => instrumentId === id)
          return (
            <li key={id} className="border-b border-rule py-4">
              {open === id ? (
                <WishForm
                  reference={contents.reference}
                  instrument={{ id, name }}
                  askedSeconds={asked}
                  wish={wish ?? null}
                  save={save}
                  onDone={() => setOpen(null)}
                />
              ) : (
                <div className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1 text-table">
                  <span>
                    <strong>{name}</strong>: {words(wish, asked)}
                  </span>
                  {readOnly ? null : (
                    <LinkLikeButton
                      onClick={() => setOpen(id)}
                      aria-label={`Change how ${name} is wished for`}
                    >
                      Change
                    </LinkLikeButton>
                  )}
                </div>
              )}
            </li>
          )
        })}
      </ul>
    </section>
  )
}
