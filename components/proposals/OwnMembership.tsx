'use client'

import { Button } from '@/components/ui/Button'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { Panel } from '@/components/ui/Panel'
import type { ActionResult } from '@/lib/actions/result'
import { useDeed } from './useDeed'

type Act = (input: { reference: string }) => Promise<ActionResult<unknown>>

export interface OwnMembershipProps {
  reference: string
  lead: string
  hasAgreed: boolean
  mayLeave: boolean
  agree: Act
  leave: Act
}

/** For a co-investigator: to agree to be named, or to take the own name off. */
export function OwnMembership({ reference, lead, hasAgreed, mayLeave, agree, leave }: OwnMembershipProps) {
  const { busy, run } = useDeed()
  const off = (
    <LinkLikeButton onClick={() => run(() => leave({ reference }))}>Take my name off</LinkLikeButton>
  )
  if (hasAgreed) return mayLeave ? <p className="mt-4 text-table">{off}</p> : null
  return (
    <div className="mb-8">
      <Panel bar="lamp" title={`${lead} names you on this proposal`}>
        <p className="m-0 max-w-prose">
          Agree, and you are counted in. Your name then stands as you write it in your account.
        </p>
        <div className="mt-4 flex flex-wrap items-center gap-5">
          <Button
            busy={busy}
            busyWord="Agreeing"
            onClick={() => run(() => agree({ reference }), 'You are named on this proposal')}
          >
            I agree to be named
          </Button>
          {mayLeave ? off : null}
        </div>
      </Panel>
    </div>
  )
}
