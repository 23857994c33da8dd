'use client'

import { useRef, useState } from 'react'
import { Button } from '@/components/ui/Button'
import { fileProblem } from './fileProblem'

export interface TakeInFileProps {
  /** What the button says. */
  words: string
  /** What is chosen, for those who hear the page. */
  label: string
  /** What becomes of it, beside the button. */
  note: string
  /** Endings with their dot, lower case. */
  endings: readonly string[]
  largestBytes: number
  onFile: (file: File) => Promise<void>
}

/** A text file read in the browser, its contents put where they can be looked at. */
export function TakeInFile({ words, label, note, endings, largestBytes, onFile }: TakeInFileProps) {
  const input = useRef<HTMLInputElement>(null)
  const [problem, setProblem] = useState<string | null>(null)
  const take = async (file: File | undefined) => {
    if (!file) return
    const wrong = fileProblem(file, { endings, maxBytes: largestBytes })
    setProblem(wrong)
    if (!wrong) await onFile(file)
  }
  return (
    <div className="mt-2 flex flex-wrap items-center gap-3 text-table">
      <input
        ref={input}
        type="file"
        accept={endings.join(',')}
        aria-label={label}
        className="sr-only"
        tabIndex={-1}
        onChange={(event) => {
          void take(event.target.files?.[0])
          event.target.value = ''
        }}
      />
      <Button look="secondary" size="small" onClick={() => input.current?.click()}>
        {words}
      </Button>
      {problem ? (
        <p role="alert" className="m-0 font-semibold text-not-feasible">
          {problem}
        </p>
      ) : (
        <span className="text-muted">{note}</span>
      )}
    </div>
  )
}
