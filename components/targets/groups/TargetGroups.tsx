'use client'

import { useId, useState } from 'react'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { showToast } from '@/components/ui/showToast'
import type { GroupComputation } from '@/lib/domain/observations/types'
import type { ProposalContents, TargetGroup } from '@/lib/domain/proposals/types'
import { groupAnchor } from '@/lib/domain/targetGroups/rules'
import { GroupLine } from '@/components/observations/GroupLine'
import type { TargetActions } from '../targetActions'
import { GroupForm } from './GroupForm'

export interface TargetGroupsProps {
  /** As kept by the server. */
  contents: ProposalContents
  /** How each group stands, of what is being typed too. */
  computed: readonly GroupComputation[]
  readOnly: boolean
  actions: Pick<TargetActions, 'saveGroup' | 'removeGroup'>
}

/** Groups of targets, each a sentence that opens to its fields. */
export function TargetGroups({ contents, computed, readOnly, actions }: TargetGroupsProps) {
  const titleId = useId()
  const [open, setOpen] = useState<number | 'new' | null>(null)
  const { groups, targets, reference } = contents
  const shared = { reference, targets, save: actions.saveGroup, onDone: () => setOpen(null) }

  const remove = async (group: TargetGroup) => {
    const result = await actions.removeGroup({ reference, id: group.id })
    if (!result.ok) showToast(result.message)
  }

  if (readOnly && groups.length === 0) return null
  return (
    <section aria-labelledby={titleId} className="mt-10">
      <SectionHeading
        id={titleId}
        title="Groups"
        aside={
          readOnly || open === 'new' || targets.length === 0 ? null : (
            <LinkLikeButton onClick={() => setOpen('new')}>Make a group</LinkLikeButton>
          )
        }
      />
      <p className="m-0 mt-1 max-w-prose text-table text-muted">
        One rule for several targets: all of them, at least some, or a backup. Targets in no group stand by
        their own word, required, optional or backup.
      </p>
      {groups.length > 0 || open === 'new' ? (
        <ul className="plain-list mt-3 rule-open">
          {groups.map((group) => {
            const standing = computed.find(({ name }) => name === group.name)
            return (
              <li key={group.id} id={groupAnchor(group)} className="border-b border-rule py-4">
                {open === group.id ? (
                  <GroupForm {...shared} group={group} />
                ) : (
                  <div className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1">
                    {standing ? <GroupLine group={standing} /> : <strong>{group.name}</strong>}
                    {readOnly ? null : (
                      <span className="flex gap-5 text-table">
                        <LinkLikeButton
                          onClick={() => setOpen(group.id)}
                          aria-label={`Change the group ${group.name}`}
                        >
                          Change
                        </LinkLikeButton>
                        <LinkLikeButton
                          onClick={() => void remove(group)}
                          aria-label={`Take the group ${group.name} out`}
                        >
                          Take it out
                        </LinkLikeButton>
                      </span>
                    )}
                  </div>
                )}
              </li>
            )
          })}
          {open === 'new' ? (
            <li className="border-b border-rule py-4">
              <GroupForm {...shared} group={null} />
            </li>
          ) : null}
        </ul>
      ) : null}
    </section>
  )
}
