'use client'

import { useId } from 'react'
import type { Choice, Whose } from './choicesOf'

export interface ChoiceRowProps {
  label: string
  choice: Choice
  /** A value in words. */
  say: (value: unknown) => string
  pick: Whose | undefined
  onPick: (whose: Whose) => void
}

const sides: readonly Whose[] = ['theirs', 'mine']
const words = { theirs: 'theirs', mine: 'yours' } as const
const notes: Readonly<Record<Choice['changedBy'], string>> = {
  them: 'only they changed it',
  me: 'only you changed it',
  both: 'both of you changed it',
}

/** One field, or one passage of a text, in both versions, of which one is chosen. */
export function ChoiceRow({ label, choice, say, pick, onPick }: ChoiceRowProps) {
  const id = useId()
  const { passage, changedBy } = choice
  return (
    <fieldset className="m-0 min-w-0 border-0 border-t border-rule p-0 py-2">
      <legend className="float-left w-full p-0 font-semibold">
        {label}
        {passage ? `, passage ${passage.number} of ${passage.of}` : ''}
        <span className="font-normal text-muted"> – {notes[changedBy]}</span>
      </legend>
      <div className="clear-both grid gap-x-6 gap-y-2 pt-1 sm:grid-cols-2">
        {sides.map((whose) => (
          <div key={whose} className="flex min-w-0 gap-3">
            <input
              type="radio"
              className="radio shrink-0"
              id={`${id}-${whose}`}
              name={id}
              checked={pick === whose}
              onChange={() => onPick(whose)}
            />
            <label htmlFor={`${id}-${whose}`} className="min-w-0">
              <span className="block text-muted">{words[whose]}</span>
              <span className="block max-h-64 overflow-y-auto [overflow-wrap:anywhere] whitespace-pre-wrap">
                {say(choice[whose])}
              </span>
            </label>
          </div>
        ))}
      </div>
    </fieldset>
  )
}
