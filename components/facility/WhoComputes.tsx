'use client'

import { useWatch } from 'react-hook-form'
import { BarNote } from '@/components/ui/BarNote'
import type { RecordUse } from '@/lib/domain/facility/types'
import { effectSentences } from './effectSentences'

export interface WhoComputesProps {
  use: RecordUse
  /** First evening of the newest version. */
  newestFrom: string
  today: string
}

/** What saving changes, and for whom, while the first evening is being typed. */
export function WhoComputes({ use, newestFrom, today }: WhoComputesProps) {
  const validFrom: unknown = useWatch({ name: 'validFrom' })
  const sentences = effectSentences({
    use,
    validFrom: typeof validFrom === 'string' ? validFrom.trim() : '',
    newestFrom,
    today,
  })
  return (
    <BarNote tone="lamp">
      {sentences.map((sentence) => (
        <p key={sentence} className="m-0">
          {sentence}
        </p>
      ))}
    </BarNote>
  )
}
