'use client'

import { useRef, useState } from 'react'
import { fileProblem } from '@/components/forms/fileProblem'
import { Button } from '@/components/ui/Button'

export interface TakeInFileProps {
  /** Endings with their dot, lower case. */
  endings: readonly string[]
  onText: (text: string) => void
}

const largestBytes = 90_000

/** Reads a text file in the browser and puts what it says below what is typed. */
export function TakeInFile({ endings, onText }: TakeInFileProps) {
  const input = useRef<HTMLInputElement>(null)
  const [problem, setProblem] = useState<string | null>(null)
  const take = async (file: File | undefined) => {
    if (!file) return
    const wrong = fileProblem(file, { endings, maxBytes: largestBytes })
    setProblem(wrong)
    if (!wrong) onText((await file.text()).replace(/^\ufeff/, ''))
  }
  return (
    <div className="mt-2 flex flex-wrap items-center gap-3 text-table">
      <input
        ref={input}
        type="file"
        accept={endings.join(',')}
        aria-label="Take entries in from a file"
        className="sr-only"
        tabIndex={-1}
        onChange={(event) => {
          void take(event.target.files?.[0])
          event.target.value = ''
        }}
      />
      <Button look="secondary" size="small" onClick={() => input.current?.click()}>
        Take in a .bib file
      </Button>
      {problem ? (
        <p role="alert" className="m-0 font-semibold text-not-feasible">
          {problem}
        </p>
      ) : (
        <span className="text-muted">It is put below what stands there.</span>
      )}
    </div>
  )
}
