'use client'

import { useSearchParams } from 'next/navigation'
import { TextLink } from '@/components/ui/TextLink'

/** Opens a fee beside the table; search, order and filter of the table stay in the address. */
export function FeeLink({ reference }: { reference: string }) {
  const here = new URLSearchParams(useSearchParams())
  here.set('fee', reference)
  return (
    <span className="whitespace-nowrap">
      <TextLink href={`?${here.toString()}`} strong>
        {reference}
      </TextLink>
    </span>
  )
}
