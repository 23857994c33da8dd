'use client'

import { useState } from 'react'
import { Button } from '@/components/ui/Button'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { countInWords, formatUtcInstant } from '@/lib/format'
import type { StaleDetails } from '@/lib/errors'
import { choicesOf, joined, type Choice, type Versions, type Whose } from './choicesOf'
import { ChoiceRow } from './ChoiceRow'

export interface ChooseByFieldProps<Values> {
  stale: Pick<StaleDetails, 'changedBy' | 'changedAt'>
  versions: Versions<Values>
  /** Names of the fields as they stand over them; only these are compared. */
  labels: Readonly<Record<keyof Values & string, string>>
  /** Fields of running text, of which passages are chosen. */
  prose?: readonly (keyof Values & string)[]
  /** A value in words, where the value itself says nothing. */
  say?: (field: keyof Values & string, value: unknown) => string
  onChoose: (values: Values) => void
}

const plain = (_: string, value: unknown) =>
  value === '' || value === null || value === undefined ? 'nothing' : String(value)

/** What is taken unless one says otherwise: a field that one side left alone comes from the other. */
const suggested = ({ changedBy }: Choice): Whose | undefined =>
  changedBy === 'both' ? undefined : changedBy === 'me' ? 'mine' : 'theirs'

/** Someone else saved the same thing first: theirs beside mine, and one is chosen for each field. */
export function ChooseByField<Values extends object>(props: ChooseByFieldProps<Values>) {
  const { stale, versions, labels, prose = [], say = plain, onChoose } = props
  const [picked, setPicked] = useState<Readonly<Record<string, Whose>>>({})
  const fields = Object.keys(labels) as (keyof Values & string)[]
  const choices = choicesOf(versions, fields, prose)
  const pickOf = (choice: Choice) => picked[choice.key] ?? suggested(choice)
  const open = choices.filter((choice) => pickOf(choice) === undefined).length
  const keep = () => {
    const picks = Object.fromEntries(choices.map((choice) => [choice.key, pickOf(choice) ?? 'mine']))
    onChoose(joined(versions, fields, picks, prose))
  }
  return (
    <section
      role="alert"
      aria-label={`${stale.changedBy} changed this first`}
      className="rounded border border-l-4 border-edge border-l-lamp bg-surface p-4 text-left text-table"
    >
      <h2 className="m-0 text-body font-semibold">
        {stale.changedBy} changed this first, at {formatUtcInstant(new Date(stale.changedAt))}
      </h2>
      <p className="m-0 mt-1 text-muted">
        Nothing of yours is lost, and nothing is kept before you choose.
        {choices.length === 0 ? ' What the two of you changed fits together.' : ''}
      </p>
      {choices.length > 0 ? (
        <div className="mt-3 border-b border-rule">
          {choices.map((choice) => (
            <ChoiceRow
              key={choice.key}
              label={labels[choice.field as keyof Values & string]}
              choice={choice}
              say={(value) => say(choice.field as keyof Values & string, value)}
              pick={pickOf(choice)}
              onPick={(whose) => setPicked((before) => ({ ...before, [choice.key]: whose }))}
            />
          ))}
        </div>
      ) : null}
      <div className="mt-4 flex flex-wrap items-center gap-x-5 gap-y-2">
        <Button
          look="secondary"
          size="small"
          onClick={keep}
          offReason={open > 0 ? `${countInWords(open, 'choice', 'choices', true)} to make` : null}
        >
          {choices.length === 0 ? 'Keep both' : 'Keep this choice'}
        </Button>
        <LinkLikeButton onClick={() => onChoose({ ...versions.mine, ...versions.theirs })}>
          Take all of theirs
        </LinkLikeButton>
        <LinkLikeButton onClick={() => onChoose(versions.mine)}>Keep all of mine</LinkLikeButton>
      </div>
    </section>
  )
}
