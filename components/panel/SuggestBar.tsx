'use client'

import { useId, useState } from 'react'
import { Button } from '@/components/ui/Button'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { Panel } from '@/components/ui/Panel'
import { suggestionWords, type SuggestedPairs } from '@/lib/domain/assignments/suggestionWords'
import { mostReaders } from '@/lib/domain/assignments/limits'
import { countInWords } from '@/lib/format'

export interface SuggestBarProps {
  quorum: number
  suggestion: SuggestedPairs | null
  busy: string | null
  onSuggest: (each: string) => void
  onAssign: (pairs: SuggestedPairs['pairs']) => void
  onLeave: () => void
}

/** Asks for a suggestion and, once it is there, shows what it comes to before anything is assigned. */
export function SuggestBar({ quorum, suggestion, busy, onSuggest, onAssign, onLeave }: SuggestBarProps) {
  const id = useId()
  const [each, setEach] = useState(String(Math.min(quorum, mostReaders)))
  if (suggestion) {
    const { pairs } = suggestion
    return (
      <div className="mt-6">
        <Panel bar="accent" title="Suggested, not assigned yet" aside="dashed in the table">
          <p className="m-0 max-w-prose text-table">
            {pairs.length > 0
              ? `${countInWords(pairs.length, 'assignment', 'assignments', true)}, none where there is an interest. Each reviewer gets one letter.`
              : suggestion.short.length > 0
                ? 'Nobody can be suggested: whoever reviews for this panel has an interest in what still lacks readers, or reads it already.'
                : 'Nothing is missing: every proposal has the readers asked for.'}
          </p>
          <p className="mt-2 mb-0 max-w-prose text-table">{suggestionWords(suggestion)}</p>
          <div className="mt-4 flex flex-wrap items-center gap-5">
            {pairs.length > 0 ? (
              <Button busy={busy === 'assign'} busyWord="Assigning" onClick={() => onAssign(pairs)}>
                {`Assign ${pairs.length === 1 ? 'this one' : `these ${pairs.length}`}`}
              </Button>
            ) : null}
            <LinkLikeButton onClick={onLeave}>Leave it</LinkLikeButton>
          </div>
        </Panel>
      </div>
    )
  }
  return (
    <form
      noValidate
      className="mt-6 flex flex-wrap items-center gap-3 text-table"
      onSubmit={(event) => {
        event.preventDefault()
        onSuggest(each)
      }}
    >
      <label htmlFor={id}>Readers a proposal</label>
      <input
        id={id}
        inputMode="numeric"
        value={each}
        onChange={(event) => setEach(event.target.value)}
        className="h-8 w-14 rounded border border-edge bg-surface px-3 max-sm:h-11"
      />
      <Button type="submit" look="secondary" size="small" busy={busy === 'suggest'} busyWord="Suggesting">
        Suggest assignments
      </Button>
    </form>
  )
}
