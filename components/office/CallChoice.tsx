'use client'

import { useFormContext, useWatch } from 'react-hook-form'
import { ChooseByField } from '@/components/forms/stale/ChooseByField'
import type { CallComparison } from './useCallForm'

interface CallChoiceProps {
  comparison: CallComparison | null
  /** A value in words, where the value itself says nothing. */
  say?: (field: string, value: unknown) => string
}

/** What a colleague saved over the fields of a form about a call, beside what is typed here. */
export function CallChoice({ comparison, say }: CallChoiceProps) {
  const { control } = useFormContext()
  const typed: Record<string, unknown> = useWatch({ control })
  if (!comparison) return null
  const { stale, labels, base, theirs, choose } = comparison
  const mine = Object.fromEntries(Object.keys(labels).map((name) => [name, typed[name]]))
  return (
    <ChooseByField<Record<string, unknown>>
      stale={stale}
      versions={{ base, theirs, mine }}
      labels={labels}
      {...(say ? { say } : {})}
      onChoose={choose}
    />
  )
}
