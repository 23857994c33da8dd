'use client'

import { Button } from '@/components/ui/Button'
import { BrandMark } from './BrandMark'

export interface TroubleProps {
  /** The number under which the log holds what happened. */
  reference?: string
  onRetry: () => void
}

/** A whole page for an unexpected failure: what it means for the reader, and a number to give. */
export function Trouble({ reference, onRetry }: TroubleProps) {
  return (
    <main
      id="main"
      className="mx-auto flex min-h-screen max-w-prose flex-col items-start justify-center gap-4 px-6"
    >
      <BrandMark size={40} />
      <h1 className="text-title">Something went wrong on our side</h1>
      <p className="text-muted">
        Nothing that was saved is lost. Try once more; if it comes back, tell the office.
      </p>
      {reference ? (
        <p>
          Give them the number <strong className="font-semibold">{reference}</strong>: it leads to what
          happened.
        </p>
      ) : null}
      <Button onClick={onRetry}>Try once more</Button>
    </main>
  )
}
