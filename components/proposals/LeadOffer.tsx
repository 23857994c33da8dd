'use client'

import { BarNote } from '@/components/ui/BarNote'
import { Button } from '@/components/ui/Button'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { Panel } from '@/components/ui/Panel'
import type { ActionResult } from '@/lib/actions/result'
import { useDeed } from './useDeed'

type Act = (input: { reference: string }) => Promise<ActionResult<unknown>>

export interface LeadOfferProps {
  reference: string
  lead: string
  /** Who has been asked. */
  asked: string
  /** The reader is the one asked, the one who asked, or looks on. */
  reader: 'asked' | 'lead' | 'other'
  accept: Act
  end: Act
}

/** A request to lead the proposal: to accept or decline for the one asked, to take back for the one who asked. */
export function LeadOffer({ reference, lead, asked, reader, accept, end }: LeadOfferProps) {
  const { busy, run } = useDeed()
  if (reader === 'asked')
    return (
      <div className="mb-8">
        <Panel bar="lamp" title={`${lead} asks you to lead this proposal`}>
          <p className="m-0 max-w-prose">
            Accept, and you are its principal investigator from then on. {lead} stays as a deputy.
          </p>
          <div className="mt-4 flex flex-wrap items-center gap-5">
            <Button
              busy={busy}
              busyWord="Accepting"
              onClick={() => run(() => accept({ reference }), 'You lead this proposal now')}
            >
              Lead it from now on
            </Button>
            <LinkLikeButton onClick={() => run(() => end({ reference }), 'You have declined')}>
              Decline
            </LinkLikeButton>
          </div>
        </Panel>
      </div>
    )
  return (
    <div className="mb-6 max-w-prose">
      <BarNote tone="lamp">
        <p className="m-0">
          {asked} has been asked to lead this proposal. Nothing changes before they accept.
        </p>
        {reader === 'lead' ? (
          <p className="m-0 mt-1">
            <LinkLikeButton onClick={() => run(() => end({ reference }), 'The request is taken back')}>
              Take the request back
            </LinkLikeButton>
          </p>
        ) : null}
      </BarNote>
    </div>
  )
}
