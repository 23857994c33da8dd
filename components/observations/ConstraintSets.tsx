'use client'

import { useState } from 'react'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { SectionHeading } from '@/components/ui/SectionHeading'
import type { ProposalContents } from '@/lib/domain/proposals/types'
import { countInWords } from '@/lib/format'
import { ConstraintForm } from './ConstraintForm'
import { constraintWords } from './constraintWords'
import type { ObservationActions } from './observationActions'

export interface ConstraintSetsProps {
  contents: ProposalContents
  readOnly: boolean
  save: ObservationActions['saveConstraints']
}

/** The conditions asked for: each set as a sentence that opens to its fields. */
export function ConstraintSets({ contents, readOnly, save }: ConstraintSetsProps) {
  const [open, setOpen] = useState<number | 'new' | null>(null)
  const { constraintSets, observations, site, call, kind, reference } = contents
  const close = () => setOpen(null)
  const shared = {
    reference,
    site,
    kind,
    seasonFrom: call.seasonFrom,
    seasonTo: call.seasonTo,
    save,
    onDone: close,
  }
  return (
    <section>
      <SectionHeading
        title="The poorest conditions you accept"
        aside={
          readOnly || open === 'new' ? null : (
            <LinkLikeButton onClick={() => setOpen('new')}>Add other conditions</LinkLikeButton>
          )
        }
      />
      <ul className="plain-list mt-3 rule-open">
        {constraintSets.map((set) => {
          const count = observations.filter(({ constraintSetId }) => constraintSetId === set.id).length
          return (
            <li key={set.id} className="border-b border-rule py-4">
              {open === set.id ? (
                <ConstraintForm {...shared} set={set} />
              ) : (
                <div className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1 text-table">
                  <span>
                    <strong>{set.name}</strong>: {constraintWords(set)}{' '}
                    <span className="text-muted">For {countInWords(count, 'observation')}.</span>
                  </span>
                  {readOnly ? null : (
                    <LinkLikeButton onClick={() => setOpen(set.id)} aria-label={`Change ${set.name}`}>
                      Change
                    </LinkLikeButton>
                  )}
                </div>
              )}
            </li>
          )
        })}
        {open === 'new' ? (
          <li className="border-b border-rule py-4">
            <ConstraintForm {...shared} set={null} />
          </li>
        ) : null}
      </ul>
    </section>
  )
}
