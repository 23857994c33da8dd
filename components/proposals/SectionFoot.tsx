'use client'

import { useId, useOptimistic, useTransition } from 'react'
import { LinkButton } from '@/components/ui/LinkButton'
import { showToast } from '@/components/ui/showToast'
import type { ActionResult } from '@/lib/actions/result'
import { paths, type ProposalSection } from '@/lib/paths'
import { sectionNames, sectionOrder } from './sectionNames'

type Section = Exclude<ProposalSection, 'send'>

export interface SectionFootProps {
  reference: string
  section: Section
  done: boolean
  /** Why it cannot be ticked now; null when it can. */
  offReason: string | null
  mark: (input: { reference: string; section: Section; done: boolean }) => Promise<ActionResult<unknown>>
}

/** The end of a section: the box that says one is done with it, and the one way on. */
export function SectionFoot({ reference, section, done, offReason, mark }: SectionFootProps) {
  const id = useId()
  const [ticked, setTicked] = useOptimistic(done)
  const [, startTransition] = useTransition()
  const next = sectionOrder[sectionOrder.indexOf(section) + 1] ?? 'send'

  const change = (value: boolean) =>
    startTransition(async () => {
      setTicked(value)
      const result = await mark({ reference, section, done: value }).catch(() => null)
      if (!result?.ok) showToast(result?.message ?? 'The observatory did not answer. Nothing was changed.')
    })

  return (
    <div className="mt-10 flex flex-wrap items-center justify-between gap-x-6 gap-y-4 border-t border-rule pt-5">
      {offReason ? (
        <span className="text-muted">{done ? 'Marked as done' : 'Not marked as done'}</span>
      ) : (
        <span className="flex items-center gap-3">
          <input
            id={id}
            type="checkbox"
            className="checkbox"
            checked={ticked}
            onChange={(event) => change(event.target.checked)}
          />
          <label htmlFor={id}>I am done with the {sectionNames[section].toLowerCase()}</label>
        </span>
      )}
      <LinkButton href={paths.proposalSection(reference, next)}>
        Go on to {sectionNames[next].toLowerCase()}
      </LinkButton>
    </div>
  )
}
