'use client'

import { useMemo } from 'react'
import { showToast } from '@/components/ui/showToast'
import type { ProposalContents } from '@/lib/domain/proposals/types'
import { groupRow } from '@/lib/domain/targetGroups/rules'
import type { TargetActions } from '../targetActions'
import type { GroupStep } from '../undoSteps'

type GroupActions = Pick<TargetActions, 'saveGroup' | 'removeGroup'>

/** The same actions, of which each that is done can be taken back. */
export function useRememberedGroups(
  contents: Pick<ProposalContents, 'groups' | 'targets'>,
  { saveGroup, removeGroup }: GroupActions,
  { remember, undo }: { remember: (step: GroupStep) => number; undo: (key: number) => Promise<void> },
): GroupActions {
  const { groups, targets } = contents
  return useMemo(() => {
    const standing = (id: number | null) => {
      const group = groups.find((one) => one.id === id)
      return group ? groupRow(group, targets) : null
    }
    return {
      saveGroup: async (input) => {
        const before = standing(input.id)
        const back = targets.flatMap((target) => {
          const from = groups.find((group) => group.name === target.group && group.id !== input.id)
          return from && input.group.targetIds.includes(String(target.id))
            ? [{ targetId: target.id, groupId: from.id }]
            : []
        })
        const result = await saveGroup(input)
        if (!result.ok) return result
        const { id, version, name } = result.data
        const words = before ? `the change to the group ${before.name}` : `the group ${name}`
        remember({ kind: 'group', words, group: { id, version }, isGone: false, before, back })
        return result
      },
      removeGroup: async (input) => {
        const before = standing(input.id)
        const result = await removeGroup(input)
        if (!result.ok || !before) return result
        const words = `taking out the group ${before.name}`
        const key = remember({
          kind: 'group',
          words,
          group: { id: input.id, version: 0 },
          isGone: true,
          before,
          back: [],
        })
        showToast(`Group ${before.name} taken out; its targets stay`, { undo: () => void undo(key) })
        return result
      },
    }
  }, [groups, targets, saveGroup, removeGroup, remember, undo])
}
