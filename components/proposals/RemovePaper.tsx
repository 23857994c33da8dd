'use client'

import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import type { ActionResult } from '@/lib/actions/result'
import { useDeed } from './useDeed'

export interface RemovePaperProps {
  reference: string
  kind: 'justification' | 'team-expertise'
  fileName: string
  remove: (input: {
    reference: string
    kind: 'justification' | 'team-expertise'
  }) => Promise<ActionResult<unknown>>
}

/** Takes a document off; what was sent before keeps it. */
export function RemovePaper({ reference, kind, fileName, remove }: RemovePaperProps) {
  const { run } = useDeed()
  return (
    <LinkLikeButton
      aria-label={`Take ${fileName} off`}
      onClick={() => run(() => remove({ reference, kind }), `${fileName} is taken off`)}
    >
      Take off
    </LinkLikeButton>
  )
}
