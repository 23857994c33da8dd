'use client'

import '@fontsource-variable/work-sans/wght.css'
import './globals.css'
import { Trouble } from '@/components/layout/Trouble'

/** For what nobody expected while the shell itself was made; it brings its own html. */
export default function ShellError({
  error,
  reset,
}: {
  error: Error & { digest?: string }
  reset: () => void
}) {
  return (
    <html lang="en-GB">
      <body>
        <title>Something went wrong · Noctuary</title>
        <Trouble reference={error.digest} onRetry={reset} />
      </body>
    </html>
  )
}
