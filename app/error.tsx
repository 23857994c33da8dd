'use client'

import { Trouble } from '@/components/layout/Trouble'

/** For what nobody expected while a page was made. */
export default function PageError({
  error,
  reset,
}: {
  error: Error & { digest?: string }
  reset: () => void
}) {
  return <Trouble reference={error.digest} onRetry={reset} />
}
