'use client'

import { useState } from 'react'
import { UnderlineChoice } from '@/components/ui/UnderlineChoice'

interface LetterPreviewProps {
  text: string
  /** Where the letter's HTML is served, locked in. */
  htmlHref: string
}

type As = 'desk' | 'phone' | 'text'

const widths = { desk: 640, phone: 360 } as const

const options: { value: As; label: string }[] = [
  { value: 'desk', label: 'On a desk' },
  { value: 'phone', label: 'On a phone' },
  { value: 'text', label: 'Plain text' },
]

/** A letter as it arrives: in a mail program on a desk, on a phone of 360 px, and as plain text. */
export function LetterPreview({ text, htmlHref }: LetterPreviewProps) {
  const [as, setAs] = useState<As>('desk')
  return (
    <section aria-label="The letter">
      <UnderlineChoice label="Read it" shown options={options} value={as} onChange={setAs} />
      <div className="mt-4">
        {as === 'text' ? (
          <pre className="m-0 max-w-[640px] overflow-x-auto rounded border border-rule bg-surface p-6 text-table whitespace-pre-wrap max-sm:p-4">
            {text}
          </pre>
        ) : (
          <iframe
            key={htmlHref}
            src={htmlHref}
            title="The letter as HTML"
            sandbox=""
            className="h-[44rem] max-w-full rounded border border-rule bg-surface"
            style={{ width: widths[as] }}
          />
        )}
      </div>
    </section>
  )
}
