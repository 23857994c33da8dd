'use client'

import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import type { ActionResult } from '@/lib/actions/result'
import { useDeed } from './useDeed'

export interface AskToLeadProps {
  reference: string
  person: { id: number; name: string }
  offer: (input: { reference: string; id: number }) => Promise<ActionResult<unknown>>
}

/** Asks one member to lead the proposal from now on; they are written to, and must accept. */
export function AskToLead({ reference, person, offer }: AskToLeadProps) {
  const { busy, run } = useDeed()
  return (
    <LinkLikeButton
      aria-label={`Ask ${person.name} to lead`}
      aria-busy={busy || undefined}
      onClick={() => run(() => offer({ reference, id: person.id }), `${person.name} is asked to lead`)}
    >
      Ask to lead
    </LinkLikeButton>
  )
}
